import { describe, expect, it } from 'vitest';
import { effectiveDose, type EffectiveDoseFormulaId } from '../../shared/dosimetry/effective-dose';
import {
  leadTransmission,
  primaryLeadTransmission,
  secondaryLeadTransmission,
} from '../../shared/dosimetry/lead-transmission';
import { hp10BehindLeadUSv, hp10USv, hp3USv } from '../../shared/dosimetry/personal-quantities';
import { scatterPerKap } from '../../shared/dosimetry/scatter-air-kerma';
import { numberIn, readTable } from './read-table';

const formulas: [column: string, formula: EffectiveDoseFormulaId, hasThyroidCollar: boolean][] = [
  ['E_NCRP122_0.5Hw+0.025Hn_uSv', 'ncrp122-two-badges', true],
  ['E_collar_over_21_uSv', 'ncrp122-collar', true],
  ['HE_collar_over_5.6_uSv', 'webster-collar', true],
  ['E_Niklason_thyroid_uSv', 'niklason-simple', true],
  ['E_Niklason_no_thyroid_uSv', 'niklason-simple', false],
];

/** Within the five digits the table prints. */
function expectClose(actual: number, expected: number) {
  expect(actual / expected).toBeCloseTo(1, 3.7);
}

// Whole chain, computed apart in another language from Williams 1996, NCRP 147 tables A.1 and C.1,
// ICRU 57 conversion constants and the published effective-dose formulas.
describe('reference events from KAP to effective dose', () => {
  it.each(readTable('scatter-reference-events.csv'))(
    '$kVp kV, $KAP_Gycm2 Gy·cm², $theta_deg°, $distance_m m, $pb_mm mm',
    (row) => {
      const kvp = numberIn(row, 'kVp');
      const leadMm = numberIn(row, 'pb_mm');
      const scatter = scatterPerKap('williams-bir', numberIn(row, 'theta_deg'), kvp).scatterPerKapUGyPerGyCm2;
      expectClose(scatter, numberIn(row, 'S_williams_uGy_per_Gycm2'));
      const airKermaUGy = (scatter * numberIn(row, 'KAP_Gycm2')) / numberIn(row, 'distance_m') ** 2;
      expectClose(airKermaUGy, numberIn(row, 'Ka_unshielded_uGy'));

      expectClose(primaryLeadTransmission(kvp, leadMm), numberIn(row, 'T_A1'));
      expectClose(secondaryLeadTransmission(kvp, leadMm), numberIn(row, 'T_C1'));
      const transmission = leadTransmission(kvp, leadMm);
      expectClose(transmission, numberIn(row, 'T_used_max'));
      expectClose(airKermaUGy * transmission, numberIn(row, 'Ka_behind_uGy'));

      const collar = hp10USv(airKermaUGy);
      const underGarment = hp10BehindLeadUSv(airKermaUGy * transmission);
      expectClose(collar, numberIn(row, 'Hp10_collar_unshielded_uSv'));
      expectClose(hp3USv(airKermaUGy), numberIn(row, 'Hp3_eye_unshielded_uSv'));
      expectClose(underGarment, numberIn(row, 'Hp10_under_garment_uSv'));
      for (const [column, formula, hasThyroidCollar] of formulas) {
        expectClose(effectiveDose(formula, underGarment, collar, hasThyroidCollar), numberIn(row, column));
      }
    },
  );
});
