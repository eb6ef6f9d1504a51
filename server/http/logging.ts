import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import { pino, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Settings } from '../config/settings.ts';

/** The server's log: lines of JSON on the standard output. */
export function createLogger({ logLevel }: Pick<Settings, 'logLevel'>): Logger {
  return pino({ level: logLevel });
}

/** Gives each request an id, in the log and as `X-Request-Id`, so that a report can be found. */
export function logRequests(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    genReqId: (_, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    // What was asked and what came of it; no header, so never a cookie.
    serializers: {
      req: ({ id, method, url, remoteAddress }: LoggedRequest) => ({ id, method, url, remoteAddress }),
      res: ({ statusCode }: LoggedResponse) => ({ statusCode }),
    },
    // What went wrong is logged where it was caught; here it would only be that something did.
    customErrorObject: (_request, _response, _error, value: object) => ({ ...value, err: undefined }),
    customLogLevel: (_, response, error) => (error !== undefined || response.statusCode >= 500 ? 'error' : 'info'),
  });
}

interface LoggedRequest {
  readonly id: unknown;
  readonly method: string;
  readonly url: string;
  readonly remoteAddress: string;
}

interface LoggedResponse {
  readonly statusCode: number | null;
}
