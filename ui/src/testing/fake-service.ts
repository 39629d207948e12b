import {
  type AxiosAdapter,
  AxiosError,
  AxiosHeaders,
  type InternalAxiosRequestConfig,
} from 'axios';
import { afterEach } from 'vitest';
import { apiClient } from '@/lib/api-client';

/** What a request was, for tests that look at it. */
export interface SeenRequest {
  method: string;
  path: string;
  params: Record<string, unknown>;
  body: unknown;
}

type Answer = (request: SeenRequest) => unknown;

/** An answer with a status other than 200. */
export class Refusal {
  readonly status: number;
  readonly body: Record<string, unknown>;

  constructor(status: number, code: string, body: Record<string, unknown> = {}) {
    this.status = status;
    this.body = { status, code, title: code, ...body };
  }
}

const realAdapter = apiClient.defaults.adapter;

/**
 * Plays the service: answers by "METHOD /path" without any network. What is not named is a 404.
 *
 * @param answers values or functions of the request; a returned Refusal becomes a problem.
 * @returns every request made, in order.
 */
export function fakeService(answers: Record<string, Answer | unknown>): SeenRequest[] {
  const seen: SeenRequest[] = [];
  const adapter: AxiosAdapter = (config) => {
    const request = requestOf(config);
    seen.push(request);
    const answer = answers[`${request.method} ${request.path}`] ?? new Refusal(404, 'not-found');
    const given: unknown = typeof answer === 'function' ? (answer as Answer)(request) : answer;
    return Promise.resolve(given).then((data) => respond(config, data));
  };
  apiClient.defaults.adapter = adapter;
  return seen;
}

function requestOf(config: InternalAxiosRequestConfig): SeenRequest {
  const body: unknown = typeof config.data === 'string' ? JSON.parse(config.data) : undefined;
  const params = (config.params ?? {}) as Record<string, unknown>;
  return { method: (config.method ?? 'get').toUpperCase(), path: config.url ?? '', params, body };
}

function respond(config: InternalAxiosRequestConfig, data: unknown) {
  const isRefusal = data instanceof Refusal;
  const response = {
    config,
    data: isRefusal ? data.body : data,
    status: isRefusal ? data.status : 200,
    statusText: '',
    headers: new AxiosHeaders(),
  };
  if (isRefusal) throw new AxiosError('refused', undefined, config, null, response);
  return response;
}

afterEach(() => {
  apiClient.defaults.adapter = realAdapter;
});
