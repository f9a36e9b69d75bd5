import type { z } from 'zod';
import type { personInputSchema, SavedPerson } from '../../shared/contract/person';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { saveVersioned } from '../kernel/save-versioned';
import { findPasswordState, removeAccount, saveAccount } from './account.store';
import { guardAdministrators } from './guard-administrators';
import { buildInvitationUrl, makeInvitation } from './invite-person';
import { addPerson, findPerson, updatePerson } from './person.store';
import { dropLinks } from './sign-in-link.store';

type SavedFields = Omit<z.output<typeof personInputSchema>, 'version'>;
type When = { now: Date; origin: string };

/**
 * Adds a person (no id) or edits one, with the account and its audit line in one transaction. An e-mail
 * that cannot sign in yet gets a one-time link, whose address is told once and kept nowhere.
 */
export async function savePerson(
  db: Db,
  actor: Actor,
  id: string | null,
  { version, ...input }: z.output<typeof personInputSchema>,
  { now, origin }: When,
): Promise<SavedPerson> {
  if (input.email === null && input.roles.length > 0)
    throw fieldProblem({ pointer: '/email', detail: 'A role needs a sign-in: write the e-mail address.' });
  let token: string | null = null;
  const person = await saveVersioned(db, actor, {
    subject: 'person',
    uniqueField: { pointer: '/email', detail: 'Somebody signs in with this e-mail address already.' },
    id,
    version,
    find: (tx, personId) => findPerson(tx, actor.hospitalId, personId),
    add: async (tx, personId) => {
      await addPerson(tx, actor.hospitalId, { ...pickPerson(input), id: personId });
      token = await settleAccount(tx, actor, personId, input, now);
    },
    update: async (tx, personId, seen) => {
      await guardAdministrators(tx, actor, personId, input);
      const fields = { ...pickPerson(input), id: personId };
      if (!(await updatePerson(tx, actor.hospitalId, fields, seen))) return false;
      token = await settleAccount(tx, actor, personId, input, now);
      return true;
    },
  });
  return { person, invitationUrl: token && buildInvitationUrl(origin, token) };
}

const pickPerson = ({ name, job, statureM, isMonitored, isActive }: SavedFields) => ({
  name,
  job,
  statureM,
  isMonitored,
  isActive,
});

/** The sign-in follows the e-mail: none without one; a token when a password has still to be chosen. */
async function settleAccount(
  tx: Db,
  actor: Actor,
  personId: string,
  { email, roles, isActive }: SavedFields,
  now: Date,
): Promise<string | null> {
  if (email === null) {
    await removeAccount(tx, personId);
    await dropLinks(tx, 'invitation', personId);
    return null;
  }
  const before = await findPasswordState(tx, personId);
  await saveAccount(tx, { personId, email, roles: [...new Set(roles)] });
  const isNewAddress = before?.email !== email.toLowerCase();
  // A link that was handed out for another address must not open this account.
  if (isNewAddress || !isActive) await dropLinks(tx, 'invitation', personId);
  if (!isActive || before?.hasPassword || !isNewAddress) return null;
  return makeInvitation(tx, actor, personId, now);
}
