import { expect, test } from 'vitest';
import type { PlaneTotals } from '../../shared/contract/procedure';
import { checkData } from './check-data';
import type { SummaryEvent, SummaryInput } from './summary-input';
import { totalTogether } from './total-together';

type Given = {
  kermaGy?: number | null;
  productGyCm2?: number | null;
  minutes?: number | null;
  summedKermaGy?: number | null;
  events?: Partial<SummaryEvent>[];
};

function check(
  code: string,
  { kermaGy = 0.35, productGyCm2 = 43, minutes = 6.5, summedKermaGy = kermaGy, events = [] }: Given,
) {
  const displayed = {
    kermaAreaProductGyCm2: productGyCm2,
    referenceAirKermaGy: kermaGy,
    fluoroscopyTimeS: minutes === null ? null : minutes * 60,
  };
  const planes = [
    {
      plane: 'single',
      reported: displayed,
      summed: { ...displayed, referenceAirKermaGy: summedKermaGy },
      displayed,
      corrected: {},
      factors: {},
    },
  ] as unknown as PlaneTotals[];
  const input = {
    events: events.map((event) => ({
      kvpValues: [80],
      startedAt: new Date('2026-11-30T10:00:00Z'),
      ...event,
    })),
    reports: [],
    now: new Date('2026-12-01T00:00:00Z'),
  } as unknown as SummaryInput;
  return checkData({ input, planes, together: totalTogether(planes, null) }).find(
    (item) => item.code === code,
  );
}

// Own acceptance check: 4,300 Gy·cm² over 350 mGy is a mean field of 12,286 cm²; the true 43.0 is 123 cm².
test('a kerma-area product a hundred times too large is found by the mean field area', () => {
  expect(check('mean-field-area', { productGyCm2: 4300 })).toMatchObject({
    result: 'failed',
    detail: expect.stringContaining('12300'),
  });
  expect(check('mean-field-area', { productGyCm2: 43 })).toMatchObject({
    result: 'passed',
    detail: expect.stringContaining('123 cm²'),
  });
});

test('bounds of the mean field area count as plausible', () => {
  expect(check('mean-field-area', { kermaGy: 0.1, productGyCm2: 0.4 })?.result).toBe('passed');
  expect(check('mean-field-area', { kermaGy: 0.1, productGyCm2: 0.39 })?.result).toBe('failed');
  expect(check('mean-field-area', { kermaGy: 0.1, productGyCm2: 60 })?.result).toBe('passed');
  expect(check('mean-field-area', { kermaGy: 0.1, productGyCm2: 60.1 })?.result).toBe('failed');
});

test('more than five per cent between events and totals is said', () => {
  expect(check('totals-against-events', { kermaGy: 1, productGyCm2: 100, summedKermaGy: 0.96 })?.result).toBe(
    'passed',
  );
  expect(check('totals-against-events', { kermaGy: 1, productGyCm2: 100, summedKermaGy: 0.94 })?.result).toBe(
    'noted',
  );
});

test('fluoroscopy without air kerma, and too much air kerma for its time', () => {
  expect(check('kerma-against-time', { kermaGy: 0, minutes: 0.6 })?.result).toBe('noted');
  expect(check('kerma-against-time', { kermaGy: 0, minutes: 0.4 })?.result).toBe('passed');
  expect(check('kerma-against-time', { kermaGy: 6.1, minutes: 10 })?.result).toBe('noted');
});

test('kVp outside 40 to 125 or missing is said', () => {
  expect(check('kvp-range', { events: [{ kvpValues: [39, 80] }] })?.result).toBe('noted');
  expect(check('kvp-range', { events: [{ kvpValues: [40, 125] }] })?.result).toBe('passed');
  expect(check('kvp-range', { events: [{ kvpValues: [] }, {}] })?.detail).toBe(
    'kVp missing in 1 of 2 events',
  );
});

test('an event after tomorrow is said', () => {
  expect(check('event-times', { events: [{ startedAt: new Date('2026-12-03T00:00:00Z') }] })?.result).toBe(
    'noted',
  );
  expect(check('event-times', { events: [{}] })?.result).toBe('passed');
});

test('what is missing is not checked, and said so', () => {
  expect(check('mean-field-area', { kermaGy: null })?.result).toBe('not-checked');
  expect(check('kvp-range', {})?.result).toBe('not-checked');
});
