import { zodResolver } from '@hookform/resolvers/zod';
import type { FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';

type Issue = { code: string; [detail: string]: unknown };

/** What a person is told where the contract itself says nothing more friendly. */
export function tellIssue(issue: Issue): string | undefined {
  if (issue.code === 'invalid_type')
    return issue.expected === 'number' && issue.input !== undefined && issue.input !== null
      ? 'Write a number, such as 0.35.'
      : 'Fill this in.';
  if (issue.code === 'invalid_value') return 'Choose one of the list.';
  if (issue.code === 'invalid_format' && issue.format === 'date') return 'Write a day, such as 2026-11-30.';
  if (issue.code === 'too_big')
    return issue.origin === 'string'
      ? `Use at most ${String(issue.maximum)} characters.`
      : `At most ${String(issue.maximum)}.`;
  if (issue.code === 'too_small') return `At least ${String(issue.minimum)}.`;
  return undefined;
}

/** Checks a form against its contract, in words for the person in front of it. */
export const formResolver = <Output extends FieldValues, Input extends FieldValues>(
  schema: z.ZodType<Output, Input>,
): Resolver<Input, unknown, Output> => zodResolver(schema, { error: tellIssue });

/** For `setValueAs`: an empty field is a value not given. */
export const emptyToNull = (value: unknown): unknown => (value === '' ? null : value);
