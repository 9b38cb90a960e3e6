import { useMutation } from '@tanstack/react-query';
import type { SessionView } from '../../../shared/contracts/account.ts';
import type { ResetPasswordBody, SignInBody, SignUpBody } from '../../../shared/contracts/auth.ts';
import { locale } from '../../i18n/i18n.ts';
import { api } from '../../lib/api.ts';
import { queryClient } from '../../lib/query-client.ts';
import { sessionQuery, useSessionChange } from '../../lib/session.ts';

/** Someone else may be here now: ask who, and speak their language. */
function useArrival(): () => Promise<void> {
  const changed = useSessionChange();
  return async () => {
    await changed();
    const session = queryClient.getQueryData<SessionView>(sessionQuery.queryKey);
    if (session?.me) locale.set(session.me.language);
  };
}

export function useSignUp() {
  return useMutation({ mutationFn: (body: SignUpBody) => api('POST', '/api/auth/sign-up/email', body) });
}

export function useSignIn() {
  const arrive = useArrival();
  return useMutation({
    mutationFn: (body: SignInBody) => api('POST', '/api/auth/sign-in/email', body),
    onSuccess: arrive,
  });
}

export function useConfirm() {
  const arrive = useArrival();
  return useMutation({
    mutationFn: (token: string) => api('GET', `/api/auth/verify-email?token=${encodeURIComponent(token)}`),
    onSuccess: arrive,
  });
}

/** A message to an address: to confirm it once more, or to choose a new password. */
export function useSendMail(kind: 'send-verification-email' | 'request-password-reset') {
  return useMutation({ mutationFn: (email: string) => api('POST', `/api/auth/${kind}`, { email }) });
}

export function useReset() {
  return useMutation({ mutationFn: (body: ResetPasswordBody) => api('POST', '/api/auth/reset-password', body) });
}
