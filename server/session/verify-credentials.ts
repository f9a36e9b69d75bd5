import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { findSignIn } from '../people/account.store';
import { isPasswordRight } from '../people/password';

/** The person behind an e-mail and a password, or null: which of the two was wrong is not told. */
export async function verifyCredentials(db: Db, email: string, password: string): Promise<Actor | null> {
  const found = await findSignIn(db, email);
  if (!(await isPasswordRight(found?.passwordHash ?? null, password)) || !found) return null;
  const { passwordHash: _, ...actor } = found;
  return actor;
}
