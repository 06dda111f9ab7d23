import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError, isCode } from './api-error.ts';

/** Failures that may pass by themselves. */
const mayPass = (error: unknown): boolean =>
  error instanceof ApiError && (error.code === 'unreachable' || error.status >= 502);

/** `onSignedOut` is told when any call finds that the session has ended. */
export function createQueryClient(onSignedOut: () => void): QueryClient {
  const onError = (error: unknown) => {
    if (isCode(error, 'not-signed-in')) onSignedOut();
  };
  return new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: { staleTime: 10_000, retry: (count, error) => count < 2 && mayPass(error), refetchOnWindowFocus: true },
      // A save may have arrived though its answer did not: repeating is for the person, or for the feature that knows.
      mutations: { retry: false },
    },
  });
}
