import { expect, test } from 'vitest';
import { findShadeStep } from './shade-step';

test('a value on a limit belongs to the class above', () => {
  const limits = [65, 75, 85, 95];
  expect([64.9, 65, 84.9, 95, 120].map((value) => findShadeStep(value, limits))).toEqual([0, 1, 2, 4, 4]);
});
test('a missing value has no class', () => {
  expect(findShadeStep(null, [65])).toBeNull();
});
