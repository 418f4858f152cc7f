import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';

/** Content security policy and its companions (OWASP ASVS 5.0 V3.4). Styles of elements are set by React and Ionic. */
export function securityHeaders(isHttps: boolean) {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        mediaSrc: ["'self'", 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        manifestSrc: ["'self'"],
        formAction: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        frameAncestors: ["'none'"],
      },
    },
    // on plain http a browser must not be told to come back by https
    strictTransportSecurity: isHttps ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'no-referrer' },
  });
}

/** Position, camera and microphone are this application's own business. */
export function permissionsPolicy(_request: Request, response: Response, next: NextFunction): void {
  response.setHeader('Permissions-Policy', 'geolocation=(self), camera=(self), microphone=(self)');
  next();
}

/** Nothing under /api may be kept by anybody on the way. */
export function neverCached(_request: Request, response: Response, next: NextFunction): void {
  response.setHeader('Cache-Control', 'private, no-store');
  next();
}
