import type { RequestHandler } from 'express';
import { Problem } from '#server/errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * The cross-site rule: a request that may change something must come from our own pages. Browsers say so in
 * Sec-Fetch-Site; older ones in Origin; a request with neither is refused.
 */
export function sameOriginOnly(publicOrigin: string): RequestHandler {
  return (request, _response, next) => {
    if (SAFE.has(request.method)) return next();
    const site = request.get('sec-fetch-site');
    const isOurs = site ? site === 'same-origin' : request.get('origin') === publicOrigin;
    if (!isOurs) throw new Problem(403, 'cross-site', 'This request did not come from a page of Plait.');
    next();
  };
}

/** Where a browser would show a response as a page of its own. The API answers scripts of ours, never a window. */
const WINDOWS = new Set(['document', 'embed', 'frame', 'iframe', 'object']);

/** Keeps the API out of windows and, where people reach Plait by https, off plain http. */
export function dataOnly(publicOrigin: string): RequestHandler {
  const isHttps = publicOrigin.startsWith('https:');
  return (request, _response, next) => {
    if (isHttps && !request.secure) {
      throw new Problem(403, 'not-secure', 'Plait answers over https only. See TRUST_PROXY in the README.');
    }
    if (WINDOWS.has(request.get('sec-fetch-dest') ?? '')) {
      throw new Problem(403, 'not-a-page', 'This address is not a page.');
    }
    next();
  };
}
