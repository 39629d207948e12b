import { useMutation, useQueryClient } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Person, type Role } from '@/lib/api-model';

export interface PersonChange {
  id: number;
  role?: Role;
  isBlocked?: boolean;
}

/** Gives somebody another role, blocks them, or lets them in again. */
export function useChangePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ id, ...change }: PersonChange) =>
      (await apiClient.patch<Person>(`/people/${id}`, change)).data,
    onSuccess: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}
