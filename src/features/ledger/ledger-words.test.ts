import { expect, test } from 'vitest';
import { procedureSorts } from '../../../shared/contract/procedure-row';
import {
  describeIncomplete,
  describeRecordState,
  describeTotal,
  findOrder,
  listOperators,
  orderChoices,
} from './ledger-words';

test('an incomplete record says what it needs', () => {
  expect(describeRecordState({ recordState: 'incomplete', missing: ['operator', 'person'] })).toBe(
    'needs operator, staff in the room',
  );
  expect(describeRecordState({ recordState: 'complete', missing: [] })).toBe('complete');
});

test('the count speaks of one as of one and groups thousands', () => {
  expect([0, 1, 7356].map((total) => describeTotal(total))).toEqual([
    '0 procedures.',
    '1 procedure.',
    '7\u202f356 procedures.',
  ]);
  expect(describeTotal(918, 12)).toBe('918 procedures, 12 of them entered by hand.');
  expect([0, 1, 2].map(describeIncomplete)).toEqual([null, '1 needs details', '2 need details']);
});

test('every order that a column head can ask for has words in the sentence', () => {
  for (const sort of procedureSorts)
    for (const order of ['ascending', 'descending'] as const)
      expect(orderChoices.find(({ value }) => value === findOrder({ sort, order }))).toMatchObject({
        sort,
        order,
      });
});

test('only those who perform procedures are offered as operators', () => {
  const people = (['nurse', 'electrophysiologist', 'anaesthetist'] as const).map((job) => ({
    id: job,
    name: job,
    job,
    isActive: true,
  }));
  expect(listOperators(people).map(({ value }) => value)).toEqual(['electrophysiologist']);
});
