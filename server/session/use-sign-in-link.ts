import { IANAZone } from 'luxon';
import type { Db } from '../db/db';
import type { SignInLink, UseLink } from '../../shared/contract/session';
import { noteAudit } from '../audit/audit.store';
import { addHospital } from '../hospital/hospital.store';
import type { Actor } from '../kernel/actor';
import { newId } from '../kernel/new-id';
import { Problem } from '../kernel/problem';
import { addDefaultLevels } from '../levels/add-default-levels';
import { endSessionsOf, findActor, saveAccount, setPassword } from '../people/account.store';
import { hashPassword } from '../people/password';
import { addPerson } from '../people/person.store';
import { findOpenLink, spendLink } from '../people/sign-in-link.store';

type Deps = { db: Db; now: () => Date };

const spent = () =>
  new Problem('link-spent', 'This link has been used or has expired. Ask an administrator for a new one.');

export async function describeLink({ db, now }: Deps, token: string): Promise<SignInLink> {
  const link = await findOpenLink(db, token, now());
  if (!link) throw spent();
  const person = link.personId ? await findActor(db, link.personId) : null;
  return { purpose: link.purpose, email: person?.email ?? null, name: person?.name ?? null };
}

/** Spends the link, sets the password and, for the first administrator, makes the hospital. */
export async function useLink({ db, now }: Deps, input: UseLink): Promise<Actor> {
  const passwordHash = await hashPassword(input.password);
  return db.transaction(async (tx) => {
    const link = await findOpenLink(tx, input.token, now());
    if (!link) throw spent();
    const personId = link.personId ?? (await addFirstAdministrator(tx, input));
    if (!(await spendLink(tx, input.token, now()))) throw spent();
    await setPassword(tx, personId, passwordHash);
    await endSessionsOf(tx, personId);
    const actor = await findActor(tx, personId);
    if (!actor) throw spent();
    await noteAudit(tx, {
      hospitalId: actor.hospitalId,
      actorId: actor.id,
      action: 'password chosen',
      subject: 'person',
      subjectId: actor.id,
    });
    return actor;
  });
}

async function addFirstAdministrator(tx: Db, input: UseLink): Promise<string> {
  const issues = (['hospitalName', 'timeZone', 'name', 'email'] as const)
    .filter((field) => !input[field])
    .map((field) => ({ pointer: `/${field}`, detail: 'Fill this in.' }));
  if (input.timeZone && !IANAZone.isValidZone(input.timeZone))
    issues.push({ pointer: '/timeZone', detail: 'Write a zone such as Europe/Vienna.' });
  const { hospitalName, timeZone, name, email } = input;
  if (issues.length > 0 || !hospitalName || !timeZone || !name || !email)
    throw new Problem('invalid-input', 'Correct what is marked and send it again; nothing was changed.', {
      issues,
    });
  const hospitalId = newId();
  await addHospital(tx, { id: hospitalId, name: hospitalName, timeZone, isDemo: false });
  await addDefaultLevels(tx, hospitalId);
  const personId = newId();
  await addPerson(tx, hospitalId, {
    id: personId,
    name,
    job: 'administration',
    statureM: null,
    isMonitored: false,
    isActive: true,
  });
  await saveAccount(tx, { personId, email, roles: ['administrator'] });
  return personId;
}
