import { expect, test } from 'vitest';
import { findClockTicks, findRootTicks, findRoundTicks, formatClock } from './ticks';

test('clock ticks stand on round times of the clock, not of the recording', () => {
  // 14:12:30 to 15:12:30 with at most five ticks: quarters of an hour.
  const originS = 14 * 3600 + 12 * 60 + 30;
  const ticks = findClockTicks(0, 3600, originS, 5);
  expect(ticks.map((at) => formatClock(originS + at, false))).toEqual(['14:15', '14:30', '14:45', '15:00']);
});
test('the clock starts again at midnight', () => {
  expect(formatClock(86_400 + 61, true)).toBe('00:01:01');
});
test('round ticks have no residue of binary arithmetic', () => {
  expect(findRoundTicks(0, 0.62, 4)).toEqual([0, 0.2, 0.4, 0.6]);
});
test('an empty range has no ticks', () => {
  expect(findRoundTicks(3, 3, 4)).toEqual([]);
});
test('ticks of a square-root scale keep their distance', () => {
  const ticks = findRootTicks(870, 0.18);
  expect(ticks[0]).toBe(0);
  const places = ticks.map((value) => Math.sqrt(value / 870));
  places
    .slice(1)
    .forEach((place, index) => expect(place - places[index]!).toBeGreaterThanOrEqual(0.18 - 1e-9));
  expect(ticks.length).toBeGreaterThanOrEqual(3);
});
