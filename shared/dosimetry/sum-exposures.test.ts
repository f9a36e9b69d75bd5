import { describe, expect, it } from 'vitest';
import { estimateStaffExposure, sumExposures } from './estimate-staff-exposure';
import { exampleContext, exampleEvent, examplePerson } from './example-exposure';
import { estimatedQuantities } from './exposure-types';
import { placeFromPreset } from './room-positions';

const place = placeFromPreset('operator');
const person = examplePerson({ fluoroscopyPlace: place, acquisitionPlace: place, hasCeilingScreen: true });
const context = exampleContext();
const first = [exampleEvent(), exampleEvent({ kvp: 95, primaryAngleDeg: 40 })];
const second = [
  exampleEvent({ kermaAreaProductGyCm2: 30, kapCalibrationFactor: 1.1, secondaryAngleDeg: -20 }),
];
const estimate = (events: typeof first, who = person) => estimateStaffExposure(events, who, context);

describe('a person’s sum over procedures', () => {
  it('equals the estimate of all events as one procedure, interval included', () => {
    const sum = sumExposures([estimate(first), estimate(second)]);
    const together = estimate([...first, ...second]);
    for (const quantity of estimatedQuantities) {
      for (const end of ['nominal', 'low', 'high'] as const) {
        expect((sum[quantity]?.[end] ?? Number.NaN) / (together[quantity]?.[end] ?? Number.NaN)).toBeCloseTo(
          1,
          4,
        );
      }
    }
  });

  it('does not narrow with the number of procedures: their errors are shared', () => {
    const one = estimate(first).collarHp10USv;
    const twelve = sumExposures(Array.from({ length: 12 }, () => estimate(first))).collarHp10USv;
    expect((twelve?.high ?? 0) / (twelve?.nominal ?? 1)).toBeCloseTo(
      (one?.high ?? 0) / (one?.nominal ?? 1),
      4,
    );
  });

  it('leaves unknown values out, counts them, and is null where none is known', () => {
    const unknown = estimate(second, { ...person, garment: { answer: 'unknown' } });
    const sum = sumExposures([estimate(first), unknown]);
    expect(sum.estimateCount).toBe(2);
    expect(sum.missingCounts.effectiveDoseUSv).toBe(1);
    expect(sum.missingCounts.collarHp10USv).toBe(0);
    expect(sum.effectiveDoseUSv?.nominal).toBe(estimate(first).effectiveDoseUSv?.nominal);
    expect(sumExposures([unknown]).effectiveDoseUSv).toBeNull();
    expect(sumExposures([]).collarHp10USv).toBeNull();
  });

  it('adds whole intervals where the spreads were not kept', () => {
    const bare = { ...estimate(first), spreads: undefined };
    const sum = sumExposures([bare, bare]).eyeHp3USv;
    expect(sum?.low).toBeCloseTo(2 * (bare.eyeHp3USv?.low ?? Number.NaN), 9);
    expect(sum?.high).toBeCloseTo(2 * (bare.eyeHp3USv?.high ?? Number.NaN), 9);
  });
});
