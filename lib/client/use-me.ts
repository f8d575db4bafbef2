import { useQuery, useQueryClient } from '@tanstack/react-query';
import type { Me } from '@/lib/contracts/account';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { ApiError } from './api-error';
import { callApi } from './call-api';

export const meKey = ['me'] as const;

/** Who is signed in; `data` is null for nobody. */
export function useMe() {
  return useQuery({ queryKey: meKey, queryFn: ({ signal }) => fetchMe(signal), staleTime: 60_000 });
}

/** Forgets all that was fetched for the account that was signed in before. */
export function useForgetAccount(): () => void {
  const queryClient = useQueryClient();
  return () => queryClient.clear();
}

async function fetchMe(signal: AbortSignal): Promise<Me | null> {
  try {
    return await callApi(ENDPOINTS.me, {}, { signal });
  } catch (error) {
    if (error instanceof ApiError && error.code === 'not-signed-in') return null;
    throw error;
  }
}
