import { expect, test } from 'vitest';
import { describeCount, describeRecordState, findOrder } from './ledger-words';

test('an incomplete record says what it needs', () => {
  expect(describeRecordState({ recordState: 'incomplete', missing: ['operator', 'person'] })).toBe(
    'needs operator, staff in the room',
  );
  expect(describeRecordState({ recordState: 'complete', missing: [] })).toBe('complete');
});

test('the count speaks of one as of one', () => {
  expect(describeCount({ total: 1, incomplete: 1 })).toBe('1 procedure. 1 lacks details.');
  expect(describeCount({ total: 0, incomplete: 0 })).toBe('0 procedures.');
});

test('an order that no choice stands for is still told', () => {
  expect(findOrder({ sort: 'started', order: 'descending' })).toBe('newest');
  expect(findOrder({ sort: 'kvp', order: 'ascending' })).toBe('as the column says');
});
