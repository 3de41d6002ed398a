import compression from 'compression';
import express, { type Express } from 'express';
import { constants } from 'node:zlib';
import { sessionCookie } from './auth/cookie.ts';
import type { Deps } from './deps.ts';
import { demandContract } from './http/contract.ts';
import { demandJson, refuseCrossSite } from './http/crossSite.ts';
import { answerErrors } from './http/errors.ts';
import { mountRoutes } from './http/mount.ts';
import { requestLog } from './http/requestLog.ts';
import { securityHeaders } from './http/security.ts';
import { unlisted } from './http/unlisted.ts';
import { notFound } from './problems.ts';
import { routes } from './routes/routes.ts';
import { createServices } from './services.ts';

/** The lowest level: most of the saving for a fraction of the work. */
const QUICK = { level: constants.Z_BEST_SPEED };
/** What a connection sends before the first acknowledgement (RFC 6928): less is no sooner there. */
const FIRST_FLIGHT_BYTES = 10 * 1460;

/** Everything a request passes, in the order in which it passes it. */
export async function createApp(deps: Deps): Promise<Express> {
  const { config, log, pages } = deps;
  const services = await createServices(deps);
  const app = express();
  app.set('trust proxy', config.trustedProxies);
  app.disable('x-powered-by');
  app.disable('etag');

  app.use(requestLog(log));
  app.use(securityHeaders(config));
  app.use(['/shared', '/api/shared', '/guest', '/api/guest'], unlisted);
  app.use('/api', compression({ ...QUICK, threshold: FIRST_FLIGHT_BYTES }));
  app.use('/api', refuseCrossSite(config), demandContract(deps.clock), demandJson);
  app.use('/api', express.json({ limit: config.limits.bodyBytes, strict: false }));
  app.use('/api', sessionCookie(config));
  app.use(mountRoutes(routes, { ...deps, ...services }));
  app.use(compression(QUICK), pages);
  app.use((_req, _res, next) => next(notFound()));
  app.use(answerErrors);
  return app;
}
