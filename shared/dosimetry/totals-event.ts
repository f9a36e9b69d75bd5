import type { ExposureEvent } from './exposure-types';

/**
 * The single event that stands for a procedure of which only totals are known: the whole KAP in
 * Gy·cm² at the KAP-weighted kVp, angles and copper unknown, counted at the place during
 * fluoroscopy unless a type is given.
 */
export function eventFromTotals(totals: {
  kermaAreaProductGyCm2: number | null;
  kvp: number | null;
  plane?: ExposureEvent['plane'];
  type?: ExposureEvent['type'];
  kapCalibrationFactor?: number | null;
}): ExposureEvent {
  return {
    type: totals.type ?? null,
    plane: totals.plane ?? null,
    kvp: totals.kvp,
    kermaAreaProductGyCm2: totals.kermaAreaProductGyCm2,
    copperMm: null,
    primaryAngleDeg: null,
    secondaryAngleDeg: null,
    primaryEndAngleDeg: null,
    secondaryEndAngleDeg: null,
    kapCalibrationFactor: totals.kapCalibrationFactor ?? null,
  };
}
