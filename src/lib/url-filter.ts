import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { z } from 'zod';

/**
 * Reads a filter from the query of the address. A part that the schema refuses falls back to its default
 * and spoils nothing else: old and hand-written links still open.
 */
export function readFilter<Schema extends z.ZodObject>(
  schema: Schema,
  query: URLSearchParams,
): z.output<Schema> {
  const given: Record<string, string> = {};
  for (const name of Object.keys(schema.shape)) {
    const value = query.get(name);
    if (value !== null && value !== '') given[name] = value;
  }
  const first = schema.safeParse(given);
  if (first.success) return first.data;
  for (const issue of first.error.issues) delete given[String(issue.path[0])];
  return schema.parse(given);
}

/** Writes a changed filter into a query; defaults and empty parts are left out, foreign parts stay. */
export function writeFilter<Schema extends z.ZodObject>(
  schema: Schema,
  query: URLSearchParams,
  change: Partial<z.input<Schema>>,
): URLSearchParams {
  const next = new URLSearchParams(query);
  const defaults: Record<string, unknown> = schema.parse({});
  for (const [name, value] of Object.entries(change)) {
    if (value === undefined || value === null || value === '' || value === defaults[name]) next.delete(name);
    else next.set(name, String(value));
  }
  return next;
}

/** The page's filter, kept in the address. Any change starts again at the first page of the list. */
export function useUrlFilter<Schema extends z.ZodObject>(
  schema: Schema,
): [z.output<Schema>, (change: Partial<z.input<Schema>>) => void] {
  const [query, setQuery] = useSearchParams();
  const filter = useMemo(() => readFilter(schema, query), [schema, query]);
  const changeFilter = useCallback(
    (change: Partial<z.input<Schema>>) =>
      setQuery((current) => {
        const next = writeFilter(schema, current, change);
        next.delete('cursor');
        return next;
      }),
    [schema, setQuery],
  );
  return [filter, changeFilter];
}
