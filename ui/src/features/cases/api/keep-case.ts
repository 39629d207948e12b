import { type QueryClient } from '@tanstack/react-query';
import { type Case } from '@/lib/api-model';
import { caseQuery } from './get-case';

/** Puts a case that the service just answered where the screens read it, and lists anew. */
export function keepCase(client: QueryClient, changed: Case): Promise<void> {
  client.setQueryData(caseQuery(String(changed.id)).queryKey, changed);
  return client.invalidateQueries({ queryKey: ['cases', 'list'] });
}
