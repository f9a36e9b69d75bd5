import { expect, test } from 'vitest';
import type { ExposureMonth } from '../../../shared/contract/staff-exposure';
import { dropEmptyEnd, formatSmallMsv, sumFigures, toIntervals, writeMsv } from './month-figures';

const month = (name: string, procedures: number, nominal: number | null): ExposureMonth => ({
  month: name,
  procedures,
  withoutEstimate: 0,
  collarHp10USv: nominal === null ? null : { nominal, low: nominal / 2, high: nominal * 3 },
  eyeHp3USv: null,
  underGarmentHp10USv: null,
  effectiveDoseUSv: null,
});

test('estimates are printed with no more digits than they carry', () => {
  expect([0.0123, 0.0996, 1.234, 9.996, 87.32, 667.8, null].map(formatSmallMsv)).toEqual([
    '0.012',
    '0.10',
    '1.23',
    '10.0',
    '87.3',
    '668',
    '–',
  ]);
  expect(writeMsv({ nominal: 1240, low: 402, high: 3120 })).toBe('1.24 mSv (0.40–3.1)');
});

test('a sum leaves out what is missing and is missing where all is', () => {
  const months = [month('2026-09', 2, 100), month('2026-10', 1, null), month('2026-11', 3, 300)];
  expect(sumFigures(months, 'collarHp10USv')).toEqual({ nominal: 400, low: 200, high: 1200 });
  expect(sumFigures(months, 'eyeHp3USv')).toBeNull();
});

test('a month without procedures and one that is not estimable are told apart', () => {
  const texts = toIntervals([month('2026-09', 0, null), month('2026-10', 1, null)], 'collarHp10USv');
  expect(texts.map(({ nominal, text }) => [nominal, text])).toEqual([
    [null, 'Sep 2026: no procedures'],
    [null, 'Oct 2026: not estimable, 1 procedure'],
  ]);
});

test('only an empty last month is left out', () => {
  const months = [month('2026-10', 0, null), month('2026-11', 1, 5), month('2026-12', 0, null)];
  expect(dropEmptyEnd(months).map((one) => one.month)).toEqual(['2026-10', '2026-11']);
  expect(dropEmptyEnd(months.slice(0, 2))).toHaveLength(2);
});
