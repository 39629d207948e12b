import { type Seen, type Take } from '@engine/netlist/types';
import { apiClient } from '@/lib/api-client';
import { type CaseReading } from '@/lib/bench/case-reading';

/** One reading as it is sent. */
export interface NewReading {
  clientId: string;
  take: Take;
  at?: [string, string];
  part?: string;
  value?: number | 'OL';
  seen?: Seen;
  meterId?: number;
}

/**
 * Stores readings; one that was stored before under its `clientId` is not stored again.
 *
 * @returns the stored readings.
 */
export async function saveReadings(
  caseId: string,
  readings: readonly NewReading[],
): Promise<CaseReading[]> {
  const { data } = await apiClient.post<CaseReading[]>(`/cases/${caseId}/readings`, { readings });
  return data;
}
