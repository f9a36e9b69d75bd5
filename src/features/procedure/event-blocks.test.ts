import { describe, expect, it } from 'vitest';
import type { IrradiationEvent } from '../../../shared/contract/irradiation-event';
import { buildEventBlocks, findRate, findRateBasis, findSpanS } from './event-blocks';
import { describeAngles, describeEvent } from './event-words';

const event = (over: Partial<IrradiationEvent>): IrradiationEvent => ({
  id: 'e',
  irradiationEventUid: null,
  plane: 'single',
  type: 'fluoroscopy',
  startedAt: '2026-03-04T09:00:00',
  offsetS: 0,
  protocol: null,
  kvpValues: [],
  kvpMean: null,
  tubeCurrentMa: null,
  pulseWidthMs: null,
  pulseCount: null,
  pulseRatePerS: null,
  exposureTimeS: null,
  irradiationDurationS: null,
  kermaAreaProductGyCm2: null,
  referenceAirKermaGy: null,
  airKermaRateGyPerS: null,
  airKermaRateBasis: null,
  primaryAngleDeg: null,
  secondaryAngleDeg: null,
  primaryEndAngleDeg: null,
  secondaryEndAngleDeg: null,
  sourceToDetectorMm: null,
  sourceToIsocenterMm: null,
  fieldAreaCm2: null,
  filters: [],
  reported: {},
  details: {},
  ...over,
});

describe('the large strip', () => {
  it('draws air-kerma rate in mGy/min: 0.0005 Gy/s is 30 mGy/min', () => {
    const one = event({ offsetS: 12, irradiationDurationS: 4, airKermaRateGyPerS: 0.0005, kvpMean: 85 });
    const [block] = buildEventBlocks([one], findRateBasis([one]));
    expect(block).toMatchObject({ from: 12, to: 16, shade: 3, side: 'above', isPatterned: false });
    expect(block?.height).toBeCloseTo(30, 9);
  });
  it('falls back to area-product rate only where no event tells its air kerma', () => {
    const product = event({
      kermaAreaProductGyCm2: 2,
      exposureTimeS: 30,
      plane: 'B',
      type: 'stationary-acquisition',
    });
    expect(findRate(product, findRateBasis([product]))).toBeCloseTo(4, 9);
    expect(buildEventBlocks([product], 'kerma-area-product')[0]).toMatchObject({
      side: 'below',
      isPatterned: true,
    });
    const both = [product, event({ airKermaRateGyPerS: 0.001 })];
    expect(findRateBasis(both)).toBe('reference-air-kerma');
    expect(findRate(product, findRateBasis(both))).toBeNull();
  });
  it('keeps an event without duration in sight', () => {
    const blocks = buildEventBlocks([event({ offsetS: 100 })], 'reference-air-kerma');
    expect(blocks[0]).toMatchObject({ from: 100, to: 101, height: 0, shade: null });
    expect(findSpanS(blocks)).toBe(101);
    expect(findSpanS([])).toBeGreaterThan(0);
  });
});

it('says an event in one sentence and leaves out what the file does not say', () => {
  const rotational = event({
    plane: 'B',
    type: 'rotational-acquisition',
    kvpMean: 82.4,
    airKermaRateGyPerS: 0.001,
    primaryAngleDeg: -100,
    primaryEndAngleDeg: 100,
    secondaryAngleDeg: 0,
  });
  expect(describeAngles(rotational)).toBe('RAO 100° / 0° to LAO 100°');
  expect(describeEvent(rotational, 4, 'reference-air-kerma')).toBe(
    'Event 5, 09:00:00, plane B, rotational acquisition, 82 kVp, 60 mGy/min, RAO 100° / 0° to LAO 100°',
  );
});
