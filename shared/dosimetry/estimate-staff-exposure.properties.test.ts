import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  estimateStaffExposure,
  type ExposureEvent,
  type StaffExposureEstimate,
} from './estimate-staff-exposure';
import { exampleContext, exampleEvent, exampleGarment, examplePerson } from './example-exposure';
import { estimatedQuantities } from './exposure-types';
import { placeFromPreset } from './room-positions';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const optional = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: null, freq: 4 });

const anyEvent: fc.Arbitrary<ExposureEvent> = fc
  .record({
    type: fc.constantFrom('fluoroscopy', 'stationary-acquisition', 'rotational-acquisition', null),
    plane: fc.constantFrom('single', 'A', 'B', null),
    kvp: optional(number(50, 125)),
    kermaAreaProductGyCm2: number(0.001, 50),
    copperMm: optional(number(0, 0.9)),
    primaryAngleDeg: optional(number(-120, 120)),
    secondaryAngleDeg: optional(number(-45, 45)),
    primaryEndAngleDeg: optional(number(-120, 120)),
    secondaryEndAngleDeg: fc.constant(null),
    kapCalibrationFactor: optional(number(0.7, 1.4)),
  })
  .map((event) => exampleEvent(event));

const operator = placeFromPreset('operator');
const person = examplePerson({
  fluoroscopyPlace: operator,
  acquisitionPlace: { ...placeFromPreset('scrub'), preset: null },
  garment: exampleGarment({ frontLeadMm: 0.35, isMeasured: false, defectAreaFraction: 0.001 }),
  hasCeilingScreen: true,
  hasGlasses: true,
  isPresentDuringRotation: true,
});
const context = exampleContext();
const estimate = (events: ExposureEvent[]) => estimateStaffExposure(events, person, context);

function expectSame(actual: StaffExposureEstimate, expected: StaffExposureEstimate) {
  for (const quantity of estimatedQuantities) {
    for (const end of ['nominal', 'low', 'high'] as const) {
      expect((actual[quantity]?.[end] ?? Number.NaN) / (expected[quantity]?.[end] ?? Number.NaN)).toBeCloseTo(
        1,
        4,
      );
    }
  }
}

