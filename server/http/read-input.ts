import type { z } from 'zod';
import { Problem } from '../kernel/problem';

/** Parses input against its schema; every issue is told at once, by JSON pointer. */
export function readInput<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const issues = parsed.error.issues.map((issue) => ({
    pointer: `/${issue.path.map(String).join('/')}`,
    detail: issue.message,
  }));
  throw new Problem('invalid-input', 'Correct what is marked and send it again; nothing was changed.', {
    issues,
  });
}
