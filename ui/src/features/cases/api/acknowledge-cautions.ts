import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Case } from '@/lib/api-model';
import { keepCase } from './keep-case';

/** Records that the person who is signed in has read the cautions of a case. */
export function useAcknowledgeCautions(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async () => (await apiClient.post<Case>(`/cases/${id}/cautions`, {})).data,
    onSuccess: (changed) => keepCase(client, changed),
  });
}
