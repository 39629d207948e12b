import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import { pinoHttp } from 'pino-http';

/** One log line per request: what and how long, never bodies, cookies or tokens. */
export function requestLog(): RequestHandler {
  return pinoHttp({
    level: process.env.LOG_LEVEL ?? 'info',
    genReqId: () => randomUUID(),
    serializers: {
      req: ({ id, method, url }: { id: string; method: string; url: string }) => ({
        id,
        method,
        url: url.split('?')[0],
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    },
    customLogLevel: (_, response) => (response.statusCode >= 500 ? 'error' : 'debug'),
  });
}
