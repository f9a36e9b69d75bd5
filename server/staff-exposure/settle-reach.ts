import { scopeOf } from '../../shared/permissions';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';

/** Whose figures an answer holds: of one person (with links to their procedures), of everybody, or of everybody unnamed. */
export type Reach = { personId: string | null; isMasked: boolean };

/**
 * Own figures are open to everyone; another person's to the physicist only. Without a person the physicist
 * gets everybody, the committee everybody unnamed, and the others themselves.
 */
export function settleReach(actor: Actor, askedId: string | undefined): Reach {
  if (askedId === actor.id) return { personId: actor.id, isMasked: false };
  const scope = scopeOf(actor, 'staff-exposure.read');
  if (scope === 'all') return { personId: askedId ?? null, isMasked: false };
  if (askedId !== undefined)
    throw new Problem('not-permitted', 'A person’s exposure is open to that person and the physicist.');
  return scope === 'masked' ? { personId: null, isMasked: true } : { personId: actor.id, isMasked: false };
}
