import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Case, type ConfirmedFault, type Outcome } from '@/lib/api-model';
import { keepCase } from './keep-case';

/** How a case ended. */
export interface Closing {
  outcome: Outcome;
  confirmedFaults: ConfirmedFault[];
  note: string;
}

/** Closes a case. */
export function useCloseCase(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (closing: Closing) =>
      (await apiClient.post<Case>(`/cases/${id}/close`, closing)).data,
    onSuccess: (changed) => keepCase(client, changed),
  });
}
