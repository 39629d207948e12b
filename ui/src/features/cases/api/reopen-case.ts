import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Case } from '@/lib/api-model';
import { keepCase } from './keep-case';

/** Opens a closed case again. */
export function useReopenCase(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async () => (await apiClient.post<Case>(`/cases/${id}/reopen`, {})).data,
    onSuccess: (changed) => keepCase(client, changed),
  });
}
