import type { RequestHandler } from 'express';
import { Problem } from '../kernel/problem';

const harmless = new Set(['GET', 'HEAD', 'OPTIONS']);

const hostOf = (origin: string) => (URL.canParse(origin) ? new URL(origin).host : null);

/**
 * A browser says where a request comes from (Fetch Metadata, Origin); one from another site may not change anything.
 * A program without these headers is let through: it has no victim's cookie.
 */
export const refuseCrossSite: RequestHandler = (request, _response, next) => {
  if (harmless.has(request.method)) return next();
  const site = request.get('sec-fetch-site');
  if (site && site !== 'same-origin' && site !== 'none') throw new Problem('cross-site');
  const origin = request.get('origin');
  if (origin && hostOf(origin) !== request.get('host')) throw new Problem('cross-site');
  next();
};
