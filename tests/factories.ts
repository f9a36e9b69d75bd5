import type { DataSource } from 'typeorm';
import { Garment } from '../server/garments/garment.entity';
import { ProcedureType } from '../server/procedure-types/procedure-type.entity';
import { Hospital } from '../server/hospital/hospital.entity';
import { newId } from '../server/kernel/new-id';
import { addDefaultLevels } from '../server/levels/add-default-levels';
import { saveAccount, setPassword } from '../server/people/account.store';
import { hashPassword } from '../server/people/password';
import { addPerson, type PersonFields } from '../server/people/person.store';
import { Room } from '../server/rooms/room.entity';
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

export async function makeGarment(
  dataSource: DataSource,
  hospitalId: string,
  overrides: Partial<Garment> = {},
): Promise<string> {
  const id = newId();
  await dataSource.manager.insert(Garment, {
    id,
    hospitalId,
    code: `G-${id.slice(-6)}`,
    kind: 'one-piece',
    material: 'lead',
    frontLeadMm: 0.5,
    backLeadMm: 0.25,
    leadKvp: 100,
    isMeasured: true,
    ownerId: null,
    state: 'in-service',
    lastInspectedOn: '2026-06-01',
    nextDueOn: '2027-06-01',
    ...overrides,
  });
  return id;
}

export async function makeRoom(
  dataSource: DataSource,
  hospitalId: string,
  overrides: Partial<Room> = {},
): Promise<string> {
  const id = newId();
  const code = `R-${id.slice(-6)}`;
  await dataSource.manager.insert(Room, { id, hospitalId, code, name: `Room ${code}`, ...overrides });
  return id;
}

/** A type that is recognised by its own name. */
export async function makeProcedureType(
  dataSource: DataSource,
  hospitalId: string,
  overrides: Partial<ProcedureType> = {},
): Promise<string> {
  const id = newId();
  const name = overrides.name ?? `Type ${id.slice(-6)}`;
  await dataSource.manager.insert(ProcedureType, {
    id,
    hospitalId,
    key: `T-${id.slice(-6)}`,
    name,
    bodyRegion: 'abdomen',
    typicalKvp: 80,
    recognisedBy: [name],
    ...overrides,
  });
  return id;
}
