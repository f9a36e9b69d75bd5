import { startCluster } from '../scripts/database-cluster/start-cluster';
import { createDataSource } from '../server/db/data-source';
import { poolOf } from '../server/db/pool';
import { installJobs } from '../server/jobs/job-queue';
import { dropDatabase, runStatements, withDatabase } from './database-server';

/** Where test files make their databases, and the migrated database they copy. */
export interface TemplateDatabase {
  serverUrl: string;
  templateName: string;
}

declare module 'vitest' {
  export interface ProvidedContext {
    templateDatabase: TemplateDatabase;
  }
}

async function migrate(url: string): Promise<void> {
  const dataSource = createDataSource(url);
  await dataSource.initialize();
  try {
    await dataSource.runMigrations();
    await installJobs(poolOf(dataSource));
  } finally {
    await dataSource.destroy();
  }
}

/**
 * Makes the migrated database that every test file copies, on the server of TEST_DATABASE_URL or, when
 * that is unset, on a throw-away cluster. Returns where it is and how to remove everything.
 */
export async function makeTemplateDatabase(): Promise<TemplateDatabase & { remove(): Promise<void> }> {
  const givenUrl = process.env['TEST_DATABASE_URL'];
  const cluster = givenUrl
    ? null
    : await startCluster({ folder: '', mode: 'throw-away', report: (line) => console.error(line) });
  const serverUrl = givenUrl ?? cluster?.url ?? '';
  const templateName = `leeward_template_${process.pid}`;
  try {
    await runStatements(serverUrl, [`CREATE DATABASE ${templateName}`]);
    await migrate(withDatabase(serverUrl, templateName));
  } catch (error) {
    await cluster?.stop();
    throw error;
  }
  const dropTemplate = () => dropDatabase(serverUrl, templateName);
  return { serverUrl, templateName, remove: () => (cluster ? cluster.stop() : dropTemplate()) };
}
