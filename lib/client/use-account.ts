import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { ChangeAccountBody, ChangePasswordBody, SignUpBody } from '@/lib/contracts/account';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { callApi } from './call-api';
import { meKey } from './use-me';

const sessionsKey = ['account', 'sessions'] as const;

export function useSignUp() {
  return useMutation({ mutationFn: (body: SignUpBody) => callApi(ENDPOINTS.signUp, { body }) });
}

export function useChangeAccount() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangeAccountBody) => callApi(ENDPOINTS.changeAccount, { body }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: meKey }),
  });
}

/** Ends every other session, so the list of them is read again. */
export function useChangePassword() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangePasswordBody) => callApi(ENDPOINTS.changePassword, { body }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: sessionsKey }),
  });
}

/** The devices on which the account is signed in. */
export function useSessions() {
  return useQuery({
    queryKey: sessionsKey,
    queryFn: ({ signal }) => callApi(ENDPOINTS.listSessions, {}, { signal }),
  });
}

export function useEndSession() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (sessionId: string) => callApi(ENDPOINTS.endSession, { params: { sessionId } }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: sessionsKey }),
  });
}

export function useSignOutEverywhere() {
  return useMutation({ mutationFn: () => callApi(ENDPOINTS.signOutEverywhere, {}) });
}
