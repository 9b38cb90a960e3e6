import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { ChangeMeBody, MeView, SessionView, SignedInView } from '../../../shared/contracts/account.ts';
import type { ChangePasswordBody } from '../../../shared/contracts/auth.ts';
import { locale } from '../../i18n/i18n.ts';
import { api } from '../../lib/api.ts';
import { sessionQuery, useSessionChange } from '../../lib/session.ts';

export const sessionsQuery = queryOptions({
  queryKey: ['sessions'],
  queryFn: () => api<SignedInView[]>('GET', '/api/me/sessions'),
});

export function useChangeMe() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (changes: ChangeMeBody) => api<MeView>('PATCH', '/api/me', changes),
    onSuccess: (me) => {
      client.setQueryData<SessionView>(sessionQuery.queryKey, (session) => session && { ...session, me });
      if (me.language === locale.get()) return undefined;
      // Problems, lessons and slips come from the server in the reader's language.
      return client.invalidateQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
    },
  });
}

export function useChangeAddress() {
  return useMutation({ mutationFn: (newEmail: string) => api('POST', '/api/auth/change-email', { newEmail }) });
}

export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangePasswordBody) => api('POST', '/api/auth/change-password', body),
    onSuccess: () => client.invalidateQueries(sessionsQuery),
  });
}

/** Ends one session, or with null all but this one. */
export function useEndSession() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string | null) => api('DELETE', id === null ? '/api/me/sessions' : `/api/me/sessions/${id}`),
    onSettled: () => client.invalidateQueries(sessionsQuery),
  });
}

/** `leave` goes to a page for everyone first: the guarded one would ask to sign in again. */
export function useSignOut(leave: () => void) {
  const changed = useSessionChange();
  return useMutation({
    mutationFn: () => api('POST', '/api/auth/sign-out', {}),
    onSuccess: () => {
      leave();
      return changed();
    },
  });
}

export function useDeleteMe(leave: () => void) {
  const changed = useSessionChange();
  return useMutation({
    mutationFn: (password: string) => api('DELETE', '/api/me', { password }),
    onSuccess: () => {
      leave();
      return changed();
    },
  });
}
