import { expect, test } from 'vitest';
import { z } from 'zod';
import { wordIssue } from './issue-words';

const schema = z.object({
  name: z.string().max(5),
  heightM: z.number(),
  side: z.enum(['left', 'right']),
  day: z.iso.date(),
  weightKg: z.number().min(1, 'Between 1 and 400 kg.'),
});

function word(input: unknown): Record<string, string> {
  const parsed = schema.safeParse(input, { error: wordIssue });
  return Object.fromEntries(
    (parsed.error?.issues ?? []).map((issue) => [issue.path.join('.'), issue.message]),
  );
}

test('missing, wrong and overlong input is told in plain words', () => {
  expect(word({ heightM: 1, side: 'up', day: '30.11.2026', weightKg: Number.NaN })).toEqual({
    name: 'Fill this in.',
    side: 'Choose one of the list.',
    day: 'Write a date as 2026-11-30.',
    weightKg: 'Write a number.',
  });
  expect(word({ name: 'abcdef', heightM: 1, side: 'left', day: '', weightKg: 70 })).toEqual({
    name: 'At most 5 characters.',
    day: 'Fill this in.',
  });
});

test('a schema’s own words win', () => {
  expect(word({ name: 'a', heightM: 1, side: 'left', day: '2026-11-30', weightKg: 0 })).toEqual({
    weightKg: 'Between 1 and 400 kg.',
  });
});
