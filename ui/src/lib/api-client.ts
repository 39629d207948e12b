import axios, { type AxiosError, type InternalAxiosRequestConfig, isAxiosError } from 'axios';
import { accessToken, endSession, hasSessionEnded, keepAccessToken } from './access-token';
import { type SignedIn } from './api-model';
import { hasStatus, toApiProblem } from './api-problem';

interface RetriedConfig extends InternalAxiosRequestConfig {
  /** Set once the request was sent again with a fresh token. */
  isRetried?: boolean;
}

/** The one client of the service's API; refusals are thrown as ApiProblem. */
export const apiClient = axios.create({ baseURL: '/api', withCredentials: true, timeout: 60_000 });

let refreshing: Promise<SignedIn> | null = null;

/**
 * Asks for a new access token with the refresh cookie. Calls at the same time share one request,
 * because each refresh makes the cookie of the one before worthless.
 *
 * @returns the token and the person it belongs to.
 * @throws ApiProblem 401 when nobody is signed in.
 */
export function refreshSession(): Promise<SignedIn> {
  refreshing ??= apiClient
    .post<SignedIn>('/auth/refresh')
    .then(({ data }) => {
      keepAccessToken(data.accessToken);
      return data;
    })
    .finally(() => {
      refreshing = null;
    });
  return refreshing;
}

apiClient.interceptors.request.use((config) => {
  const token = accessToken();
  if (token) config.headers.set('Authorization', `Bearer ${token}`);
  return config;
});

apiClient.interceptors.response.use(undefined, async (error: unknown) => {
  if (!isExpired(error)) throw toApiProblem(error);
  const config: RetriedConfig = { ...error.config!, isRetried: true };
  try {
    await refreshSession();
  } catch (failure) {
    // A network or a service that is down ends no session; only a refusal does.
    const isOver = hasStatus(failure, 401) || hasStatus(failure, 403);
    // The request waits until the person has signed in again: what they typed goes on from there.
    if (!isOver || !(await endSession())) throw toApiProblem(error);
  }
  return apiClient.request(config);
});

function isExpired(error: unknown): error is AxiosError {
  if (!isAxiosError(error) || error.response?.status !== 401) return false;
  const config = error.config as RetriedConfig | undefined;
  return !!config && !config.isRetried && !config.url?.startsWith('/auth/') && isInside();
}

/** True while a refusal means that a session ran out, not that there never was one. */
function isInside(): boolean {
  return accessToken() !== null || hasSessionEnded();
}
