import pg from 'pg';

/** The same server and role, another database. */
export function withDatabase(serverUrl: string, name: string): string {
  const url = new URL(serverUrl);
  url.pathname = `/${name}`;
  return url.href;
}

/** Runs statements one after the other, each on its own (CREATE DATABASE refuses a transaction). */
export async function runStatements(serverUrl: string, statements: string[]): Promise<void> {
  const client = new pg.Client({ connectionString: serverUrl });
  await client.connect();
  try {
    for (const statement of statements) await client.query(statement);
  } finally {
    await client.end();
  }
}

/**
 * Drops a database with whoever is still connected. A vacuum of the server's own may not be ended by this role:
 * then the plain statement, which has the server end it.
 */
export async function dropDatabase(serverUrl: string, name: string): Promise<void> {
  try {
    await runStatements(serverUrl, [`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`]);
  } catch (error) {
    if ((error as { code?: string }).code !== '42501') throw error;
    await runStatements(serverUrl, [`DROP DATABASE IF EXISTS ${name}`]);
  }
}
