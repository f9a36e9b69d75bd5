import type { ExposedPerson, ExposureContext, ExposureEvent, WornGarment } from './exposure-types';

/** A plain, fully known event: 80 kV, 10 Gy·cm², upright tube. Inputs for tests and demonstrations. */
export function exampleEvent(overrides: Partial<ExposureEvent> = {}): ExposureEvent {
  return {
    type: 'fluoroscopy',
    plane: 'single',
    kvp: 80,
    kermaAreaProductGyCm2: 10,
    copperMm: 0.1,
    primaryAngleDeg: 0,
    secondaryAngleDeg: 0,
    primaryEndAngleDeg: null,
    secondaryEndAngleDeg: null,
    kapCalibrationFactor: null,
    ...overrides,
  };
}

/** A measured, sound 0.5 mm lead garment. */
export function exampleGarment(overrides: Partial<WornGarment> = {}): WornGarment {
  return {
    answer: 'worn',
    frontLeadMm: 0.5,
    backLeadMm: 0.25,
    isMeasured: true,
    isLeadFree: false,
    defectAreaFraction: 0,
    ...overrides,
  };
}

/** Somebody at a given place beside the table, in a measured garment, without screens. */
export function examplePerson(overrides: Partial<ExposedPerson> = {}): ExposedPerson {
  const place = { preset: null, xM: -0.6, yM: -0.5, isBehindBarrier: false };
  return {
    statureM: 1.7,
    fluoroscopyPlace: place,
    acquisitionPlace: place,
    isTurnedAway: false,
    garment: exampleGarment(),
    hasThyroidCollar: true,
    hasGlasses: false,
    hasCeilingScreen: false,
    hasTableSkirt: false,
    hasMobileScreen: false,
    isPresentDuringRotation: false,
    evidenceGrade: 'A',
    ...overrides,
  };
}

/** Tube under the table, patient head first and supine, right access. */
export function exampleContext(overrides: Partial<ExposureContext> = {}): ExposureContext {
  return {
    tubePosition: 'under-table',
    patientPosition: { isFeetFirst: false, isProne: false },
    accessSide: 'right',
    typicalKvp: null,
    ...overrides,
  };
}
