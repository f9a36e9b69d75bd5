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

/** Rows of one table, already in COPY's text format: a line is a fraction of the row's weight in memory. */
export interface CopyLines<T> {
  add(rows: readonly T[]): void;
  /** Sends what was added, inside the transaction's own connection, and starts afresh. */
  send(db: EntityManager): Promise<void>;
}

const linesPerChunk = 128;

function* joinLines(lines: readonly string[]): Generator<string> {
  for (let start = 0; start < lines.length; start += linesPerChunk)
    yield lines.slice(start, start + linesPerChunk).join('');
}

/**
 * Collects rows of one table for COPY. Every row has the properties of the first; a column that it does
 * not name keeps the database's default.
 */
export function collectLines<T extends ObjectLiteral>(
  db: EntityManager,
  entity: EntityTarget<T>,
): CopyLines<Partial<T>> {
  const metadata = db.connection.getMetadata(entity);
  let columns: ColumnMetadata[] = [];
  let fields: { name: keyof T; isJson: boolean }[] = [];
  let lines: string[] = [];
  const learnColumns = (row: Partial<T>) => {
    columns = metadata.columns.filter((column) => column.propertyName in row);
    fields = columns.map((column) => ({ name: column.propertyName, isJson: column.type === 'jsonb' }));
  };
  return {
    add: (rows) => {
      for (const row of rows) {
        if (fields.length === 0) learnColumns(row);
        lines.push(fields.map(({ name, isJson }) => encodeValue(row[name], isJson)).join('\t') + '\n');
      }
    },
    send: async (transaction) => {
      const sending = lines;
      lines = [];
      if (sending.length === 0) return;
      if (!transaction.queryRunner) throw new Error('COPY needs the connection of a transaction.');
      const names = columns.map((column) => `"${column.databaseName}"`).join(', ');
      const client = (await transaction.queryRunner.connect()) as PoolClient;
      const copy = client.query(copyFrom(`copy "${metadata.tableName}" (${names}) from stdin`));
      await pipeline(Readable.from(joinLines(sending)), copy);
    },
  };
}

/** Writes rows of one table by COPY. */
export async function copyRows<T extends ObjectLiteral>(
  db: EntityManager,
  entity: EntityTarget<T>,
  rows: readonly Partial<T>[],
): Promise<void> {
  const collected = collectLines(db, entity);
  collected.add(rows);
  await collected.send(db);
}
