import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';

/** One equation, as text and where the service gives it as MathML. */
export interface Equation {
  node: string;
  text: string;
  tex?: string;
  mathml?: string;
}

/** How the computed values of a case come about. */
export interface Working {
  nodes: string[];
  equations: Equation[];
  /** Unknown by its name in the equations; volts or amps. */
  solution: Record<string, number>;
  notes: string[];
  /** Largest part of an equation that is left over, relative to its largest term. */
  residual: number;
  agreesWithSolver: boolean;
}

/** Fetches the working of a case: equations at the operating point and their solution. */
export async function getWorking(caseId: string, signal?: AbortSignal): Promise<Working> {
  const { data } = await apiClient.get<Working>(`/cases/${caseId}/working`, { signal });
  return data;
}

/** Query options of the working for one version of the case. */
export function workingQuery(caseId: string, caseVersion?: number) {
  return queryOptions({
    queryKey: ['cases', caseId, 'working', caseVersion ?? ''],
    queryFn: ({ signal }) => getWorking(caseId, signal),
    placeholderData: keepPreviousData,
  });
}

/** Working of a case. */
export function useWorking(caseId: string, caseVersion?: number) {
  return useQuery(workingQuery(caseId, caseVersion));
}
