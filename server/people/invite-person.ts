import type { SavedPerson } from '../../shared/contract/person';
import { noteAudit } from '../audit/audit.store';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { Problem } from '../kernel/problem';
import { findPerson } from './person.store';
import { dropLinks, makeLink } from './sign-in-link.store';

const validMs = 7 * 86_400_000;

/** Makes a one-time link for choosing a password, valid for seven days; earlier open ones end. */
export async function makeInvitation(tx: Db, actor: Actor, personId: string, now: Date): Promise<string> {
  await dropLinks(tx, 'invitation', personId);
  const expiresAt = new Date(now.getTime() + validMs);
  const token = await makeLink(tx, { purpose: 'invitation', personId, expiresAt });
  await noteAudit(tx, {
    hospitalId: actor.hospitalId,
    actorId: actor.id,
    action: 'invited',
    subject: 'person',
    subjectId: personId,
    after: { expiresAt },
  });
  return token;
}

/** A new link for somebody who can sign in: after the first one expired, or for a forgotten password. */
export const invitePerson = (
  db: Db,
  actor: Actor,
  personId: string,
  { now, origin }: { now: Date; origin: string },
): Promise<SavedPerson> =>
  db.transaction(async (tx) => {
    const person = await findPerson(tx, actor.hospitalId, personId);
    if (!person) throw new Problem('not-found');
    if (person.email === null)
      throw fieldProblem({ pointer: '/email', detail: 'Without an e-mail address there is no sign-in.' });
    if (!person.isActive)
      throw fieldProblem({ pointer: '/isActive', detail: 'Somebody who has left is not invited.' });
    return {
      person,
      invitationUrl: buildInvitationUrl(origin, await makeInvitation(tx, actor, personId, now)),
    };
  });

export const buildInvitationUrl = (origin: string, token: string): string => `${origin}/welcome/${token}`;
