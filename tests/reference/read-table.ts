import { readFileSync } from 'node:fs';

/** Rows of a comma-separated table in data/, by column name; fields may be quoted. */
export function readTable(name: string): Record<string, string>[] {
  const text = readFileSync(new URL(`./data/${name}`, import.meta.url), 'utf8').trim();
  const [header = [], ...rows] = text.split(/\r?\n/).map(splitFields);
  return rows.map((fields) =>
    Object.fromEntries(header.map((column, index) => [column, fields[index] ?? ''])),
  );
}

/** The column as a number; a missing or empty one fails the test that asks for it. */
export function numberIn(row: Record<string, string>, column: string): number {
  const text = row[column];
  if (text === undefined || text === '' || Number.isNaN(Number(text))) {
    throw new Error(`No number in column ${column}: ${JSON.stringify(row)}`);
  }
  return Number(text);
}

function splitFields(line: string): string[] {
  return [...line.matchAll(/("([^"]*)"|[^,]*)(,|$)/g)]
    .slice(0, -1)
    .map((match) => match[2] ?? match[1] ?? '');
}
