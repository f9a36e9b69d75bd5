import type { Pool } from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '../kernel/problem';

const quarterHourS = 900;

export type SignInThrottle = {
  guard(keys: string[]): Promise<void>;
  fail(keys: string[]): Promise<void>;
  forget(key: string): Promise<void>;
};

/** Wrong passwords are counted in the database, per address with e-mail and per address alone. */
export function createSignInThrottle(pool: Pool, triesPerAccount = 10): SignInThrottle {
  const limiter = new RateLimiterPostgres({
    storeClient: pool,
    storeType: 'pool',
    tableName: 'rate_limit',
    tableCreated: true,
    keyPrefix: 'sign-in',
    points: triesPerAccount,
    duration: quarterHourS,
    clearExpiredByTimeout: false,
  });
  const refuse = (waitMs: number) => {
    const minutes = Math.max(1, Math.ceil(waitMs / 60_000));
    throw new Problem(
      'too-many-requests',
      `Too many wrong tries. Wait ${minutes} min, or ask an administrator for a new link.`,
    );
  };
  return {
    async guard(keys) {
      for (const key of keys) {
        const seen = await limiter.get(key);
        if (seen && seen.consumedPoints >= triesPerAccount) refuse(seen.msBeforeNext);
      }
    },
    async fail(keys) {
      for (const key of keys)
        await limiter.consume(key).catch((error: unknown) => {
          if (!(error instanceof RateLimiterRes)) throw error;
        });
    },
    async forget(key) {
      await limiter.delete(key);
    },
  };
}
