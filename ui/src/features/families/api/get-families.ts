import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type FamilySummary } from '@/lib/api-model';

/** Query options of the chassis families that a search finds. */
export function familiesQuery(search = '') {
  return queryOptions({
    queryKey: ['families', 'list', search],
    queryFn: async ({ signal }) => {
      const params = { search: search || undefined };
      return (await apiClient.get<FamilySummary[]>('/families', { params, signal })).data;
    },
    placeholderData: keepPreviousData,
  });
}

/** The chassis families that a search finds; all of them when it is empty. */
export function useFamilies(search = '') {
  return useQuery(familiesQuery(search));
}
