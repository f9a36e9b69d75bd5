import { estimateStaffExposures, type EstimateOptions } from '../../shared/dosimetry/estimate-staff-exposure';
import {
  exampleContext,
  exampleEvent,
  exampleGarment,
  examplePerson,
} from '../../shared/dosimetry/example-exposure';

const events = Array.from({ length: 300 }, (_, index) =>
  exampleEvent({
    type: index % 12 === 11 ? 'stationary-acquisition' : 'fluoroscopy',
    kvp: 70 + (index % 23),
    kermaAreaProductGyCm2: 0.35 * (1 + 0.6 * Math.sin(index)),
    copperMm: [0.1, 0.3, 0.6][index % 3] ?? null,
    primaryAngleDeg: 35 * Math.sin(index / 17),
    secondaryAngleDeg: 20 * Math.cos(index / 11),
  }),
);

/** Six people at places of their own, in garments of their own. */
const people = [0, 1, 2, 3, 4, 5].map((index) => {
  const place = { preset: null, xM: -0.6 - 0.3 * index, yM: 0.4 * index - 0.8, isBehindBarrier: false };
  return examplePerson({
    statureM: 1.6 + 0.05 * index,
    fluoroscopyPlace: place,
    acquisitionPlace: { ...place, xM: place.xM - 0.5 },
    garment: exampleGarment({ frontLeadMm: [0.25, 0.35, 0.5][index % 3] ?? 0.5 }),
    hasCeilingScreen: index < 2,
    hasTableSkirt: true,
    hasGlasses: index % 2 === 0,
  });
});

/** The estimates of a long case: 300 events, six people. Throws if one of them has no value. */
export function estimateLongCase(options: EstimateOptions): void {
  const estimates = estimateStaffExposures(events, people, exampleContext(), options);
  if (estimates.some(({ effectiveDoseUSv }) => effectiveDoseUSv === null))
    throw new Error('An estimate is missing.');
}
