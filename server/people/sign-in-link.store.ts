import { createHash, randomBytes } from 'node:crypto';
import { IsNull, MoreThan, type EntityManager } from 'typeorm';
import { SignInLink } from './sign-in-link.entity';

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

/** Makes a one-time link and returns its token, which is kept nowhere. */
export async function makeLink(
  db: EntityManager,
  link: { purpose: SignInLink['purpose']; personId: string | null; expiresAt: Date },
): Promise<string> {
  const token = randomBytes(32).toString('base64url');
  await db.insert(SignInLink, { ...link, tokenHash: hashOf(token), usedAt: null });
  return token;
}

export const findOpenLink = (db: EntityManager, token: string, now: Date): Promise<SignInLink | null> =>
  db.findOneBy(SignInLink, { tokenHash: hashOf(token), usedAt: IsNull(), expiresAt: MoreThan(now) });

/** True for the one caller that spends the link. */
export async function spendLink(db: EntityManager, token: string, now: Date): Promise<boolean> {
  const result = await db.update(
    SignInLink,
    { tokenHash: hashOf(token), usedAt: IsNull(), expiresAt: MoreThan(now) },
    { usedAt: now },
  );
  return result.affected === 1;
}

export async function dropLinks(
  db: EntityManager,
  purpose: SignInLink['purpose'],
  personId: string | null,
): Promise<void> {
  await db.delete(SignInLink, { purpose, personId: personId ?? IsNull(), usedAt: IsNull() });
}
