import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Family } from '@/lib/api-model';

/** Query options of one chassis family. */
export function familyQuery(id: string) {
  return queryOptions({
    queryKey: ['families', id],
    queryFn: async ({ signal }) =>
      (await apiClient.get<Family>(`/families/${id}`, { signal })).data,
  });
}

/** One chassis family with its circuit and what solved cases found. */
export function useFamily(id: string) {
  return useQuery(familyQuery(id));
}
