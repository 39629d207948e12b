import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from '@/lib/api-problem';

/** Makes the cache of what the service answered; one per page, one per test. */
export function makeQueryClient(retries = 2): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 10_000,
        // A refusal stays a refusal; only a service that was not reached is asked again.
        retry: (count, error) =>
          count < retries && !(error instanceof ApiProblem && error.status < 500),
      },
    },
  });
}
