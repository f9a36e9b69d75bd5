import { expect, test } from 'vitest';
import { checkOne, makeReport, resultOf } from './given-facts';

test('more than five per cent between events and totals is said; a factor of ten is a unit', () => {
  const sums = (kermaGy: number) => ({ kermaGy: 1, productGyCm2: 100, summed: { kermaGy } });
  expect(resultOf('totals-against-events', sums(0.96))).toBe('passed');
  expect(resultOf('totals-against-events', sums(0.94))).toBe('noted');
  expect(resultOf('event-units', sums(0.94))).toBe('passed');
  expect(resultOf('event-units', sums(0.102))).toBe('failed');
  expect(resultOf('event-units', sums(1000))).toBe('failed');
  expect(resultOf('event-units', sums(0.5))).toBe('passed');
});

test('a total that holds the procedure before is a counter that was not reset', () => {
  const previousTotals = new Map([['machine', { referenceAirKermaGy: 1.2, kermaAreaProductGyCm2: null }]]);
  const total = (kermaGy: number) => ({ kermaGy, summed: { kermaGy: 0.35 }, context: { previousTotals } });
  const standing = checkOne('reset-failure', total(1.55));
  expect(standing.result).toBe('failed');
  expect(standing.detail).toMatch(/by 1.200 mGy.*\(1.200 mGy\)/);
  expect(resultOf('reset-failure', total(1.3))).toBe('passed');
  expect(resultOf('reset-failure', total(0.35))).toBe('passed');
  expect(resultOf('reset-failure', { kermaGy: 1.55, summed: { kermaGy: 0.35 } })).toBe('not-checked');
});

test('a plane that repeats the other’s total without events to bear it out is doubted', () => {
  const twice = { kermaGy: 1.8, productGyCm2: 130 };
  expect(resultOf('planes-alike', { ...twice, planeB: { ...twice, summed: { kermaGy: 0.6 } } })).toBe(
    'failed',
  );
  expect(resultOf('planes-alike', { ...twice, planeB: twice })).toBe('passed');
  expect(resultOf('planes-alike', { ...twice, planeB: { kermaGy: 1.2, productGyCm2: 60 } })).toBe('passed');
  expect(resultOf('planes-alike', twice)).toBe('not-checked');
});

test('a total of all planes that is not the sum of the planes is said', () => {
  const planes = (all: number) => [
    { plane: 'A', referenceAirKermaGy: 1.8, kermaAreaProductGyCm2: 130 },
    { plane: 'B', referenceAirKermaGy: 1.2, kermaAreaProductGyCm2: 60 },
    { plane: 'all', referenceAirKermaGy: all, kermaAreaProductGyCm2: 190 },
  ];
  const input = (all: number) => ({ reports: [makeReport({ reportedPlanes: planes(all) })] });
  expect(resultOf('plane-sum', { input: input(3) })).toBe('passed');
  expect(resultOf('plane-sum', { input: input(1.8) })).toBe('noted');
});

test('totals no procedure reaches', () => {
  expect(resultOf('kerma-total', { kermaGy: 350, productGyCm2: null })).toBe('failed');
  expect(resultOf('kerma-total', { kermaGy: 15 })).toBe('passed');
  expect(resultOf('area-product-total', { kermaGy: null, productGyCm2: 43_000 })).toBe('failed');
});
