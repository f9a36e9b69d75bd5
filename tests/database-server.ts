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
