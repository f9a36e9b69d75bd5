import { randomBytes } from 'node:crypto';
import { inject } from 'vitest';
import { dropDatabase, runStatements, withDatabase } from './database-server';

export interface TestDatabase {
  url: string;
  drop(): Promise<void>;
}

/**
 * A migrated, empty database of the caller's own: one for each test file, made in `beforeAll` and
 * dropped in `afterAll`. It is a copy of a template, so it costs about a tenth of a second.
 */
export async function createTestDatabase(): Promise<TestDatabase> {
  const { serverUrl, templateName } = inject('templateDatabase');
  const name = `leeward_test_${randomBytes(6).toString('hex')}`;
  await runStatements(serverUrl, [`CREATE DATABASE ${name} TEMPLATE ${templateName}`]);
  return {
    url: withDatabase(serverUrl, name),
    drop: () => dropDatabase(serverUrl, name),
  };
}
