import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Page, type PartFact } from '@/lib/api-model';

export type PartsTable = 'tubes' | 'lamps';

export interface PartsFilter {
  table: PartsTable;
  search: string;
  /** How many rows were left out before the first one. */
  offset: number;
}

/** Rows on one page. */
export const PARTS_PAGE = 50;

/** Query options of one page of tube or lamp data. */
export function partsDataQuery({ table, search, offset }: PartsFilter) {
  return queryOptions({
    queryKey: ['parts-data', table, search, offset],
    queryFn: async ({ signal }) => {
      const params = { search: search || undefined, limit: PARTS_PAGE, offset };
      return (await apiClient.get<Page<PartFact>>(`/parts-data/${table}`, { params, signal })).data;
    },
    placeholderData: keepPreviousData,
    staleTime: 300_000,
  });
}

/** One page of tube or lamp data. */
export function usePartsData(filter: PartsFilter) {
  return useQuery(partsDataQuery(filter));
}
