import { expect, test } from 'vitest';
import { z } from 'zod';
import { tellIssue } from './form-resolver';
import { parseDecimal } from './parse-decimal';

const schema = z.object({
  name: z.string().min(1, 'Fill this in.').max(5),
  leadMm: z.number().max(3).nullable(),
  roomId: z.string(),
  dueOn: z.iso.date().nullable(),
});
const tell = (value: unknown) =>
  (schema.safeParse(value, { error: tellIssue }).error?.issues ?? []).map((issue) => issue.message);

test('a number that is none is asked for as a number', () => {
  expect(tell({ name: 'a', leadMm: parseDecimal('thick'), roomId: 'r', dueOn: null })).toEqual([
    'Write a number, such as 0.35.',
  ]);
});
test('what is missing, too long, too much or no day is told in words', () => {
  expect(tell({ name: 'long name', leadMm: 4, roomId: null, dueOn: '30.11.' })).toEqual([
    'Use at most 5 characters.',
    'At most 3.',
    'Fill this in.',
    'Write a day, such as 2026-11-30.',
  ]);
});
test('the contract’s own words come first', () => {
  expect(tell({ name: '', leadMm: null, roomId: 'r', dueOn: null })).toEqual(['Fill this in.']);
});
