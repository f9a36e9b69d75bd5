import { describe, expect, test } from 'vitest';
import {
  formatAirKermaRateMgyPerMin,
  convertGyM2ToGyCm2,
  convertGyPerSToMgyPerMin,
  convertMsvToMrem,
  convertSecondsToMinutes,
  formatDecimals,
  formatFluoroscopyTime,
  formatKermaAreaProduct,
  formatPercent,
  formatPrimaryAngle,
  formatReferenceAirKerma,
  formatReferenceAirKermaMgy,
  formatScatter,
  formatScatterInterval,
  formatSecondaryAngle,
  formatSignificant,
} from './units';

describe('conversions (SI prefixes; 1 rem = 0.01 Sv)', () => {
  test('0.00430 Gy·m² is 43.0 Gy·cm²', () => {
    expect(convertGyM2ToGyCm2(0.0043)).toBeCloseTo(43, 12);
  });
  test('390 s is 6.5 min', () => {
    expect(convertSecondsToMinutes(390)).toBe(6.5);
  });
  test('1 mGy/s is 60 mGy/min', () => {
    expect(convertGyPerSToMgyPerMin(0.001)).toBeCloseTo(60, 12);
  });
  test('0.5 mSv is 50 mrem', () => {
    expect(convertMsvToMrem(0.5)).toBe(50);
  });
});

describe('reference air kerma', () => {
  test('is whole milligray with thin-space thousands', () => {
    expect(formatReferenceAirKerma(5.3104)).toEqual({ value: '5\u202f310', unit: 'mGy' });
  });
  test('turns to gray with two decimals at ten gray', () => {
    expect(formatReferenceAirKerma(12.346)).toEqual({ value: '12.35', unit: 'Gy' });
  });
  test('turns to gray as soon as it would read 10 000 mGy', () => {
    expect(formatReferenceAirKerma(9.9997)).toEqual({ value: '10.00', unit: 'Gy' });
    expect(formatReferenceAirKerma(9.9994)).toEqual({ value: '9\u202f999', unit: 'mGy' });
  });
  test('keeps milligray in a column', () => {
    expect(formatReferenceAirKermaMgy(12.346)).toBe('12\u202f346');
  });
  test('never shows a small value as zero', () => {
    expect(formatReferenceAirKermaMgy(0.00031)).toBe('0.3');
  });
  test('shows a missing value as a dash and a true zero as 0', () => {
    expect(formatReferenceAirKermaMgy(null)).toBe('–');
    expect(formatReferenceAirKermaMgy(0)).toBe('0');
  });
});

test('a low air-kerma rate keeps two digits, so that ticks of an axis differ', () => {
  expect([0, 0.5, 2, 9.9, 12.4, 60].map(formatAirKermaRateMgyPerMin)).toEqual([
    '0',
    '0.50',
    '2.0',
    '9.9',
    '12',
    '60',
  ]);
});

test('kerma–area product has three significant digits', () => {
  expect([0.84, 43, 271, 1234, 99.96, 0].map(formatKermaAreaProduct)).toEqual([
    '0.840',
    '43.0',
    '271',
    '1\u202f230',
    '100',
    '0',
  ]);
});

test('fluoroscopy time has one decimal and never hides a short run', () => {
  expect([2046, 0, 2.4, 3, null].map(formatFluoroscopyTime)).toEqual(['34.1', '0.0', '< 0.1', '0.1', '–']);
});

test('scatter has two significant digits and an interval', () => {
  expect(formatScatter(433.2)).toBe('430');
  expect(formatScatter(0.0518)).toBe('0.052');
  expect(formatScatterInterval(142, 1304)).toBe('140–1\u202f300');
  expect(formatScatterInterval(142, null)).toBeNull();
});

test('a negative value bears a minus sign unless it rounds to zero', () => {
  expect(formatDecimals(-1234.5, 1)).toBe('\u22121\u202f234.5');
  expect(formatDecimals(-0.04, 1)).toBe('0.0');
});

test('an infinite or undefined result is missing', () => {
  expect(formatSignificant(Number.NaN, 2)).toBe('–');
});

test('percentages keep a decimal where a whole number would mislead', () => {
  expect([0.0083, 0.62, 0.997, 1, 0.0996].map(formatPercent)).toEqual([
    '0.8\u202f%',
    '62\u202f%',
    '99.7\u202f%',
    '100\u202f%',
    '10\u202f%',
  ]);
});

test('angles are named by side', () => {
  expect([42.4, -30, 0.3, null].map(formatPrimaryAngle)).toEqual(['LAO 42°', 'RAO 30°', '0°', '–']);
  expect([25, -15].map(formatSecondaryAngle)).toEqual(['CRA 25°', 'CAU 15°']);
});
