import type { Pool } from 'pg';
import type { DataSource } from 'typeorm';

/** The connection pool under TypeORM, shared by the session store and the rate limits. */
export const poolOf = (dataSource: DataSource): Pool =>
  (dataSource.driver as unknown as { master: Pool }).master;
