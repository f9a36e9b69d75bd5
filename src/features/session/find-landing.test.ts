import { expect, test } from 'vitest';
import type { Role } from '../../../shared/permissions';
import { findLanding } from './find-landing';

const land = (...roles: Role[]) => findLanding({ id: 'p', roles });

test('everyone lands where the role works', () => {
  expect(land('technologist')).toBe('procedures');
  expect(land('physicist', 'administrator')).toBe('procedures');
  expect(land('interventionalist')).toBe('procedures');
  expect(land('committee')).toBe('staffExposure');
  expect(land('administrator')).toBe('administration');
});
test('a monitored person without a role lands on the own exposure', () => {
  expect(land()).toBe('myExposure');
});
