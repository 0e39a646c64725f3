import helmet from 'helmet';
import type { RequestHandler } from 'express';

/** What the pages may do: our own files only, no inline script, and styles only under this answer's nonce. */
export const pagePolicy = (nonce: string): string =>
  [
    "default-src 'self'",
    "worker-src 'self'",
    `style-src 'self' 'nonce-${nonce}'`,
    "script-src 'self'",
    "img-src 'self' blob: data:",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
    "require-trusted-types-for 'script'",
    'trusted-types angular angular#bundler default',
  ].join('; ');

/** What a page without the application may do: be dressed in our style sheet and letters, nothing more. */
export const plainPolicy = [
  "default-src 'none'",
  "style-src 'self'",
  "font-src 'self'",
  "base-uri 'none'",
  "frame-ancestors 'none'",
].join('; ');

const refusals = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: { defaultSrc: ["'none'"], frameAncestors: ["'none'"], baseUri: ["'none'"] },
  },
  strictTransportSecurity: { maxAge: 31_536_000, includeSubDomains: true },
  referrerPolicy: { policy: 'no-referrer' },
  frameguard: { action: 'deny' },
});

/** The headers of every answer; what is not a page may do nothing at all in a browser, and nothing is for a search engine. */
export const safetyHeaders = (): RequestHandler => (request, response, next) => {
  response.setHeader('X-Robots-Tag', 'noindex, nofollow');
  refusals(request, response, next);
};
