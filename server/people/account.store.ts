import type { EntityManager } from 'typeorm';
import type { Role } from '../../shared/permissions';
import type { Actor } from '../kernel/actor';
import { Account } from './account.entity';
import { Person } from './person.entity';

type SignInRow = Actor & { passwordHash: string | null };

const select = (db: EntityManager) =>
  db
    .createQueryBuilder()
    .select('person.id', 'id')
    .addSelect('person.hospital_id', 'hospitalId')
    .addSelect('person.name', 'name')
    .addSelect('person.job', 'job')
    .addSelect('account.email', 'email')
    .addSelect('account.roles', 'roles')
    .addSelect('account.password_hash', 'passwordHash')
    .from(Account, 'account')
    .innerJoin(Person, 'person', 'person.id = account.person_id and person.is_active');

/** Signing in comes before any hospital is known: e-mail addresses are unique over all of them. */
export async function findSignIn(db: EntityManager, email: string): Promise<SignInRow | null> {
  return (
    (await select(db)
      .where('account.email = :email', { email: email.trim().toLowerCase() })
      .getRawOne<SignInRow>()) ?? null
  );
}

export async function findActor(db: EntityManager, personId: string): Promise<Actor | null> {
  const row = await select(db).where('person.id = :personId', { personId }).getRawOne<SignInRow>();
  if (!row) return null;
  return {
    id: row.id,
    hospitalId: row.hospitalId,
    name: row.name,
    job: row.job,
    email: row.email,
    roles: row.roles as Role[],
  };
}

export const hasAnyAccount = (db: EntityManager): Promise<boolean> => db.exists(Account);

export async function saveAccount(
  db: EntityManager,
  account: { personId: string; email: string; roles: Role[] },
): Promise<void> {
  await db.upsert(Account, { ...account, email: account.email.toLowerCase() }, ['personId']);
}

/** The sign-in of a person, without its secret; null without one. */
export async function findPasswordState(
  db: EntityManager,
  personId: string,
): Promise<{ email: string; hasPassword: boolean } | null> {
  const account = await db.findOneBy(Account, { personId });
  return account && { email: account.email, hasPassword: account.passwordHash !== null };
}

export async function setPassword(db: EntityManager, personId: string, passwordHash: string): Promise<void> {
  await db.update(Account, { personId }, { passwordHash });
}

/** Signs a person out everywhere: a new password ends what the old one opened. */
export async function endSessionsOf(db: EntityManager, personId: string): Promise<void> {
  await db.query(`delete from session where sess->'passport'->>'user' = $1`, [personId]);
}

export async function removeAccount(db: EntityManager, personId: string): Promise<void> {
  await db.delete(Account, { personId });
}
