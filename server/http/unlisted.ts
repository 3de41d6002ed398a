import type { RequestHandler } from 'express';

/** Addresses that carry a token: kept out of search engines, caches and other sites' logs. */
export const unlisted: RequestHandler = (_req, res, next) => {
  res.setHeader('Referrer-Policy', 'no-referrer');
  res.setHeader('X-Robots-Tag', 'noindex, nofollow');
  res.setHeader('Cache-Control', 'no-store');
  next();
};
