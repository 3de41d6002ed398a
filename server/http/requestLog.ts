import { randomUUID } from 'node:crypto';
import type { IncomingMessage } from 'node:http';
import { pinoHttp } from 'pino-http';
import type { RequestHandler } from 'express';
import type { Log } from '../log.ts';

/** A link's token opens a brewery or a chain, so its address is not written down. */
const withoutSecrets = (url: string | undefined) =>
  url?.split('?')[0]?.replace(/^(\/api)?\/(join|shared|guest)\/[^/]+/, '$1/$2/…');

/** The network that somebody came from, which is enough to see a flood. */
export const shortAddress = (address: string | undefined) =>
  address?.replace(/(\.\d+|:[0-9a-f]*:[0-9a-f]*)$/i, '…');

/** One line a request, with an id that also stands in problem documents and in the X-Request-Id header. */
export function requestLog(log: Log): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: (_req, res) => {
      const id = randomUUID();
      res.setHeader('X-Request-Id', id);
      return id;
    },
    serializers: {
      req: (req: { id: string; method: string; url: string; raw: IncomingMessage }) => ({
        id: req.id,
        method: req.method,
        url: withoutSecrets(req.url),
        from: shortAddress(req.raw.socket.remoteAddress),
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customLogLevel: (_req, res, error) =>
      res.statusCode >= 500 || error !== undefined ? 'warn' : 'info',
    autoLogging: { ignore: (req) => req.url === '/api/health' || req.url === '/api/ready' },
  });
}
