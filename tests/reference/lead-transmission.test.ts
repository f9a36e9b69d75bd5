import { describe, expect, it } from 'vitest';
import {
  archerLeadPrimary,
  archerLeadSecondary,
  archerLeadWorkloads,
  type ArcherFit,
} from '../../shared/dosimetry/archer-lead.table-data';
import {
  archerThicknessMm,
  archerTransmission,
  primaryLeadTransmission,
  secondaryLeadTransmission,
} from '../../shared/dosimetry/lead-transmission';
import { numberIn, readTable } from './read-table';

const { primary, secondary } = archerLeadWorkloads;
const workloads: Record<string, ArcherFit> = {
  'B.1 primary workload Fluoroscopy tube (R&F room)': primary.fluoroscopyTube,
  'B.1 primary workload Cardiac angiography': primary.cardiacAngiography,
  'B.1 primary workload Peripheral/neuro angiography': primary.peripheralAngiography,
  'C.1 secondary Fluoroscopy tube (R&F room)': secondary.fluoroscopyTube,
  'C.1 secondary Cardiac angiography': secondary.cardiacAngiography,
  'C.1 secondary Peripheral angiography': secondary.peripheralAngiography,
};

function fitOf(source: string, quality: string): ArcherFit | undefined {
  const table = source.includes('A.1') ? archerLeadPrimary : archerLeadSecondary;
  const kvp = Number.parseInt(quality, 10);
  const row = Number.isNaN(kvp) ? undefined : table.find((candidate) => candidate.kvp === kvp);
  return row ?? workloads[`${source.replace('NCRP147 ', '')} ${quality}`];
}

// NCRP 147 tables A.1, B.1 and C.1 (Simpkin 1995).
describe('broad-beam transmission of lead against NCRP 147', () => {
  const rows = readTable('archer-lead.csv');
  it('covers the three tables', () => expect(rows).toHaveLength(32));

  it.each(rows)('$source, $kVp_or_workload', (row) => {
    const fit = fitOf(row.source ?? '', row.kVp_or_workload ?? '');
    expect(fit).toBeDefined();
    if (!fit) return;
    expect(fit.alphaPerMm).toBe(numberIn(row, 'alpha_mm-1'));
    expect(fit.betaPerMm).toBe(numberIn(row, 'beta_mm-1'));
    expect(fit.gamma).toBe(numberIn(row, 'gamma'));
    for (const mm of ['0.25', '0.35', '0.5', '1.0']) {
      const expected = numberIn(row, `T_${mm}mm`);
      expect(archerTransmission(fit, Number(mm)) / expected).toBeCloseTo(1, 3);
      expect(archerThicknessMm(fit, expected)).toBeCloseTo(Number(mm), 3);
    }
  });
});

describe('worked examples of NCRP 147', () => {
  const at = (rows: typeof archerLeadPrimary, kvp: number) =>
    rows.find((row) => row.kvp === kvp) as ArcherFit;

  // Section 5 of the report: 100 kVp, B = 1.25e-3 needs 1.66 mm.
  it('needs 1.66 mm of lead for a primary transmission of 1.25e-3 at 100 kVp', () => {
    expect(archerThicknessMm(at(archerLeadPrimary, 100), 1.25e-3)).toBeCloseTo(1.66, 2);
  });

  // The report rounds to one decimal: 0.8 mm primary, 0.9 mm secondary for B = 1.4e-2.
  it('needs 0.8 mm (primary) and 0.9 mm (secondary) for 1.4e-2 at 100 kVp', () => {
    expect(archerThicknessMm(at(archerLeadPrimary, 100), 1.4e-2)).toBeCloseTo(0.8, 1);
    expect(archerThicknessMm(at(archerLeadSecondary, 100), 1.4e-2)).toBeCloseTo(0.9, 1);
  });

  // Chest bucky example of the report: 1.66 mm lets 9.3e-4 through (the fit's constants from memory).
  it('lets 9.3e-4 of a chest bucky workload through 1.66 mm', () => {
    expect(archerTransmission(primary.chestBucky, 1.66)).toBeCloseTo(9.3e-4, 5);
  });
});

// NCRP 147: below 100 kVp leakage is negligible, secondary transmission is nearly the primary one.
it.each([50, 70])('has nearly equal primary and secondary transmission at %i kVp', (kvp) => {
  expect(secondaryLeadTransmission(kvp, 0.5) / primaryLeadTransmission(kvp, 0.5)).toBeCloseTo(1, 2);
});
