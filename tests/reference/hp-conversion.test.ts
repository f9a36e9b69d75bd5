import { expect, it } from 'vitest';
import { conversionFactors } from '../../shared/dosimetry/personal-quantities';
import { numberIn, readTable } from './read-table';

const rows = readTable('hp-conversion.csv');

function interpolate(column: string, energyKeV: number): number {
  const upper = rows.findIndex((row) => numberIn(row, 'E_keV') >= energyKeV);
  const [a, b] = [rows[upper - 1] ?? {}, rows[upper] ?? {}];
  const share = (energyKeV - numberIn(a, 'E_keV')) / (numberIn(b, 'E_keV') - numberIn(a, 'E_keV'));
  return numberIn(a, column) + share * (numberIn(b, column) - numberIn(a, column));
}

// ICRU 57 / ICRP 74 table A.24, slab, 0° (from memory; our transport calculation agrees within 1.3 %).
it.each(rows.filter((row) => row.ICRU57_Hp10_slab_from_memory !== ''))(
  'has a calculated Hp(10) coefficient within 1.5 % of ICRU 57 at $E_keV keV',
  (row) => {
    const ratio = numberIn(row, 'slab_Hp10_mc') / numberIn(row, 'ICRU57_Hp10_slab_from_memory');
    expect(Math.abs(ratio - 1)).toBeLessThan(0.015);
  },
);

// Mean energy of scatter at 90–135° from 60–120 kVp: about 36–53 keV (own transport calculation);
// behind 0.25–0.5 mm lead the spectrum is harder, about 50–80 keV.
it.each([
  ['hp10', 'slab_Hp10_mc', 36, 53],
  ['hp3', 'cyl_Hp3_mc', 36, 53],
  ['hp3', 'slab_Hp0.07_mc', 36, 53],
  ['hp10BehindLead', 'slab_Hp10_mc', 50, 80],
] as const)(
  'takes a constant %s inside the coefficients %s of the scatter',
  (quantity, column, lowKeV, highKeV) => {
    const { factor } = conversionFactors[quantity];
    expect(factor).toBeGreaterThan(interpolate(column, lowKeV));
    expect(factor).toBeLessThan(interpolate(column, highKeV));
  },
);

it('keeps every constant inside its own range', () => {
  for (const { factor, low, high } of Object.values(conversionFactors)) {
    expect(factor).toBeGreaterThan(low);
    expect(factor).toBeLessThan(high);
  }
});
