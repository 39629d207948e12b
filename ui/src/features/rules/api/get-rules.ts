import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type RuleList } from '@/lib/api-model';

/** Query options of what the shop's technicians know, as rules. */
export function rulesQuery() {
  return queryOptions({
    queryKey: ['rules'],
    queryFn: async ({ signal }) => (await apiClient.get<RuleList>('/rules', { signal })).data,
    staleTime: 60_000,
  });
}

/** Every rule, and the files that were refused. */
export function useRules() {
  return useQuery(rulesQuery());
}
