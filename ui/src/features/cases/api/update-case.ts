import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type AsFound, type Netlist } from '@engine/netlist/types';
import { apiClient } from '@/lib/api-client';
import { type Case } from '@/lib/api-model';
import { keepCase } from './keep-case';

/** What of a case can be changed; what is left out stays. */
export interface CaseChange {
  set?: string;
  complaint?: string;
  earlierWork?: string;
  lineVolts?: number | null;
  state?: string;
  asFound?: AsFound[];
  netlist?: Netlist;
  /** Version the change was made from; the service refuses it when somebody was quicker. */
  version: number;
}

/** Changes a case. */
export function useUpdateCase(id: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (change: CaseChange) =>
      (await apiClient.patch<Case>(`/cases/${id}`, change)).data,
    onSuccess: (changed) => keepCase(client, changed),
  });
}
