import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { archerLeadPrimary } from './archer-lead.table-data';
import {
  archerThicknessMm,
  archerTransmission,
  isOutsideLeadRange,
  leadTransmission,
  primaryLeadTransmission,
} from './lead-transmission';

const kvpRange = fc.double({ min: 50, max: 150, noNaN: true });
const leadRange = fc.double({ min: 0, max: 2, noNaN: true });

describe('lead transmission', () => {
  it('lets everything through no lead', () => expect(leadTransmission(80, 0)).toBeCloseTo(1, 12));

  it('falls with thickness', () => {
    fc.assert(
      fc.property(kvpRange, leadRange, fc.double({ min: 0.001, max: 1, noNaN: true }), (kvp, mm, more) => {
        expect(leadTransmission(kvp, mm + more)).toBeLessThan(leadTransmission(kvp, mm));
      }),
    );
  });

  it('rises with kVp', () => {
    const lead = fc.double({ min: 0.1, max: 1, noNaN: true });
    fc.assert(
      fc.property(fc.double({ min: 50, max: 120, noNaN: true }), fc.double({ min: 1, max: 30, noNaN: true }), lead, (kvp, more, mm) => {
        expect(leadTransmission(kvp + more, mm)).toBeGreaterThan(leadTransmission(kvp, mm));
      }),
    ); // prettier-ignore
  });

  it('gives the thickness back', () => {
    fc.assert(
      fc.property(fc.constantFrom(...archerLeadPrimary), fc.double({ min: 0.01, max: 2, noNaN: true }), (fit, mm) => {
        expect(archerThicknessMm(fit, archerTransmission(fit, mm))).toBeCloseTo(mm, 6);
      }),
    ); // prettier-ignore
  });

  it('takes the logarithm as linear between rows: the geometric mean half-way', () => {
    const between = primaryLeadTransmission(82.5, 0.5);
    expect(between).toBeCloseTo(
      Math.sqrt(primaryLeadTransmission(80, 0.5) * primaryLeadTransmission(85, 0.5)),
      12,
    );
  });

  it('is clamped outside 50–150 kVp and beyond 3 mm, and says so', () => {
    expect(leadTransmission(40, 0.5)).toBe(leadTransmission(50, 0.5));
    expect(leadTransmission(170, 0.5)).toBe(leadTransmission(150, 0.5));
    expect(leadTransmission(80, 4)).toBe(leadTransmission(80, 3));
    expect(isOutsideLeadRange(40, 0.5)).toBe(true);
    expect(isOutsideLeadRange(80, 4)).toBe(true);
    expect(isOutsideLeadRange(80, 0.5)).toBe(false);
  });
});
