import type { Pool } from 'pg';
import type { DataSource } from 'typeorm';

/** A connection that breaks fails its own query; without a listener the same error would end the process. */
const ignoreBreaks = (pool: Pool) => pool.on('connect', (client) => client.on('error', () => {}));

/** The connection pool under TypeORM, shared by the session store, the rate limits and the job queue. */
export function poolOf(dataSource: DataSource): Pool {
  const { master: pool } = dataSource.driver as unknown as { master: Pool };
  if (pool.listenerCount('connect') === 0) ignoreBreaks(pool);
  return pool;
}
