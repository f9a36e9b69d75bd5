import type { Pool } from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '../kernel/problem';

const quarterHourS = 900;

/** Who tries: the address, and the account it tries from there. */
export type Try = { address: string; email: string };

export type SignInThrottle = {
  /** Throws while an account from this address, or the address itself, has used up its tries. */
  guard(attempt: Try): Promise<void>;
  fail(attempt: Try): Promise<void>;
  /** A right password clears the account's count; the address keeps its own. */
  forgive(attempt: Try): Promise<void>;
};

const refuse = (waitMs: number): never => {
  const minutes = Math.max(1, Math.ceil(waitMs / 60_000));
  throw new Problem(
    'too-many-requests',
    `Too many wrong tries. Wait ${minutes} min, or ask an administrator for a new link.`,
  );
};

/**
 * Wrong passwords are counted in the database over a quarter of an hour: ten for an account from one address, a hundred
 * for an address over all accounts, so that one password cannot be tried on everybody.
 */
export function createSignInThrottle(pool: Pool): SignInThrottle {
  const count = (keyPrefix: string, points: number) =>
    new RateLimiterPostgres({
      storeClient: pool,
      storeType: 'pool',
      tableName: 'rate_limit',
      tableCreated: true,
      keyPrefix,
      points,
      duration: quarterHourS,
      clearExpiredByTimeout: false,
    });
  const counters = [
    {
      limiter: count('sign-in-account', 10),
      keyOf: ({ address, email }: Try) => `${address}|${email.toLowerCase()}`,
    },
    { limiter: count('sign-in-address', 100), keyOf: ({ address }: Try) => address },
  ];
  return {
    async guard(attempt) {
      for (const { limiter, keyOf } of counters) {
        const seen = await limiter.get(keyOf(attempt));
        if (seen && seen.consumedPoints >= limiter.points) refuse(seen.msBeforeNext);
      }
    },
    async fail(attempt) {
      for (const { limiter, keyOf } of counters)
        await limiter.consume(keyOf(attempt)).catch((error: unknown) => {
          if (!(error instanceof RateLimiterRes)) throw error;
        });
    },
    async forgive(attempt) {
      for (const { limiter, keyOf } of counters.slice(0, 1)) await limiter.delete(keyOf(attempt));
    },
  };
}
