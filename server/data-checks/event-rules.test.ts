import { expect, test } from 'vitest';
import { checkOne, makeReport, resultOf } from './given-facts';

test.each([
  ['kvp-range', { kvpValues: [39, 80] }, 'noted'],
  ['kvp-range', { kvpValues: [40, 125] }, 'passed'],
  ['kvp-range', { kvpValues: [] }, 'not-checked'],
  ['kvp-possible', { kvpValues: [800] }, 'failed'],
  ['kvp-possible', { kvpValues: [39] }, 'passed'],
  ['event-kerma', { referenceAirKermaGy: 21 }, 'failed'],
  ['event-kerma', { referenceAirKermaGy: -0.1 }, 'failed'],
  ['pulse-width', { pulseWidthMs: 0.005 }, 'noted'],
  ['angles', { primaryAngleDeg: 270 }, 'noted'],
  ['angles', { primaryAngleDeg: null }, 'not-checked'],
  ['negative-values', { kermaAreaProductGyCm2: -1 }, 'failed'],
  ['negative-values', {}, 'passed'],
])('%s of %o: %s', (code, event, result) => {
  expect(resultOf(code, { events: [event] })).toBe(result);
});

test('a missing voltage is a gap, told and no fault', () => {
  const kvp = checkOne('kvp-range', { events: [{ kvpValues: [] }, {}] });
  expect(kvp.result).toBe('passed');
  expect(kvp.detail).toContain('missing in 1 of 2 events');
});

test('an event after its report came in, in the future, long before its time, far from the others', () => {
  const at = (iso: string) => ({ events: [{ startedAt: new Date(iso) }] });
  expect(resultOf('clock-ahead', at('2026-11-30T12:09:00Z'))).toBe('passed');
  expect(resultOf('clock-ahead', at('2026-11-30T12:11:00Z'))).toBe('noted');
  expect(checkOne('clock-ahead', at('2027-11-30T12:11:00Z')).detail).toContain('in the future');
  expect(resultOf('clock-reset', at('2000-01-01T00:10:00Z'))).toBe('noted');
  const apart = [{}, { startedAt: new Date('2026-11-28T10:00:00Z') }];
  expect(resultOf('event-times', { events: apart })).toBe('noted');
  const study = (studyAt: string) => ({
    events: [{}],
    input: { reports: [makeReport({ context: { studyAt } })] },
  });
  expect(resultOf('event-times', study('2026-11-28T10:00:00'))).toBe('noted');
  expect(resultOf('event-times', study('2026-11-30T08:00:00'))).toBe('passed');
});
