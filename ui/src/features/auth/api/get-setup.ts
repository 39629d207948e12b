import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';

/** Query options of whether this shop still needs its owner. */
export function setupQuery() {
  return queryOptions({
    queryKey: ['auth', 'setup'],
    queryFn: async ({ signal }) =>
      (await apiClient.get<{ needed: boolean }>('/auth/setup', { signal })).data,
    staleTime: 60_000,
  });
}

/** Whether this shop still needs its owner. */
export function useSetup() {
  return useQuery(setupQuery());
}
