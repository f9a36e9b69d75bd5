import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { PoolClient } from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import type { EntityManager, EntityTarget, ObjectLiteral } from 'typeorm';
import type { ColumnMetadata } from 'typeorm/metadata/ColumnMetadata.js';

const escapeText = (text: string): string =>
  /[\\\n\r\t]/.test(text)
    ? text.replace(/\\/g, '\\\\').replace(/\n/g, '\\n').replace(/\r/g, '\\r').replace(/\t/g, '\\t')
    : text;

const arrayItem = (item: unknown): string =>
  typeof item === 'number' ? String(item) : `"${String(item).replace(/["\\]/g, '\\$&')}"`;

/** One value in PostgreSQL's text format for COPY. */
function encodeValue(value: unknown, isJson: boolean): string {
  if (value === null || value === undefined) return '\\N';
  if (isJson) return escapeText(JSON.stringify(value));
  switch (typeof value) {
    case 'number':
      return String(value);
    case 'boolean':
      return value ? 't' : 'f';
    case 'string':
      return escapeText(value);
    default:
      if (value instanceof Date) return value.toISOString();
      if (Array.isArray(value)) return escapeText(`{${value.map(arrayItem).join(',')}}`);
      throw new TypeError('COPY knows no text form for this value.');
  }
}

/** Lines of about 64 kB: fewer and larger pieces are several times faster than one piece a row. */
function* encodeRows<T extends object>(rows: Iterable<T>, columns: ColumnMetadata[]): Generator<string> {
  const fields = columns.map((column) => ({
    name: column.propertyName as keyof T,
    isJson: column.type === 'jsonb',
  }));
  let chunk = '';
  for (const row of rows) {
    chunk += fields.map(({ name, isJson }) => encodeValue(row[name], isJson)).join('\t') + '\n';
    if (chunk.length > 65_536) {
      yield chunk;
      chunk = '';
    }
  }
  if (chunk) yield chunk;
}

/**
 * Writes many rows of one table by COPY, inside the manager's own transaction. A column that no row
 * names keeps the database's default.
 */
export async function copyRows<T extends ObjectLiteral>(
  db: EntityManager,
  entity: EntityTarget<T>,
  rows: readonly Partial<T>[],
): Promise<void> {
  const [first] = rows;
  if (!first) return;
  if (!db.queryRunner) throw new Error('COPY needs the connection of a transaction.');
  const metadata = db.connection.getMetadata(entity);
  const columns = metadata.columns.filter((column) => column.propertyName in first);
  const names = columns.map((column) => `"${column.databaseName}"`).join(', ');
  const client = (await db.queryRunner.connect()) as PoolClient;
  const copy = client.query(copyFrom(`copy "${metadata.tableName}" (${names}) from stdin`));
  await pipeline(Readable.from(encodeRows(rows, columns)), copy);
}
