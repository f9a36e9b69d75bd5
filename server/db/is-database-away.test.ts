import pg from 'pg';
import { expect, test } from 'vitest';
import { isDatabaseAway } from './is-database-away';

test('a port where nothing listens is a database that is away', async () => {
  const client = new pg.Client({ connectionString: 'postgresql://nobody@127.0.0.1:1/none' });
  const error = await client.connect().catch((reason: unknown) => reason);
  expect(isDatabaseAway(error)).toBe(true);
});

test.each([
  // PostgreSQL, appendix A: class 08 and admin_shutdown, crash_shutdown, cannot_connect_now.
  [{ code: '08006' }, true],
  [{ code: '57P01' }, true],
  [{ code: '57P03' }, true],
  // Unique violation, undefined table, cancelled statement: the database is there.
  [{ code: '23505' }, false],
  [{ code: '42P01' }, false],
  [{ code: '57014' }, false],
  [new Error('Connection terminated unexpectedly'), true],
  [new TypeError('x is not a function'), false],
])('%o', (error, isAway) => expect(isDatabaseAway(error)).toBe(isAway));
