import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type CaseSummary } from '@/lib/api-model';

export interface CaseFilter {
  /** `open` for all that are not closed, `closed`, or `all`. */
  state: string;
  /** Found in number, set and complaint. */
  search: string;
  /** Only cases of the person who is signed in. */
  isMine: boolean;
}

/** Query options of the cases that pass a filter. */
export function casesQuery(filter: CaseFilter) {
  return queryOptions({
    queryKey: ['cases', 'list', filter],
    queryFn: async ({ signal }) => {
      const params = {
        state: filter.state,
        search: filter.search || undefined,
        mine: filter.isMine || undefined,
      };
      return (await apiClient.get<CaseSummary[]>('/cases', { params, signal })).data;
    },
    placeholderData: keepPreviousData,
  });
}

/** The cases that pass a filter. */
export function useCases(filter: CaseFilter) {
  return useQuery(casesQuery(filter));
}
