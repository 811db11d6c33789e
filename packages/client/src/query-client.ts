import { QueryClient } from '@tanstack/react-query';
import { isApiError } from './call/api-error.ts';

/** A refusal is final; only a lost connection or a fault on our side is worth another try. */
const worthRetrying = (failures: number, error: Error): boolean =>
  failures < 2 && isApiError(error) && (error.code === 'network' || error.status >= 500);

export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: { retry: worthRetrying, staleTime: 10_000, refetchOnWindowFocus: true },
      mutations: { retry: false },
    },
  });
