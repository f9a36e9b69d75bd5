import { expect, test } from 'vitest';
import type { Role } from '../../shared/permissions';
import { findPlaces } from './places';

const name = (...roles: Role[]) => findPlaces({ id: 'p', roles }).map((place) => place.name);

test('the committee is not offered procedures or dose reports', () => {
  expect(name('committee')).not.toContain('Procedures');
  expect(name('committee')).not.toContain('Dose reports');
  expect(name('committee')).toContain('Staff exposure');
});
test('an interventionalist sees own procedures and own exposure, not other people’s', () => {
  expect(name('interventionalist')).toEqual(['Procedures', 'My exposure', 'Garments', 'Methods']);
});
test('a monitored person without a role has a place too', () => {
  expect(name()).toEqual(['My exposure', 'Garments', 'Methods']);
});
