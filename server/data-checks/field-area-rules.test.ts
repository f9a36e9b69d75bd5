import { expect, test } from 'vitest';
import type { SummaryEvent } from '../procedures/summary-input';
import { checkOne, resultOf } from './given-facts';

// Own acceptance check: 4,300 Gy·cm² over 350 mGy is a mean field of 12,286 cm²; the true 43.0 is 123 cm².
test('a kerma-area product a hundred times too large is found by the mean field area', () => {
  const slipped = checkOne('mean-field-area', { productGyCm2: 4300 });
  expect(slipped).toMatchObject({ result: 'failed', severity: 'hard', finding: '12300' });
  expect(slipped.detail).toMatch(/12.300 cm²: a unit slip\?/);
  expect(checkOne('mean-field-area', {})).toMatchObject({
    result: 'passed',
    detail: expect.stringContaining('123 cm²'),
  });
});

test.each([
  [0.4, 'passed'],
  [0.39, 'failed'],
  [60, 'passed'],
  [60.1, 'failed'],
])('a mean field of %d Gy·cm² over 0.1 Gy: %s', (productGyCm2, result) => {
  expect(resultOf('mean-field-area', { kermaGy: 0.1, productGyCm2 })).toBe(result);
});

test('a field more than five times off its type’s median is found from twenty others on', () => {
  const context = { typeFieldArea: { medianCm2: 123, count: 20 } };
  expect(resultOf('field-area-for-type', { productGyCm2: 43 * 5.1, context })).toBe('failed');
  expect(resultOf('field-area-for-type', { productGyCm2: 43 / 5.1, context })).toBe('failed');
  expect(resultOf('field-area-for-type', { productGyCm2: 43 * 4.9, context })).toBe('passed');
  const few = { typeFieldArea: { medianCm2: 123, count: 19 } };
  expect(resultOf('field-area-for-type', { productGyCm2: 4300, context: few })).toBe('not-checked');
});

// Own arithmetic: 600 cm² at 1,000 mm is 600 × 0.6² = 216 cm² at a reference point 600 mm from the focus.
const collimated = (productGyCm2: number): Partial<SummaryEvent> => ({
  fieldAreaCm2: 600,
  sourceToDetectorMm: 1000,
  sourceToIsocenterMm: 750,
  sourceToReferencePointMm: null,
  referenceAirKermaGy: 0.01,
  kermaAreaProductGyCm2: productGyCm2,
});

test('field area × K a,r at the reference point is held against P KA of the events, by their median', () => {
  expect(resultOf('collimated-area', { events: [collimated(2.16)] })).toBe('passed');
  expect(resultOf('collimated-area', { events: [collimated(2.16 * 1.31)] })).toBe('noted');
  expect(resultOf('collimated-area', { events: [collimated(2.16 * 0.69)] })).toBe('noted');
  const oneOdd = [collimated(216), collimated(2.16), collimated(2.2)];
  expect(resultOf('collimated-area', { events: oneOdd })).toBe('passed');
  expect(resultOf('collimated-area-unit', { events: [collimated(216), collimated(210)] })).toBe('failed');
  expect(resultOf('collimated-area-unit', { events: [collimated(0.216)] })).toBe('failed');
  expect(resultOf('collimated-area-unit', { events: [{}] })).toBe('not-checked');
});
