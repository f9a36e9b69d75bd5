import { expect, test } from 'vitest';
import type { ProcedureReport } from '../../../shared/contract/procedure';
import { describeOrigin, describeStanding } from './report-standing';

const report = (id: string, changes: Partial<ProcedureReport> = {}): ProcedureReport => ({
  id,
  receivedAt: '2026-11-24T14:12:00Z',
  contentAt: null,
  machine: null,
  eventCount: 40,
  isPartial: false,
  counts: false,
  standing: 'counts',
  byId: null,
  origin: 'study',
  movedBy: null,
  hasOriginal: true,
  isGenerated: false,
  isManual: false,
  ...changes,
});

test('a superseded report names the one that holds its exposures', () => {
  const reports = [report('a', { standing: 'superseded', byId: 'b' }), report('b')];
  expect(reports.map((one) => describeStanding(one, reports))).toEqual([
    'superseded by report 2, which holds all of its exposures',
    'counts: its totals are taken as reported',
  ]);
});

test('totals without exposures add totals, not exposures', () => {
  expect(describeStanding(report('a', { standing: 'adds', eventCount: 0 }), [])).toBe(
    'adds its totals to the sum',
  );
});

test('a moved report names the person', () => {
  expect(describeOrigin(report('a', { origin: 'moved', movedBy: 'Rowan Thistle' }))).toBe(
    'moved here by Rowan Thistle',
  );
});
