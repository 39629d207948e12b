import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { type ComparePoint } from '@engine/diagnosis-types';
import { apiClient } from '@/lib/api-client';

export interface Comparison {
  points: ComparePoint[];
  lineVolts: number;
}

/** Fetches measured and computed values of a case, side by side. */
export async function getCompare(caseId: string, signal?: AbortSignal): Promise<Comparison> {
  const { data } = await apiClient.get<Comparison>(`/cases/${caseId}/compare`, { signal });
  return data;
}

/** Query options of the comparison for one state of the case. */
export function compareQuery(caseId: string, revision: string) {
  return queryOptions({
    queryKey: ['cases', caseId, 'compare', revision],
    queryFn: ({ signal }) => getCompare(caseId, signal),
    placeholderData: keepPreviousData,
  });
}

/** Comparison of a case; the one before stays on the screen while a new one is fetched. */
export function useCompare(caseId: string, revision: string) {
  return useQuery(compareQuery(caseId, revision));
}
