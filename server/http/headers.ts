import type { RequestHandler } from 'express';
import helmet from 'helmet';

/**
 * Security headers on every response. Maths places glyphs with style attributes, so style is split: no inline style
 * sheet anywhere, attributes allowed; what people write is sanitised before maths is set and cannot reach one.
 */
export const securityHeaders = (): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrcElem: ["'self'"],
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        manifestSrc: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        baseUri: ["'none'"],
        objectSrc: ["'none'"],
        reportUri: ['/api/csp-report'],
      },
    },
    strictTransportSecurity: { maxAge: 31_536_000, includeSubDomains: true },
    referrerPolicy: { policy: 'same-origin' },
    crossOriginOpenerPolicy: { policy: 'same-origin' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
  });

const DENIED = ['camera', 'geolocation', 'microphone', 'payment', 'usb', 'display-capture', 'browsing-topics'];

/** What the browser may not even ask for, and that nothing of the API or the pages is kept in a cache. */
export const privacyHeaders: RequestHandler = (_request, response, next) => {
  response.setHeader('Permissions-Policy', DENIED.map((feature) => `${feature}=()`).join(', '));
  response.setHeader('Cache-Control', 'no-store');
  next();
};
