import { useMutation } from '@tanstack/react-query';
import { type Reading, type Take } from '@engine/netlist/types';
import { apiClient } from '@/lib/api-client';

/** Which part's value is unknown, and the reading it should explain. */
export interface ClosedFormRequest {
  part: string;
  take: Take;
  at?: [string, string];
  readingPart?: string;
}

/** One reading as a formula in one part's value. */
export interface ClosedForm {
  part: string;
  reading: Reading;
  text: string;
  tex?: string;
  mathml?: string;
  /** Value the part would need; null when no value explains the reading. */
  impliedValue: number | null;
  unit: 'ohms';
  note: string;
}

/**
 * Asks for a reading as a formula in one part's value, and for the value that explains what was measured.
 *
 * @throws a problem when the reading does not depend on the part.
 */
export async function findClosedForm(
  caseId: string,
  request: ClosedFormRequest,
): Promise<ClosedForm> {
  const { data } = await apiClient.post<ClosedForm>(
    `/cases/${caseId}/working/closed-form`,
    request,
  );
  return data;
}

/** Closed form on demand. */
export function useClosedForm(caseId: string) {
  return useMutation({
    mutationFn: (request: ClosedFormRequest) => findClosedForm(caseId, request),
  });
}
