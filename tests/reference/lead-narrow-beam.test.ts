import { execFileSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { leadDensityGPerCm3 } from '../../shared/dosimetry/attenuation.table-data';
import {
  leadMassAttenuationCm2PerG,
  narrowBeamLeadTransmission,
} from '../../shared/dosimetry/narrow-beam-transmission';
import { numberIn, readTable } from './read-table';

// NIST, Tables of X-Ray Mass Attenuation Coefficients (NISTIR 5632), lead.
describe('mass attenuation of lead against NIST', () => {
  it.each(readTable('nist-lead-attenuation.csv'))('at $energy_keV keV $side_of_edge', (row) => {
    const energyKeV = numberIn(row, 'energy_keV') - (row.side_of_edge === 'below' ? 1e-6 : 0);
    const ratio = leadMassAttenuationCm2PerG(energyKeV) / numberIn(row, 'mass_attenuation_cm2_per_g');
    expect(ratio).toBeCloseTo(1, 4);
  });
});

// Values computed with xraylib 4.0.0 (CS_Total), density 11.35 g/cm³. Between the table's energies
// the interpolation may differ by 2 % in μ.
describe('narrow-beam transmission against xraylib', () => {
  const rows = readTable('lead-narrow-beam.csv').filter((row) => numberIn(row, 'E_keV') <= 150);

  it.each(rows)('interpolates μ at $E_keV keV', (row) => {
    const attenuationPerCm = leadMassAttenuationCm2PerG(numberIn(row, 'E_keV')) * leadDensityGPerCm3;
    expect(Math.abs(attenuationPerCm / numberIn(row, 'mu_Pb_cm-1') - 1)).toBeLessThan(0.02);
  });

  it.each(rows.filter((row) => [40, 50, 60, 80, 88, 100, 150].includes(numberIn(row, 'E_keV'))))(
    'lets the same share through at $E_keV keV',
    (row) => {
      for (const mm of ['0.25', '0.35', '0.5', '1.0']) {
        const ratio =
          narrowBeamLeadTransmission(numberIn(row, 'E_keV'), Number(mm)) / numberIn(row, `T_${mm}mm`);
        expect(Math.abs(ratio - 1)).toBeLessThan(0.01);
      }
    },
  );

  it('agrees with the xraylib installed here', () => {
    const energies = [40, 50, 55, 60, 70, 80, 87.9, 88.1, 100, 120, 150];
    const script = `import json, xraylib; print(json.dumps([xraylib.CS_Total(82, float(e)) for e in ${JSON.stringify(energies)}]))`;
    const output = execFileSync('/usr/bin/python3', ['-c', script]);
    const values = JSON.parse(output.toString()) as number[];
    energies.forEach((energyKeV, index) => {
      const ratio = leadMassAttenuationCm2PerG(energyKeV) / (values[index] ?? Number.NaN);
      expect(Math.abs(ratio - 1)).toBeLessThan(0.02);
    });
  });
});

// A fact of the trade: common practice, no source.
it('stops 99 % at 50 keV and 94 % at 60 keV by 0.5 mm of lead', () => {
  expect(1 - narrowBeamLeadTransmission(50, 0.5)).toBeCloseTo(0.99, 2);
  expect(1 - narrowBeamLeadTransmission(60, 0.5)).toBeCloseTo(0.94, 2);
});
