import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * The password of the application's database role, made once at random and kept for its user only.
 * `isNew` means that the database does not know it yet.
 */
export function readOrMakePassword(folder: string): { password: string; isNew: boolean } {
  const file = join(folder, 'database.password');
  if (existsSync(file)) {
    const password = readFileSync(file, 'utf8').trim();
    if (password) return { password, isNew: false };
  }
  const password = randomBytes(24).toString('hex');
  writeFileSync(file, `${password}\n`, { mode: 0o600 });
  return { password, isNew: true };
}
