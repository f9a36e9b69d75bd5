import type { EntityManager } from 'typeorm';

/** What stores query through: the connection, or a transaction of it. Use cases pass it on and know no more of it. */
export type Db = EntityManager;
