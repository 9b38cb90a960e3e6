import { useMutation } from '@tanstack/react-query';
import type { ResetPasswordBody, SignInBody, SignUpBody } from '../../../shared/contracts/auth.ts';
import { api } from '../../lib/api.ts';
import { useSessionChange } from '../../lib/session.ts';

export function useSignUp() {
  return useMutation({ mutationFn: (body: SignUpBody) => api('POST', '/api/auth/sign-up/email', body) });
}

export function useSignIn() {
  const changed = useSessionChange();
  return useMutation({
    mutationFn: (body: SignInBody) => api('POST', '/api/auth/sign-in/email', body),
    onSuccess: changed,
  });
}

export function useConfirm() {
  const changed = useSessionChange();
  return useMutation({
    mutationFn: (token: string) => api('GET', `/api/auth/verify-email?token=${encodeURIComponent(token)}`),
    onSuccess: changed,
  });
}

/** A message to an address: to confirm it once more, or to choose a new password. */
export function useSendMail(kind: 'send-verification-email' | 'request-password-reset') {
  return useMutation({ mutationFn: (email: string) => api('POST', `/api/auth/${kind}`, { email }) });
}

export function useReset() {
  return useMutation({ mutationFn: (body: ResetPasswordBody) => api('POST', '/api/auth/reset-password', body) });
}
