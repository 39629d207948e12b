import { type Meter } from '@engine/netlist/types';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { apiClient } from '@/lib/api-client';

/** A meter that somebody keeps at the bench. */
export interface OwnMeter extends Meter {
  id: number;
  name: string;
}

/** Fetches the meters of the person signed in. */
export async function getMeters(signal?: AbortSignal): Promise<OwnMeter[]> {
  const { data } = await apiClient.get<OwnMeter[]>('/meters', { signal });
  return data;
}

/** Query options of the person's meters. */
export const metersQuery = queryOptions({
  queryKey: ['meters'],
  queryFn: ({ signal }) => getMeters(signal),
  staleTime: 5 * 60_000,
});

/** Meters of the person signed in. */
export function useMeters() {
  return useQuery(metersQuery);
}
