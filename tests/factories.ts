import type { DataSource } from 'typeorm';
import { Hospital } from '../server/hospital/hospital.entity';
import { newId } from '../server/kernel/new-id';
import { addDefaultLevels } from '../server/levels/add-default-levels';
import { saveAccount, setPassword } from '../server/people/account.store';
import { hashPassword } from '../server/people/password';
import { addPerson, type PersonFields } from '../server/people/person.store';
import type { Role } from '../shared/permissions';

export const testPassword = 'a long enough password';
const passwordHash = hashPassword(testPassword);

/** A hospital in a zone far from the test machine's, so that days can be got wrong. */
export async function makeHospital(
  dataSource: DataSource,
  overrides: Partial<Hospital> = {},
): Promise<string> {
  const id = newId();
  await dataSource.manager.insert(Hospital, {
    id,
    name: 'Test Hospital',
    timeZone: 'America/Denver',
    isDemo: false,
    ...overrides,
  });
  await addDefaultLevels(dataSource.manager, id);
  return id;
}

/** A person who can sign in with `testPassword`, when an e-mail is given. */
export async function makePerson(
  dataSource: DataSource,
  hospitalId: string,
  overrides: Partial<PersonFields> & { email?: string; roles?: Role[] } = {},
): Promise<string> {
  const { email, roles = [], ...fields } = overrides;
  const id = fields.id ?? newId();
  await addPerson(dataSource.manager, hospitalId, {
    name: `Person ${id.slice(-6)}`,
    job: 'nurse',
    statureM: 1.7,
    isMonitored: true,
    isActive: true,
    ...fields,
    id,
  });
  if (email) {
    await saveAccount(dataSource.manager, { personId: id, email, roles });
    await setPassword(dataSource.manager, id, await passwordHash);
  }
  return id;
}
