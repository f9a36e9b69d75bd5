import { expect, test } from 'vitest';
import type { Garment } from '../../../shared/contract/garment';
import { findGarments, garmentFilterSchema } from './garment-filter';

const garment = (code: string, overrides: Partial<Garment> = {}): Garment => ({
  id: code,
  code,
  kind: 'vest-and-skirt',
  material: 'lead',
  frontLeadMm: 0.5,
  backLeadMm: null,
  leadKvp: null,
  isMeasured: false,
  owner: null,
  state: 'in-service',
  lastInspectedOn: null,
  nextDueOn: '2027-01-01',
  isOverdue: false,
  note: null,
  version: 1,
  ...overrides,
});
const garments = [
  garment('worn'),
  garment('late', { isOverdue: true }),
  garment('lost', { state: 'lost', nextDueOn: null }),
  garment('collar', { kind: 'thyroid-collar', nextDueOn: null }),
];
const find = (filter: object) =>
  findGarments(garments, garmentFilterSchema.parse(filter)).map((found) => found.code);

test('unless asked otherwise, what is in service is listed', () => {
  expect(find({})).toEqual(['worn', 'late', 'collar']);
});
test('out of service, overdue, without a date, and of one kind', () => {
  expect(find({ state: 'out' })).toEqual(['lost']);
  expect(find({ due: 'overdue' })).toEqual(['late']);
  expect(find({ due: 'undated', state: 'any' })).toEqual(['lost', 'collar']);
  expect(find({ kind: 'thyroid-collar' })).toEqual(['collar']);
});
