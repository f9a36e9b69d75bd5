import { randomInt } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const demoAccounts = ['technologist', 'physicist', 'interventionalist', 'committee', 'administrator'].map(
  (name) => `${name}@marrowcreek.example`,
);

/** Letters and digits that are not mistaken for one another. */
const alphabet = 'abcdefghijkmnpqrstuvwxyz23456789';
const makePassword = () =>
  [4, 4, 4]
    .map((length) => Array.from({ length }, () => alphabet[randomInt(alphabet.length)]).join(''))
    .join('-');

/**
 * The demo accounts' password: the given one, else the one of earlier starts, else a new random one
 * (60 bits). It is kept in the data folder, readable by its user only.
 */
export function settleDemoPassword(folder: string, given: string | null): string {
  const file = join(folder, 'demo.password');
  const kept = existsSync(file) ? readFileSync(file, 'utf8').trim() : '';
  const password = given ?? (kept || makePassword());
  if (password !== kept) writeFileSync(file, `${password}\n`, { mode: 0o600 });
  return password;
}

/** What a person needs to sign in to the demo. */
export function describeDemoAccounts(password: string): string {
  return [
    'Demo accounts of the fictional Marrow Creek Regional Hospital:',
    ...demoAccounts.map((account) => `  ${account}`),
    `Password of each: ${password}`,
  ].join('\n');
}
