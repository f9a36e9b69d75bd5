import { expect, test } from 'vitest';
import { createInputClock, idleMinutes } from './screen-lock';

const minute = 60_000;
function storageStub() {
  const values = new Map<string, string>();
  return {
    getItem: (key: string) => values.get(key) ?? null,
    setItem: (key: string, value: string) => void values.set(key, value),
  };
}

test('a screen nobody touches is idle after the set minutes, not before', () => {
  let now = 1_000_000;
  const clock = createInputClock(null, () => now);
  now += idleMinutes * minute - 1;
  expect(clock.isIdle()).toBe(false);
  now += 1;
  expect(clock.isIdle()).toBe(true);
  clock.touch();
  expect(clock.isIdle()).toBe(false);
});

test('work in one tab keeps the other open', () => {
  let now = 1_000_000;
  const storage = storageStub();
  const [one, other] = [createInputClock(storage, () => now), createInputClock(storage, () => now)];
  now += idleMinutes * minute;
  one.touch();
  expect(other.isIdle()).toBe(false);
});

test('closed storage does no harm', () => {
  const closed = {
    getItem: () => {
      throw new Error('closed');
    },
    setItem: () => {
      throw new Error('closed');
    },
  };
  const clock = createInputClock(closed, () => 5);
  clock.touch();
  expect(clock.isIdle()).toBe(false);
});
