import { expect, test } from 'vitest';
import type { RegroupingLine } from '../../../shared/contract/regrouping';
import { describeLine } from './regroup-words';

const line: RegroupingLine = {
  id: '1',
  kind: 'merge',
  source: { id: 'a', name: '26-00398' },
  target: { id: 'b', name: '26-00412' },
  reportCount: 1,
  reason: 'one case',
  doneBy: 'Rowan Thistle',
  doneAt: '2026-11-24T14:12:00Z',
  isUndone: false,
  canTakeBack: true,
  sourceVersion: 1,
  targetVersion: 1,
};

test('each procedure names the other', () => {
  expect([describeLine(line, 'a'), describeLine(line, 'b')]).toEqual([
    'Merged into 26-00412',
    'Took in 26-00398',
  ]);
  expect(describeLine({ ...line, kind: 'move' }, 'a')).toBe('1 report moved to 26-00412');
  expect(describeLine({ ...line, kind: 'split', reportCount: 2 }, 'a')).toBe(
    'Split: 2 reports went to 26-00412',
  );
});
