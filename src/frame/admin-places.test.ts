import { expect, test } from 'vitest';
import type { Role } from '../../shared/permissions';
import { findAdminPlaces } from './admin-places';

const name = (...roles: Role[]) => findAdminPlaces({ id: 'p', roles }).map((place) => place.name);

test('an administrator keeps every register', () => {
  expect(name('administrator')).toEqual(['People', 'Rooms', 'Equipment', 'Procedure types', 'Data checks']);
});
test('a physicist keeps machines and procedure types, not people', () => {
  expect(name('physicist')).toEqual(['Equipment', 'Procedure types', 'Data checks']);
});
test('nobody else administers anything', () => {
  expect(name('technologist', 'interventionalist', 'committee')).toEqual([]);
});
