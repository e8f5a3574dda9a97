import { randomUUID } from 'node:crypto';

import type { RequestHandler, Response } from 'express';
import { pinoHttp } from 'pino-http';

import type { Logger } from '../logger.ts';

const HEADER = 'X-Request-Id';

/** The id that the log, the answer's header and a problem's `instance` have in common. */
export const requestId = (response: Response): string => String(response.getHeader(HEADER) ?? '');

/** The end of a link to a shared plan is a secret and must not be found in a log. */
export const withoutSecret = (path: string): string =>
  path.replace(/^(\/api\/shared-plans|\/shared)\/.*/, '$1/…');

/** Gives each request an id and writes one line for it. */
export function requestLog(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    quietReqLogger: true,
    customAttributeKeys: { reqId: 'requestId', err: 'error' },
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader(HEADER, id);
      return id;
    },
    customLogLevel: (_request, response, error) =>
      error || response.statusCode >= 500 ? 'warn' : 'info',
    serializers: {
      req: ({ id, method, url }: { id: string; method: string; url: string }) => ({
        id,
        method,
        path: withoutSecret(url.split('?')[0] ?? ''),
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ status: statusCode }),
    },
  });
}
