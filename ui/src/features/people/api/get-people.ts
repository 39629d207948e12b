import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';
import { type Person } from '@/lib/api-model';

/** Query options of everybody who works in the shop. */
export function peopleQuery() {
  return queryOptions({
    queryKey: ['people'],
    queryFn: async ({ signal }) => (await apiClient.get<Person[]>('/people', { signal })).data,
  });
}

/** Everybody who works in the shop; owners only. */
export function usePeople() {
  return useQuery(peopleQuery());
}
