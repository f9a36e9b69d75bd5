import { z } from 'zod';

type RawIssue = Parameters<z.core.$ZodErrorMap>[0];

/**
 * What a person reads under a field, where a schema has no words of its own. Undefined leaves the library's
 * text, which only a program that sends odd input ever meets.
 */
export function wordIssue(issue: RawIssue): string | undefined {
  const { input } = issue;
  if (issue.code === 'invalid_type') {
    if (Number.isNaN(input)) return 'Write a number.';
    return input === undefined || input === null || input === '' ? 'Fill this in.' : undefined;
  }
  if (issue.code === 'invalid_value') return 'Choose one of the list.';
  if (issue.code === 'too_big' && typeof input === 'string')
    return `At most ${String(issue.maximum)} characters.`;
  if (issue.code === 'invalid_format') {
    if (input === '') return 'Fill this in.';
    if (issue.format === 'date') return 'Write a date as 2026-11-30.';
  }
  return undefined;
}

/** Called once where a program starts: page and server then say the same about the same input. */
export const putIssuesInOwnWords = (): void => {
  z.config({ customError: wordIssue });
};
