import type { RequestHandler } from 'express';
import type { Config } from '../config.ts';
import { problem } from '../problems.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Changes are taken only from our own pages, or from a program that says where it comes from.
 * Browsers send Sec-Fetch-Site and do not let pages forge it; an older one sends Origin.
 */
export function refuseCrossSite(config: Pick<Config, 'publicUrl'>): RequestHandler {
  return (req, _res, next) => {
    if (SAFE.has(req.method)) return next();
    const site = req.get('sec-fetch-site');
    const own = config.publicUrl ?? `${req.protocol}://${req.get('host') ?? ''}`;
    const fromUs = site === undefined ? sameOrigin(req.get('origin'), own) : site === 'same-origin';
    next(fromUs ? undefined : problem('cross-site'));
  };
}

function sameOrigin(origin: string | undefined, own: string): boolean {
  return origin !== undefined && URL.canParse(own) && origin === new URL(own).origin;
}

/** A body must be called JSON: a form of another site cannot do that without asking first. */
export const demandJson: RequestHandler = (req, _res, next) => {
  const hasBody =
    req.headers['transfer-encoding'] !== undefined ||
    Number(req.headers['content-length'] ?? 0) > 0;
  const isJson = req.is('application/json') === 'application/json';
  next(hasBody && !isJson ? problem('not-json') : undefined);
};
