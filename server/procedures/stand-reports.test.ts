import { expect, test } from 'vitest';
import { standReports } from './stand-reports';
import type { SummaryReport } from './summary-input';

/** "1-4" stands for the keys e1 to e4. */
const keysOf = (range: string) => {
  const [from = 1, to = 0] = range.split('-').map(Number);
  return Array.from({ length: to - from + 1 }, (_, index) => `e${from + index}`);
};

let minute = 0;
function report(id: string, range: string, changes: Partial<SummaryReport> = {}): SummaryReport {
  minute += 1;
  return {
    id,
    equipmentId: 'm1',
    channel: 'page',
    receivedAt: new Date(2026, 2, 4, 10, minute),
    contentAt: `2026-03-04T10:${String(minute % 60).padStart(2, '0')}:00`,
    eventKeys: range === '' ? [] : keysOf(range),
    reportedPlanes: [],
    warnings: [],
    context: null,
    ...changes,
  };
}
const context = (changes: object) => ({ context: changes as SummaryReport['context'] });
const stood = (...reports: SummaryReport[]) =>
  reports.map(({ id }) => {
    const standing = standReports(reports).standings.get(id);
    return standing && 'byId' in standing ? `${standing.kind} ${standing.byId}` : standing?.kind;
  });

test('the one report that holds every exposure counts; what it contains is superseded by it', () => {
  expect(stood(report('a', '1-40'), report('b', '1-52'))).toEqual(['superseded b', 'counts']);
  expect(stood(report('b', '1-52'), report('a', '1-40'))).toEqual(['counts', 'superseded b']);
});

test('a continuation adds; the earlier, smaller report still does not', () => {
  const reports = [report('a', '1-40'), report('b', '1-52'), report('c', '53-82')];
  expect(stood(...reports)).toEqual(['superseded b', 'adds', 'adds']);
  expect(standReports(reports).machines[0]?.holder).toBe(null);
});

test('a cumulative report after a restart supersedes what it took over, named or not', () => {
  expect(stood(report('a', '1-10'), report('b', '11-20'), report('c', '1-25'))).toEqual([
    'superseded c',
    'superseded c',
    'counts',
  ]);
});

test('of equal reports a stated predecessor gives way, even a chain of them and against every clock', () => {
  const names = (...uids: string[]) => uids.map((sopInstanceUid) => ({ sopClassUid: null, sopInstanceUid }));
  const a = report('a', '1-5', {
    contentAt: '2026-03-04T12:00:00',
    ...context({ sopInstanceUid: 'A', predecessors: [] }),
  });
  const b = report('b', '1-5', {
    contentAt: '2026-03-04T11:00:00',
    ...context({ sopInstanceUid: 'B', predecessors: names('A') }),
  });
  const c = report('c', '1-5', {
    contentAt: '2026-03-04T10:00:00',
    ...context({ sopInstanceUid: 'C', predecessors: names('B') }),
  });
  expect(stood(a, b, c)).toEqual(['repeats c', 'repeats c', 'counts']);
  expect(stood(c, a)).toEqual(['repeats a', 'counts']);
});

test('two machines count apart; the same exposures under another machine’s name do not', () => {
  expect(stood(report('a', '1-5'), report('b', '6-9', { equipmentId: 'm2' }))).toEqual(['counts', 'counts']);
  expect(stood(report('a', '1-5'), report('b', '1-5', { equipmentId: 'm2' }))).toEqual([
    'counts',
    'repeats a',
  ]);
  expect(stood(report('a', '1-5'), report('b', '1-9', { equipmentId: 'm2' }))).toEqual([
    'superseded b',
    'counts',
  ]);
});

test('totals without exposures give way to exposures of the same study and machine, and add for another step', () => {
  const inStudy = (studyInstanceUid: string) => context({ studyInstanceUid, predecessors: [] });
  expect(stood(report('t', '', inStudy('s1')), report('a', '1-5', inStudy('s1')))).toEqual([
    'superseded a',
    'counts',
  ]);
  expect(stood(report('t', '', inStudy('s2')), report('a', '1-5', inStudy('s1')))).toEqual(['adds', 'adds']);
  const step = (uid: string) =>
    context({
      studyInstanceUid: 's1',
      predecessors: [],
      scopeOfAccumulation: { code: { value: '113016' }, uid },
    });
  expect(stood(report('t', '', step('1')), report('u', '', step('2')), report('v', '', step('1')))).toEqual([
    'superseded v',
    'adds',
    'adds',
  ]);
});

test('totals typed by hand give way to any report of the machine, not to one of another', () => {
  const typed = report('h', '', { channel: 'manual' });
  const planes = [{ plane: 'single', kermaAreaProductGyCm2: 5 }] as SummaryReport['reportedPlanes'];
  expect(stood(typed, report('t', '', { reportedPlanes: planes }))).toEqual(['superseded t', 'counts']);
  expect(stood(typed, report('a', '1-5'))).toEqual(['superseded a', 'counts']);
  expect(stood(typed, report('a', '1-5', { equipmentId: 'm2' }))).toEqual(['counts', 'counts']);
});
