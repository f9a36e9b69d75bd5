import type { Db } from '../db/db';
import type { Role } from '../../shared/permissions';
import { newId } from '../kernel/new-id';
import { saveAccount, setPassword } from '../people/account.store';
import { addPerson } from '../people/person.store';
import { demoHospital } from './hospital';
import { demoStaff } from './staff.table-data';

/** Which role code signs in under which name. */
export const demoAccounts: readonly { code: string; mailbox: string; role: Role }[] = [
  { code: 'T-04', mailbox: 'technologist', role: 'technologist' },
  { code: 'P-01', mailbox: 'physicist', role: 'physicist' },
  { code: 'IC-2', mailbox: 'interventionalist', role: 'interventionalist' },
  { code: 'Q-01', mailbox: 'committee', role: 'committee' },
  { code: 'AD-01', mailbox: 'administrator', role: 'administrator' },
];

export const demoEmail = (mailbox: string): string => `${mailbox}@${demoHospital.mailDomain}`;

/** Adds the staff under their role codes and the five who sign in; returns ids by code. */
export async function seedPeople(
  db: Db,
  hospitalId: string,
  passwordHash: string,
): Promise<ReadonlyMap<string, string>> {
  const ids = new Map<string, string>();
  for (const { code, ...person } of demoStaff) {
    const id = newId();
    ids.set(code, id);
    await addPerson(db, hospitalId, { id, name: code, isActive: true, ...person });
  }
  for (const { code, mailbox, role } of demoAccounts) {
    const personId = ids.get(code);
    if (!personId) throw new Error(`Nobody has the code ${code}.`);
    await saveAccount(db, { personId, email: demoEmail(mailbox), roles: [role] });
    await setPassword(db, personId, passwordHash);
  }
  return ids;
}
