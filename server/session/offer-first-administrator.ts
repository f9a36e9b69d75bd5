import type { Db } from '../db/db';
import { hasAnyAccount } from '../people/account.store';
import { dropLinks, makeLink } from '../people/sign-in-link.store';

const day = 86_400_000;

/** Where nobody can sign in yet, prints a one-time link that makes the first administrator. */
export async function offerFirstAdministrator(
  db: Db,
  url: string,
  report: (line: string) => void,
): Promise<void> {
  if (await hasAnyAccount(db)) return;
  await dropLinks(db, 'first-administrator', null);
  const token = await makeLink(db, {
    purpose: 'first-administrator',
    personId: null,
    expiresAt: new Date(Date.now() + 7 * day),
  });
  report(`Make the first administrator (once, within 7 days): ${url}/welcome/${token}`);
}
