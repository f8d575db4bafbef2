import { QueryClient } from '@tanstack/react-query';
import { ApiError } from './api-error';

/** Tries again what may come right by itself; an answer that says no is taken at its word. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (failures, error) => failures < 2 && mayComeRight(error),
      },
    },
  });
}

function mayComeRight(error: Error): boolean {
  return !(error instanceof ApiError) || error.status >= 500;
}
