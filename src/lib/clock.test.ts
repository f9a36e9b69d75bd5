import { expect, test } from 'vitest';
import { formatDateTime, formatInstant, formatMonth, readClockS } from './clock';

test('a written time is shown as written, with and without an offset', () => {
  expect(formatDateTime('2026-11-30T17:40:08-08:00')).toBe('2026-11-30 17:40');
  expect(formatDateTime('2026-11-30T17:40:08')).toBe('2026-11-30 17:40');
});
test('an instant of the server is shown in the hospital’s zone', () => {
  expect(formatInstant('2026-12-01T01:40:00Z', 'America/Los_Angeles')).toBe('2026-11-30 17:40');
});
test('the clock of a strip starts at the written second of the day', () => {
  expect(readClockS('2026-11-30T14:12:03+01:00')).toBe(51_123);
});
test('a month is named', () => {
  expect(formatMonth('2026-11')).toBe('Nov 2026');
});
