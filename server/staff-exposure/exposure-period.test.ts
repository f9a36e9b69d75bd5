import { expect, test } from 'vitest';
import { findFirstMonthDay, findPeriodStart, listMonths } from './exposure-period';

/** 02:00 UTC on 1 December: still November in Denver. */
const now = new Date('2026-12-01T02:00:00Z');

test('a period goes back whole days from now; all time has no beginning', () => {
  expect(findPeriodStart('7d', now)?.toISOString()).toBe('2026-11-24T02:00:00.000Z');
  expect(findPeriodStart('all', now)).toBeNull();
  expect(findFirstMonthDay('all', now, 'UTC')).toBeNull();
});

test('months are those of the hospital’s zone, and the first one is whole', () => {
  expect(findFirstMonthDay('30d', now, 'America/Denver')).toBe('2026-10-01');
  expect(findFirstMonthDay('30d', now, 'UTC')).toBe('2026-11-01');
});

test('no month is left out, across a new year too', () => {
  expect(listMonths('2025-11', '2026-02')).toEqual(['2025-11', '2025-12', '2026-01', '2026-02']);
  expect(listMonths('2026-02', '2026-02')).toEqual(['2026-02']);
});
