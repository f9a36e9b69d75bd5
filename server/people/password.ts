import { hash, verify } from '@node-rs/argon2';

const argon2id = 2;

/** argon2id, 64 MiB, three passes: about 170 ms on two cores. */
const cost = { algorithm: argon2id, memoryCost: 65_536, timeCost: 3, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, cost);

/** Hash of a password nobody has: an unknown e-mail takes as long as a wrong password. */
const decoy = hashPassword('no account answers to this');

export async function isPasswordRight(passwordHash: string | null, password: string): Promise<boolean> {
  const isRight = await verify(passwordHash ?? (await decoy), password);
  return isRight && passwordHash !== null;
}
