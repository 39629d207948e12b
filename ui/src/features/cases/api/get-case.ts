import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Case } from '@/lib/api-model';

/** Query options of one case. */
export function caseQuery(id: string) {
  return queryOptions({
    queryKey: ['cases', id, 'case'],
    queryFn: async ({ signal }) => (await apiClient.get<Case>(`/cases/${id}`, { signal })).data,
  });
}

/** One case with its circuit and what was found different. */
export function useCase(id: string) {
  return useQuery(caseQuery(id));
}
