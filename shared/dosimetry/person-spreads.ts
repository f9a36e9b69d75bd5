import {
  conditionSpreads,
  defaultKvpSpreadKv,
  effectiveDoseFormulaSpread,
  garmentTransmissionSpread,
  kapCalibrationSpread,
  kapDisplaySpread,
  labelledLeadSpread,
  leadFreeSpread,
  missingAnglesSpread,
  roomPresetSpread,
  tablePresetSpread,
  typicalKvpSpreadKv,
  type EstimateInput,
} from './estimate-inputs';
import { assumedKvp } from './event-beams';
import type { ExposureModel } from './exposure-model';
import type { ExposedPerson, ExposureContext, Place } from './exposure-types';
import { garmentTransmission } from './garment-transmission';
import { isUnchangedPreset, type PositionPreset } from './room-positions';
import { scatterPerKap, type ScatterModelId } from './scatter-air-kerma';
import { noSpread, type Spread } from './spread';

const tablePresets: readonly PositionPreset[] = [
  'operator',
  'second-operator',
  'jugular-access',
  'left-chest',
];

function positionSpread(place: Place): Spread {
  if (place.preset === null || !isUnchangedPreset(place)) return noSpread;
  return tablePresets.includes(place.preset) ? tablePresetSpread : roomPresetSpread;
}

/** The spread of a function that rises with kVp, where the kVp itself had to be assumed. */
function kvpSpread(context: ExposureContext, valueAt: (kvp: number) => number): Spread {
  const kvp = assumedKvp(context);
  const widthKv = context.typicalKvp === null ? defaultKvpSpreadKv : typicalKvpSpreadKv;
  const nominal = valueAt(kvp);
  return { low: valueAt(kvp - widthKv) / nominal, high: valueAt(kvp + widthKv) / nominal };
}

/** The spreads of every input that this person, garment and context bring with them. */
export function personSpreads(
  person: ExposedPerson,
  context: ExposureContext,
  scatterModel: ScatterModelId,
  leadMm: number | null,
): Pick<ExposureModel, 'spreads' | 'positionSpreads' | 'kvpTransmissionSpread'> {
  const { garment, evidenceGrade } = person;
  const spreads: Partial<Record<EstimateInput, Spread>> = {
    'kap-display': kapDisplaySpread,
    'kap-calibration': kapCalibrationSpread,
    'positioner-angles': missingAnglesSpread,
    'tube-voltage': kvpSpread(
      context,
      (kvp) => scatterPerKap(scatterModel, 90, kvp).scatterPerKapUGyPerGyCm2,
    ),
    'effective-dose-formula': effectiveDoseFormulaSpread,
  };
  let kvpTransmissionSpread = noSpread;
  if (garment.answer === 'worn' && leadMm !== null) {
    spreads['garment-transmission'] = garmentTransmissionSpread;
    if (!garment.isMeasured) spreads['lead-equivalence'] = labelledLeadSpread;
    if (garment.isLeadFree) spreads['lead-free-material'] = leadFreeSpread;
    if (evidenceGrade !== 'D') spreads['garment-condition'] = conditionSpreads[evidenceGrade];
    const { isLeadFree } = garment;
    kvpTransmissionSpread = kvpSpread(context, (kvp) =>
      garmentTransmission({ kvp, copperMm: null, leadMm, isLeadFree }),
    );
  }
  return {
    spreads,
    positionSpreads: [positionSpread(person.fluoroscopyPlace), positionSpread(person.acquisitionPlace)],
    kvpTransmissionSpread,
  };
}
