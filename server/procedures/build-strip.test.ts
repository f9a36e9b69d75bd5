import fc from 'fast-check';
import { expect, test } from 'vitest';
import { buildStrip } from './build-strip';
import type { SummaryEvent } from './summary-input';

const event = (
  atS: number,
  durationS: number,
  kermaGy: number | null,
  overrides: Partial<SummaryEvent> = {},
) =>
  ({
    startedAt: new Date(Date.UTC(2026, 10, 30, 10) + atS * 1000),
    irradiationDurationS: durationS,
    exposureTimeS: null,
    referenceAirKermaGy: kermaGy,
    kermaAreaProductGyCm2: 1,
    kvpMean: 80,
    type: 'fluoroscopy',
    plane: 'single',
    ...overrides,
  }) as SummaryEvent;

test('height is air kerma over irradiation duration', () => {
  expect(buildStrip([event(0, 6, 0.012)])?.bins[0]).toMatchObject({
    fromS: 0,
    toS: 6,
    rate: 0.002,
    part: 'fluoroscopy',
  });
});

test('without any air kerma the rate of the kerma-area product is drawn, and said', () => {
  const strip = buildStrip([event(0, 10, null)]);
  expect([strip?.basis, strip?.bins[0]?.rate]).toEqual(['kerma-area-product', 0.1]);
});

test('events that cannot be drawn give no strip rather than zeros', () => {
  expect(buildStrip([])).toBeNull();
  expect(buildStrip([event(0, 0, 0.01)])).toBeNull();
});

test('any number of events fits into 64 bins, and the air kerma under the strip stays', () => {
  const anyEvents = fc.array(
    fc.record({
      durationS: fc.integer({ min: 1, max: 30 }),
      kermaMGy: fc.integer({ min: 1, max: 50 }),
      isB: fc.boolean(),
      isRun: fc.boolean(),
    }),
    { minLength: 1, maxLength: 300 },
  );
  fc.assert(
    fc.property(anyEvents, (given) => {
      let atS = 0;
      const events = given.map(({ durationS, kermaMGy, isB, isRun }) => {
        atS += 40;
        return event(atS, durationS, kermaMGy / 1000, {
          plane: isB ? 'B' : 'A',
          type: isRun ? 'stationary-acquisition' : 'fluoroscopy',
        });
      });
      const strip = buildStrip(events);
      const area = strip?.bins.reduce((sum, bin) => sum + bin.rate * (bin.toS - bin.fromS), 0) ?? 0;
      const kerma = events.reduce((sum, { referenceAirKermaGy }) => sum + (referenceAirKermaGy ?? 0), 0);
      expect(strip?.bins.length).toBeLessThanOrEqual(64);
      expect(Math.abs(area - kerma) / kerma).toBeLessThan(0.02);
    }),
    { numRuns: 60 },
  );
});
