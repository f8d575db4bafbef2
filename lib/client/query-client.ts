import { QueryClient } from '@tanstack/react-query';
import { NoAnswerError, ApiError, UnexpectedAnswerError } from './api-error';

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
  if (error instanceof ApiError || error instanceof UnexpectedAnswerError) return error.status >= 500;
  return error instanceof NoAnswerError;
}
