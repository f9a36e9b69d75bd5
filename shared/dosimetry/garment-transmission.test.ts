import { describe, expect, it } from 'vitest';
import { defectiveTransmission, garmentTransmission, transmissionKvp } from './garment-transmission';
import { leadTransmission } from './lead-transmission';

const sound = { kvp: 80, copperMm: 0.1, leadMm: 0.35, isLeadFree: false };

describe('a garment', () => {
  it('of 0.35 mm lead lets 3.1 % through at 80 kVp', () =>
    expect(garmentTransmission(sound)).toBeCloseTo(0.0307, 4));
  it('is read 10 kV higher from 0.6 mm copper on', () => {
    expect([null, 0, 0.59, 0.6, 0.9].map((copperMm) => transmissionKvp(80, copperMm))).toEqual([
      80, 80, 80, 90, 90,
    ]);
    expect(garmentTransmission({ ...sound, copperMm: 0.9 })).toBe(leadTransmission(90, 0.35));
  });
  it('without lead lets 1.5 times as much through, never more than all', () => {
    expect(garmentTransmission({ ...sound, isLeadFree: true })).toBeCloseTo(
      1.5 * garmentTransmission(sound),
      12,
    );
    expect(garmentTransmission({ ...sound, leadMm: 0.01, isLeadFree: true })).toBe(1);
  });
  it('lets everything through where it is all hole', () => {
    expect(defectiveTransmission(0.03, 1)).toBe(1);
    expect(defectiveTransmission(0.03, 0)).toBe(0.03);
    expect(defectiveTransmission(0.03, 7)).toBe(1);
  });
});