describe('properties of the estimate', () => {
  it('adds over events', () => {
    fc.assert(
      fc.property(fc.array(anyEvent, { minLength: 1, maxLength: 6 }), fc.array(anyEvent, { minLength: 1, maxLength: 6 }), (first, second) => {
        const [a, b, both] = [estimate(first), estimate(second), estimate([...first, ...second])];
        for (const quantity of estimatedQuantities) {
          const sum = (a[quantity]?.nominal ?? Number.NaN) + (b[quantity]?.nominal ?? Number.NaN);
          expect((both[quantity]?.nominal ?? Number.NaN) / sum).toBeCloseTo(1, 9);
        }
      }),
    ); // prettier-ignore
  });

  it('does not change, interval included, when events are split', () => {
    fc.assert(
      fc.property(fc.array(anyEvent, { minLength: 1, maxLength: 5 }), fc.integer({ min: 2, max: 7 }), (events, parts) => {
        const split = events.flatMap((event) =>
          Array.from({ length: parts }, () => ({ ...event, kermaAreaProductGyCm2: (event.kermaAreaProductGyCm2 ?? 0) / parts })),
        );
        expectSame(estimate(split), estimate(events));
      }),
    ); // prettier-ignore
  });

  it('keeps the nominal value inside its interval', () => {
    fc.assert(
      fc.property(fc.array(anyEvent, { minLength: 1, maxLength: 6 }), (events) => {
        const result = estimate(events);
        for (const quantity of estimatedQuantities) {
          const { nominal, low, high } = result[quantity] ?? { nominal: Number.NaN, low: 0, high: 0 };
          expect(low).toBeLessThan(nominal);
          expect(high).toBeGreaterThan(nominal);
        }
      }),
    );
  });

  it('is the same with events without P KA as without them', () => {
    fc.assert(
      fc.property(fc.array(anyEvent, { minLength: 1, maxLength: 6 }), anyEvent, (events, other) => {
        expectSame(estimate([...events, { ...other, kermaAreaProductGyCm2: null }]), estimate(events));
      }),
    );
  });

  it('falls with the square of the distance along one line', () => {
    // At isocentre height (collar of a person of 1.2892 m is out of range), so scale all three axes:
    // the eye of two persons on one ray.
    fc.assert(
      fc.property(number(1.45, 1.7), number(1.05, 1.2), number(-60, 60), (statureM, factor, primaryAngleDeg) => {
        const eyeZM = 0.935 * statureM - 1.07;
        const taller = (eyeZM * factor + 1.07) / 0.935;
        const at = (xM: number, yM: number, stature: number) =>
          estimateStaffExposure(
            [exampleEvent({ primaryAngleDeg })],
            examplePerson({ statureM: stature, fluoroscopyPlace: { preset: null, xM, yM, isBehindBarrier: false } }),
            context,
          ).eyeAirKermaUGy?.nominal ?? Number.NaN;
        const near = at(-0.7, -0.5, statureM);
        const far = at(-0.7 * factor, -0.5 * factor, taller);
        expect((near / far) / factor ** 2).toBeCloseTo(1, 9);
      }),
    ); // prettier-ignore
  });

  it('rises with kVp, before and behind the garment', () => {
    fc.assert(
      fc.property(number(50, 110), number(1, 15), number(-60, 60), (kvp, more, primaryAngleDeg) => {
        const [low, high] = [kvp, kvp + more].map((value) => estimate([exampleEvent({ kvp: value, primaryAngleDeg })]));
        expect(high?.collarHp10USv?.nominal).toBeGreaterThan(low?.collarHp10USv?.nominal ?? Number.NaN);
        expect(high?.underGarmentHp10USv?.nominal).toBeGreaterThan(low?.underGarmentHp10USv?.nominal ?? Number.NaN);
      }),
    ); // prettier-ignore
  });

  it('falls with the thickness of the garment, and E with it', () => {
    fc.assert(
      fc.property(anyEvent, number(0.1, 0.9), number(0.01, 0.5), (event, frontLeadMm, more) => {
        const [thin, thick] = [frontLeadMm, frontLeadMm + more].map((leadMm) =>
          estimateStaffExposure([event], { ...person, garment: exampleGarment({ frontLeadMm: leadMm }) }, context),
        );
        expect(thick?.underGarmentHp10USv?.nominal).toBeLessThan(thin?.underGarmentHp10USv?.nominal ?? Number.NaN);
        expect(thick?.effectiveDoseUSv?.nominal).toBeLessThan(thin?.effectiveDoseUSv?.nominal ?? Number.NaN);
      }),
    ); // prettier-ignore
  });
});

describe('the drawn interval', () => {
  const events = [exampleEvent(), exampleEvent({ primaryAngleDeg: 30, kapCalibrationFactor: 1 })];

  it('repeats with its seed and has the nominal value of the closed form', () => {
    const draw = (seed: number) => estimateStaffExposure(events, person, context, { draws: 500, seed });
    expect(draw(3)).toEqual(draw(3));
    expect(draw(3).collarHp10USv?.high).not.toBe(draw(4).collarHp10USv?.high);
    expect(draw(3).collarHp10USv?.nominal).toBe(estimate(events).collarHp10USv?.nominal);
  });

  it('agrees with the closed form within a quarter', () => {
    const drawn = estimateStaffExposure(events, person, context, { draws: 20_000 });
    const closed = estimate(events);
    for (const quantity of estimatedQuantities) {
      for (const end of ['low', 'high'] as const) {
        const ratio = (drawn[quantity]?.[end] ?? Number.NaN) / (closed[quantity]?.[end] ?? Number.NaN);
        expect(ratio).toBeGreaterThan(0.75);
        expect(ratio).toBeLessThan(1.25);
      }
    }
  });

  it('is the input’s own interval where one input is all there is', () => {
    // The scatter model at one angle below 105°: −78…+40 %; ±10 % of calibration hardly adds.
    const result = estimateStaffExposure(
      [exampleEvent({ kapCalibrationFactor: 1 })],
      examplePerson(),
      context,
      { draws: 20_000 },
    );
    const { nominal, low, high } = result.collarAirKermaUGy ?? { nominal: Number.NaN, low: 0, high: 0 };
    expect(low / nominal).toBeCloseTo(0.22, 1);
    expect(high / nominal).toBeCloseTo(1.42, 1);
  });

  it('does not change when events are split', () => {
    const split = events
      .flatMap((event) => [event, event])
      .map((event) => ({ ...event, kermaAreaProductGyCm2: 5 }));
    const draw = (list: ExposureEvent[]) =>
      estimateStaffExposure(list, person, context, { draws: 2000, seed: 5 });
    expectSame(draw(split), draw(events));
  });
});
