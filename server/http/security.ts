import helmet from 'helmet';
import type { RequestHandler } from 'express';
import type { Config } from '../config.ts';

/** Nothing from elsewhere, nothing inline. React sets styles through the DOM, which this allows. */
export function securityHeaders(config: Pick<Config, 'secureCookies'>): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    // Join links carry a token in their address.
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: config.secureCookies,
  });
}
