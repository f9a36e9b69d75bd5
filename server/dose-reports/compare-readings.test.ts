import { expect, test } from 'vitest';
import { compareReadings, type Reading } from './compare-readings';

type Event = Reading['events'][number];

const event = (eventKey: string, part: Partial<Event> = {}) =>
  ({
    id: `id of ${eventKey}`,
    doseReportId: 'report',
    eventKey,
    startedAt: new Date('2026-03-04T09:00:00Z'),
    kvpValues: [70, 71],
    kvpMean: 70.5,
    filters: [{ type: 'flat', material: 'Cu', minThicknessMm: 0.1, maxThicknessMm: 0.1 }],
    reported: {},
    details: {},
    ...part,
  }) as Event;
const reading = (events: Event[], part: Partial<Reading> = {}): Reading => ({
  context: null,
  planes: [],
  warnings: [],
  events,
  ...part,
});

test('the same values under new row numbers are no change', () => {
  const again = { ...event('a'), id: 'another', startedAt: new Date('2026-03-04T09:00:00Z') };
  expect(compareReadings(reading([event('a')]), reading([again]))).toEqual([]);
});

test('a value is told by event, field, before and after; a missing one is null', () => {
  const after = event('b', { kvpMean: null, kvpValues: [70, 72] });
  expect(compareReadings(reading([event('a'), event('b')]), reading([event('a'), after]))).toEqual([
    { where: 'event 2', field: 'kvpValues', before: '70, 71', after: '70, 72' },
    { where: 'event 2', field: 'kvpMean', before: '70.5', after: null },
  ]);
});

test('what is nested is told by its path, counted from 1', () => {
  const after = event('a', {
    filters: [{ type: 'flat', material: 'Al', minThicknessMm: 0.1, maxThicknessMm: 0.1 }],
  });
  expect(compareReadings(reading([event('a')]), reading([after]))).toEqual([
    { where: 'event 1', field: 'filters.1.material', before: 'Cu', after: 'Al' },
  ]);
});

test('an event that comes or goes changes each of its values', () => {
  const changes = compareReadings(reading([]), reading([event('a')]));
  expect(changes.length).toBeGreaterThan(3);
  expect(changes.every(({ before, after }) => before === null && after !== null)).toBe(true);
});

test('an empty list and a missing value are the same nothing', () => {
  const bare = event('a', { kvpValues: [], details: {} });
  const gone = event('a', { kvpValues: [], details: { comment: null } as unknown as Event['details'] });
  expect(compareReadings(reading([bare]), reading([gone]))).toEqual([]);
});
