import type { Screen } from './screen-factors';
import { noSpread, type Spread } from './spread';

/**
 * Everything uncertain that goes into an estimate. Each is systematic: drawn once per procedure and
 * person and shared by all its events, so that splitting an event changes nothing.
 */
export const estimateInputs = [
  'kap-display',
  'kap-calibration',
  'scatter-model',
  'positioner-angles',
  'tube-voltage',
  'position',
  'garment-transmission',
  'lead-equivalence',
  'garment-condition',
  'lead-free-material',
  'ceiling-screen',
  'table-skirt',
  'mobile-screen',
  'glasses',
  'quantity-conversion',
  'effective-dose-formula',
] as const;

export type EstimateInput = (typeof estimateInputs)[number];

export const inputIndex = Object.fromEntries(estimateInputs.map((input, index) => [input, index])) as Record<
  EstimateInput,
  number
>;

/** Plain words for each input, for pages and print. */
export const inputNames: Record<EstimateInput, string> = {
  'kap-display': 'displayed KAP, not calibrated',
  'kap-calibration': 'calibrated KAP',
  'scatter-model': 'scatter model',
  'positioner-angles': 'C-arm angles not known',
  'tube-voltage': 'kVp not known',
  position: 'where the person stood',
  'garment-transmission': 'garment transmission',
  'lead-equivalence': 'labelled, not measured lead',
  'garment-condition': 'garment condition not confirmed',
  'lead-free-material': 'lead-free material',
  'ceiling-screen': 'ceiling screen',
  'table-skirt': 'table skirt',
  'mobile-screen': 'mobile screen',
  glasses: 'glasses',
  'quantity-conversion': 'conversion of air kerma',
  'effective-dose-formula': 'effective-dose formula',
};

/** Displayed KAP may differ by ±35 % of the true one, so true over displayed is 1/1.35 to 1/0.65. */
export const kapDisplaySpread: Spread = { low: 1 / 1.35, high: 1 / 0.65 };
/** A dated calibration factor leaves ±10 % (our choice). */
export const kapCalibrationSpread: Spread = { low: 0.9, high: 1.1 };

/** Own transport calculation on phantoms: −78…+40 % below 105°, −45…+20 % from 105° on. */
const forwardScatterSpread: Spread = { low: 0.22, high: 1.4 };
const backScatterSpread: Spread = { low: 0.55, high: 1.2 };
/** Along the patient's body at 60–100° self-absorption may leave a twentieth. */
const alongBodyLow = 1 / 20;
/** A ray through table top or detector may lose a further 40 %. */
const throughTableOrDetector = 0.6;

/** Spread of the scatter model in one regime (bits: 1 back, 2 along the body, 4 through table). */
export function scatterSpread(regime: number): Spread {
  const base = (regime & 1) !== 0 ? backScatterSpread : forwardScatterSpread;
  const low = (regime & 2) !== 0 ? alongBodyLow : base.low;
  return { low: (regime & 4) !== 0 ? low * throughTableOrDetector : low, high: base.high };
}

/** No angles: ÷4…×3. */
export const missingAnglesSpread: Spread = { low: 1 / 4, high: 3 };

/** kVp either way where none was recorded: the type's median, or the general 80 kV (our choice). */
export const typicalKvpSpreadKv = 12;
export const defaultKvpSpreadKv = 20;

/** A preset place: ÷1.5…×1.5 at the table, ÷2…×2 elsewhere (our choice); none where it was given. */
export const tablePresetSpread: Spread = { low: 1 / 1.5, high: 1.5 };
export const roomPresetSpread: Spread = { low: 1 / 2, high: 2 };

/** Garment transmission by the broad-beam fits: ÷4…×2.5 (own calculation over scatter spectra). */
export const garmentTransmissionSpread: Spread = { low: 1 / 4, high: 2.5 };
/** A labelled "0.5 mm" has been measured at 0.30–0.39 mm: up to three times the transmission. */
export const labelledLeadSpread: Spread = { low: 1, high: 3 };
/** Lead-free by narrow beam × 1.5, range 1 to 2. */
export const leadFreeSpread: Spread = { low: 1 / 1.5, high: 2 / 1.5 };
/** Condition of the garment: inspected, overdue, unknown (our choice). Failed: no estimate. */
export const conditionSpreads: Record<'A' | 'B' | 'C', Spread> = {
  A: noSpread,
  B: { low: 1, high: 1.5 },
  C: { low: 1, high: 3 },
};

/** The badge formula may be 30 % low; most overestimate at other beams (our choice for the low end). */
export const effectiveDoseFormulaSpread: Spread = { low: 0.7, high: 1 / 0.7 };

/** The input each screen is. */
export const screenInputs: Record<Screen, EstimateInput> = {
  ceilingScreen: 'ceiling-screen',
  tableSkirt: 'table-skirt',
  mobileScreen: 'mobile-screen',
  glasses: 'glasses',
};
