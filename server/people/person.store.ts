import type { EntityManager } from 'typeorm';
import type { Job, Person as PersonContract, PersonChoice } from '../../shared/contract/person';
import type { Role } from '../../shared/permissions';
import { Person } from './person.entity';

export type PersonFields = {
  id: string;
  name: string;
  job: Job;
  statureM: number | null;
  isMonitored: boolean;
  isActive: boolean;
};

export async function addPerson(db: EntityManager, hospitalId: string, person: PersonFields): Promise<void> {
  await db.insert(Person, { ...person, hospitalId });
}

/** False when somebody else saved a newer version meanwhile. */
export async function updatePerson(
  db: EntityManager,
  hospitalId: string,
  { id, ...person }: PersonFields,
  version: number,
): Promise<boolean> {
  const result = await db.update(Person, { id, hospitalId, version }, { ...person, version: version + 1 });
  return result.affected === 1;
}

type PersonRow = {
  id: string;
  name: string;
  job: Job;
  stature_m: number | null;
  is_monitored: boolean;
  is_active: boolean;
  version: number;
  email: string | null;
  roles: Role[] | null;
  has_password: boolean;
};

const toPerson = (row: PersonRow): PersonContract => ({
  id: row.id,
  name: row.name,
  job: row.job,
  statureM: row.stature_m,
  isMonitored: row.is_monitored,
  isActive: row.is_active,
  version: row.version,
  email: row.email,
  roles: row.roles ?? [],
  hasPassword: row.has_password,
});

const selectPeople = `
  select person.id, person."name", person.job, person.stature_m, person.is_monitored, person.is_active,
         person."version", account.email, account.roles, account.password_hash is not null as has_password
    from person left join account on account.person_id = person.id
   where person.hospital_id = $1`;

export async function listPeople(db: EntityManager, hospitalId: string): Promise<PersonContract[]> {
  const rows: PersonRow[] = await db.query(
    `${selectPeople} order by person.is_active desc, person."name" collate "und-x-icu"`,
    [hospitalId],
  );
  return rows.map(toPerson);
}

export async function findPerson(
  db: EntityManager,
  hospitalId: string,
  id: string,
): Promise<PersonContract | null> {
  const rows: PersonRow[] = await db.query(`${selectPeople} and person.id = $2`, [hospitalId, id]);
  return rows[0] ? toPerson(rows[0]) : null;
}

export const listChoices = (db: EntityManager, hospitalId: string): Promise<PersonChoice[]> =>
  db.query(
    `select id, "name", job, is_active as "isActive" from person
      where hospital_id = $1 order by "name" collate "und-x-icu"`,
    [hospitalId],
  );
