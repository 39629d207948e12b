import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { keepAccessToken } from './access-token';
import { apiClient, refreshSession } from './api-client';
import { type Person, type SignedIn } from './api-model';
import { hasStatus } from './api-problem';

/** Remembers that this browser had a session, so that a first visit asks for none. Holds no secret. */
const HINT = 'ohmstead-was-here';

function remember(isIn: boolean): void {
  if (isIn) localStorage.setItem(HINT, '1');
  else localStorage.removeItem(HINT);
}

/** Query options of the person who is signed in; null when nobody is. */
export function sessionQuery() {
  return queryOptions({
    queryKey: ['session'],
    queryFn: async (): Promise<Person | null> => {
      if (!localStorage.getItem(HINT)) return null;
      try {
        return (await refreshSession()).person;
      } catch (error) {
        if (hasStatus(error, 401) || hasStatus(error, 403)) {
          remember(false);
          return null;
        }
        throw error;
      }
    },
    staleTime: Infinity,
    gcTime: Infinity,
    retry: 1,
  });
}

/** The person who is signed in. */
export function useSession() {
  return useQuery(sessionQuery());
}

/** What to do once the service has let somebody in, and how to leave again. */
export function useSessionActions() {
  const client = useQueryClient();
  const enter = (signedIn: SignedIn) => {
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
    keepAccessToken(signedIn.accessToken);
    remember(true);
    client.setQueryData(sessionQuery().queryKey, signedIn.person);
  };
  /** The person who was here signs in anew; what the screens hold stays. */
  const comeBack = (signedIn: SignedIn) => {
    keepAccessToken(signedIn.accessToken);
    remember(true);
    client.setQueryData(sessionQuery().queryKey, signedIn.person);
  };
  const leave = async () => {
    // Signing out must also work while the service is away: the token is forgotten either way.
    await apiClient.post('/auth/sign-out').catch(() => undefined);
    keepAccessToken(null);
    remember(false);
    client.setQueryData(sessionQuery().queryKey, null);
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
  };
  return { enter, comeBack, leave };
}
