import { clamp } from './clamp';
import { leadTransmission } from './lead-transmission';

/** From this copper on the beam is as penetrating as one of 10 kV more. mm and kV (own calculation). */
export const heavyCopperMm = 0.6;
export const heavyCopperShiftKv = 10;

/** What narrow-beam lead equivalence of lead-free garments leaves out: their own fluorescence. */
export const leadFreeFactor = 1.5;

/** kVp at which the transmission is read: 10 kV higher behind 0.6 mm copper or more. (80, 0.9) → 90. */
export function transmissionKvp(kvp: number, copperMm: number | null): number {
  return copperMm !== null && copperMm >= heavyCopperMm ? kvp + heavyCopperShiftKv : kvp;
}

/**
 * Share of the scatter that passes the sound part of a garment, 0 to 1, by its lead equivalence in
 * mm: the larger of the NCRP 147 fits, × 1.5 for lead-free material known by narrow beam only.
 *
 * Known value: 80 kVp, no copper, 0.35 mm lead: 0.0307.
 */
export function garmentTransmission(input: {
  kvp: number;
  copperMm: number | null;
  leadMm: number;
  isLeadFree: boolean;
}): number {
  const transmission = leadTransmission(transmissionKvp(input.kvp, input.copperMm), input.leadMm);
  return Math.min(1, transmission * (input.isLeadFree ? leadFreeFactor : 1));
}

/**
 * Transmission of a garment with holes over the share f of its area: T' = (1 − f)·T + f, 0 to 1.
 *
 * Source: R. L. Dixon's argument that a hole matters by its share of the area. Known value: T = 0.05,
 * f = 0.01: 0.0595 (× 1.19).
 */
export function defectiveTransmission(transmission: number, defectAreaFraction: number): number {
  const fraction = clamp(defectAreaFraction, 0, 1);
  return (1 - fraction) * transmission + fraction;
}
