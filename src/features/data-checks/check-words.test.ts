import { expect, test } from 'vitest';
import type { DataCheck } from '../../../shared/contract/data-check';
import { countChecks, describeBounds, describeDecision } from './check-words';

test('bounds as they read', () => {
  expect(describeBounds({ low: 4, high: 600 }, 'cm²')).toBe('4 to 600 cm²');
  expect(describeBounds({ low: null, high: 5 }, '%')).toBe('up to 5 %');
  expect(describeBounds({ low: 2005, high: null }, 'year')).toBe('from 2005');
  expect(describeBounds({ low: null, high: null }, null)).toBe('–');
});

test('a correction names the totals that were typed, and no others', () => {
  const corrected = { referenceAirKermaGy: 0.35, kermaAreaProductGyCm2: 43, fluoroscopyTimeS: null };
  expect(describeDecision({ decision: 'corrected', corrected })).toBe(
    'Totals corrected: K a,r 350 mGy, P KA 43.0 Gy·cm²',
  );
  expect(describeDecision({ decision: 'left-out', corrected: null })).toBe('Left out of statistics');
});

test('a settled finding is no longer open', () => {
  const check = (result: DataCheck['result'], settlement: object | null = null) =>
    ({ result, settlement }) as DataCheck;
  expect(countChecks([check('passed'), check('passed'), check('not-checked'), check('failed')])).toBe(
    '4 rules: 2 passed, 1 not checked, 1 open.',
  );
  expect(countChecks([check('failed', {}), check('noted')])).toBe('2 rules: 1 open, 1 settled.');
});
