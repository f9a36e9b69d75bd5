import { expect, test } from 'vitest';
import type { ConflictSide, ReportConflict } from '../../../shared/contract/decide-report';
import { compareSides, describeConflict } from './conflict-words';

const side = (changes: Partial<ConflictSide>): ConflictSide => ({
  doseReportId: 'a',
  fileName: 'first.dcm',
  receivedAt: '2026-11-24T20:12:00Z',
  contentAt: '2026-11-24T13:10:00',
  isPartial: false,
  machine: 'Aster F2',
  procedure: null,
  eventCount: 10,
  ownEventCount: 0,
  firstEventAt: null,
  lastEventAt: null,
  planes: [],
  ...changes,
});
const conflict: ReportConflict = {
  code: 'sop-instance-conflict',
  stored: side({}),
  held: side({ fileName: 'second.dcm', eventCount: 12, ownEventCount: 2 }),
  isSamePatient: true,
  isSameStudy: true,
  changedEventCount: 1,
};

test('each line stands for both reports, and says what only one has', () => {
  const rows = compareSides(conflict, 'America/Denver');
  expect(rows.find(({ name }) => name === 'Exposures')).toEqual({
    name: 'Exposures',
    stored: '10',
    held: '12, 2 of them only here',
  });
  expect(rows.find(({ name }) => name === 'Received')?.stored).toBe('2026-11-24 13:12');
});

test('another patient is said before anything is decided', () => {
  expect(describeConflict({ ...conflict, isSamePatient: false })[0]).toContain('different patients');
  expect(describeConflict(conflict)[1]).toBe('1 exposure that both have carries other figures in the two.');
});
