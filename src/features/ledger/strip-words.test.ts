import { expect, test } from 'vitest';
import { describePeak, describeSpan } from './strip-words';

test('a span is told in minutes, a short one in seconds', () => {
  expect([40, 89, 90, 3600].map(describeSpan)).toEqual(['40 s', '89 s', '2 min', '60 min']);
});

test('the height of a strip is a rate per minute, and says so when it is of the area product', () => {
  expect(describePeak({ basis: 'reference-air-kerma', peakRate: 0.001 })).toBe('to 60 mGy/min');
  expect(describePeak({ basis: 'kerma-area-product', peakRate: 0.05 })).toContain('3.00 Gy·cm²/min');
});
