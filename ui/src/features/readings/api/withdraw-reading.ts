import { apiClient } from '@/lib/api-client';

/** Takes a reading back; the case keeps it in its history. */
export async function withdrawReading(caseId: string, readingId: number): Promise<void> {
  await apiClient.delete(`/cases/${caseId}/readings/${readingId}`);
}
