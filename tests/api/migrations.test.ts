import { afterAll, beforeAll, expect, test } from 'vitest';
import { createDataSource } from '../../server/db/data-source';
import { createTestDatabase, type TestDatabase } from '../test-db';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

test('after the migrations the entities find nothing to change', async () => {
  const dataSource = await createDataSource(database.url).initialize();
  const { upQueries } = await dataSource.driver.createSchemaBuilder().log();
  expect(upQueries.map(({ query }) => query)).toEqual([]);
  await dataSource.destroy();
});

test('every migration can be taken back and made again', async () => {
  const dataSource = await createDataSource(database.url).initialize();
  const count = dataSource.migrations.length;
  for (let index = 0; index < count; index++) await dataSource.undoLastMigration();
  const [{ n }] = await dataSource.query(
    `select count(*)::int as n from information_schema.tables where table_schema = 'public' and table_name <> 'migrations'`,
  );
  expect(n).toBe(0);
  expect(await dataSource.runMigrations()).toHaveLength(count);
  await dataSource.destroy();
});
