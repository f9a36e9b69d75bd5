import { randomUUID } from 'node:crypto';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** One line a request: method, path, status, time. Never a body, a query, a cookie or an identity. */
export const logRequests = (logger: Logger) =>
  pinoHttp({
    logger,
    genReqId: () => randomUUID(),
    autoLogging: { ignore: (request) => !request.url?.startsWith('/api') },
    serializers: {
      req: (request: { method: string; url: string; id: string }) => ({
        id: request.id,
        method: request.method,
        path: request.url.split('?')[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  });
