import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { type Take } from '@engine/netlist/types';
import { apiClient } from '@/lib/api-client';

/** Measured beside computed at one point or part. */
export interface ComparePoint {
  kind: 'point' | 'part';
  /** Node or reference designator. */
  key: string;
  label: string;
  take: Take;
  at?: [string, string];
  part?: string;
  /** Healthy value as the meter would show it; null for over range. */
  value: number | null;
  /** 95 % interval of a healthy set. */
  low: number | null;
  high: number | null;
  /** What the service literature prints. */
  published?: number | null;
  measured?: number | 'OL' | null;
  /** (measured − value) / standard deviation. */
  deviations?: number | null;
  /** Place down the string or along the rails. */
  order: number;
}

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
