import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type CaseReading } from '@/lib/bench/case-reading';

/** Fetches all readings of a case, with those that were replaced or withdrawn. */
export async function getReadingHistory(
  caseId: string,
  signal?: AbortSignal,
): Promise<CaseReading[]> {
  const { data } = await apiClient.get<CaseReading[]>(`/cases/${caseId}/readings`, {
    params: { history: 1 },
    signal,
  });
  return data;
}

/** Query options of a case's readings with their history. */
export function readingHistoryQuery(caseId: string) {
  return queryOptions({
    queryKey: ['cases', caseId, 'reading-history'],
    queryFn: ({ signal }) => getReadingHistory(caseId, signal),
  });
}

/** History of a case's readings, asked for when it is looked at. */
export function useReadingHistory(caseId: string) {
  return useQuery({ ...readingHistoryQuery(caseId), staleTime: 0 });
}
