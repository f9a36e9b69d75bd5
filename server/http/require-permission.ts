import type { Request, RequestHandler } from 'express';
import { can } from '../../shared/permissions';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import type { Permission } from './route';

/** The signed-in person of a request; 401 without one. */
export function actorOf(request: Request): Actor {
  if (!request.user) throw new Problem('not-signed-in');
  return request.user as Actor;
}

export const requirePermission =
  (permission: Permission): RequestHandler =>
  (request, _response, next) => {
    if (permission === 'public') return next();
    const actor = actorOf(request);
    if (permission !== 'signed-in' && !can(actor, permission)) throw new Problem('not-permitted');
    next();
  };
