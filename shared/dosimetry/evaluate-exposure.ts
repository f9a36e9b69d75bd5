import { regimeCount, regimeOf } from './accumulate-air-kerma';
import { bodyPoints } from './body-points';
import { inputIndex, scatterSpread, screenInputs, type EstimateInput } from './estimate-inputs';
import { beamFlags } from './event-beams';
import type { ExposureModel } from './exposure-model';
import { estimatedQuantities } from './exposure-types';
import { defectiveTransmission } from './garment-transmission';
import { conversionFactors } from './personal-quantities';
import { isBehindScreen, screenFactors, screenProductFloor } from './screen-factors';
import { factorAt, noSpread, type Spread } from './spread';

/** Values of all quantities in the order of `estimatedQuantities`. */
export type QuantityValues = Float64Array;

export const quantityIndex = Object.fromEntries(
  estimatedQuantities.map((quantity, index) => [quantity, index]),
) as Record<(typeof estimatedQuantities)[number], number>;

const scatterSpreads = Array.from({ length: regimeCount }, (_, regime) => scatterSpread(regime));
const [eye, collar, chest, waist, lowerLeg] = (['eye', 'collar', 'chest', 'waist', 'lowerLeg'] as const).map(
  (point) => bodyPoints.indexOf(point),
) as [number, number, number, number, number];

function conversionSpread({ factor, low, high }: { factor: number; low: number; high: number }): Spread {
  return { low: low / factor, high: high / factor };
}
const hp10Spread = conversionSpread(conversionFactors.hp10);
const hp3Spread = conversionSpread(conversionFactors.hp3);
const behindLeadSpread = conversionSpread(conversionFactors.hp10BehindLead);
const unprotectedSpread = conversionSpread(conversionFactors.effectiveUnprotected);

/** Parts of an exposure: 0 fluoroscopy, 1 acquisition; left out: both together. */
export type Part = 0 | 1;

/**
 * The function that gives all quantities of one exposure for inputs standing z standard deviations
 * off their nominal value. All z = 0 is the deterministic estimate. Quantities that cannot be
 * estimated come out as NaN.
 */
export function createEvaluator(model: ExposureModel, part?: Part) {
  const sums = model.sums.filter(
    ({ errorClass }) => part === undefined || (errorClass & beamFlags.acquisition) === part,
  );
  const pointOf = Uint8Array.from(sums, ({ point }) => bodyPoints.indexOf(point));
  const screensAt = bodyPoints.map((point) =>
    model.screens.filter((screen) => isBehindScreen(screen, point, model.statureM)),
  );
  const airKerma = new Float64Array(bodyPoints.length);
  const regimeFactors = new Float64Array(regimeCount);
  const defects = model.defectAreaFraction;
  const weights = model.effectiveDoseWeights;

  return function evaluate(z: Float64Array, out: QuantityValues): void {
    const zOf = (input: EstimateInput) => z[inputIndex[input]] ?? 0;
    const factorOf = (input: EstimateInput) => factorAt(model.spreads[input] ?? noSpread, zOf(input));

    const displayed = factorOf('kap-display');
    const calibrated = factorOf('kap-calibration');
    const angles = factorOf('positioner-angles');
    const kvp = factorOf('tube-voltage');
    const kvpTransmission = factorAt(model.kvpTransmissionSpread, zOf('tube-voltage'));
    const fluoroscopyPlace = factorAt(model.positionSpreads[0], zOf('position'));
    const acquisitionPlace = factorAt(model.positionSpreads[1], zOf('position'));
    for (let regime = 0; regime < regimeCount; regime += 1) {
      regimeFactors[regime] = factorAt(scatterSpreads[regime] ?? noSpread, zOf('scatter-model'));
    }
    const garment =
      factorOf('garment-transmission') *
      factorOf('lead-equivalence') *
      factorOf('garment-condition') *
      factorOf('lead-free-material');

    airKerma.fill(0);
    let transmitted = 0;
    for (let index = 0; index < sums.length; index += 1) {
      const { errorClass, airKermaUGy, transmittedUGy } = sums[index] as (typeof sums)[number];
      const point = pointOf[index] ?? 0;
      const isKvpMissing = (errorClass & beamFlags.kvpMissing) !== 0;
      const factor =
        ((errorClass & beamFlags.calibrated) !== 0 ? calibrated : displayed) *
        ((errorClass & beamFlags.anglesMissing) !== 0 ? angles : 1) *
        (isKvpMissing ? kvp : 1) *
        ((errorClass & beamFlags.acquisition) !== 0 ? acquisitionPlace : fluoroscopyPlace) *
        (regimeFactors[regimeOf(errorClass)] ?? 1);
      airKerma[point] = (airKerma[point] ?? 0) + factor * airKermaUGy;
      if (point === waist) {
        const sound = (transmittedUGy / airKermaUGy) * garment * (isKvpMissing ? kvpTransmission : 1);
        transmitted += factor * airKermaUGy * defectiveTransmission(Math.min(1, sound), defects);
      }
    }

    const at = (point: number) => airKerma[point] ?? 0;
    const behindScreens = (point: number) => {
      let product = 1;
      for (const screen of screensAt[point] ?? []) {
        const { factor, low, high } = screenFactors[screen];
        const spread = { low: low / factor, high: high / factor };
        product *= factor * factorAt(spread, zOf(screenInputs[screen]));
      }
      return Math.max(screenProductFloor, product);
    };
    const conversion = (spread: Spread) => factorAt(spread, zOf('quantity-conversion'));
    const hp3 = conversionFactors.hp3.factor * conversion(hp3Spread);
    const collarHp10 =
      conversionFactors.hp10.factor * conversion(hp10Spread) * at(collar) * behindScreens(collar);
    const underGarment =
      conversionFactors.hp10BehindLead.factor *
      conversion(behindLeadSpread) *
      transmitted *
      behindScreens(waist);

    out[quantityIndex.eyeAirKermaUGy] = at(eye);
    out[quantityIndex.collarAirKermaUGy] = at(collar);
    out[quantityIndex.chestAirKermaUGy] = at(chest);
    out[quantityIndex.waistAirKermaUGy] = at(waist);
    out[quantityIndex.lowerLegAirKermaUGy] = at(lowerLeg);
    out[quantityIndex.collarHp10USv] = collarHp10;
    out[quantityIndex.eyeHp3USv] = hp3 * at(eye) * behindScreens(eye);
    out[quantityIndex.lowerLegHp007USv] = hp3 * at(lowerLeg) * behindScreens(lowerLeg);
    out[quantityIndex.underGarmentHp10USv] = model.protection === 'garment' ? underGarment : Number.NaN;
    out[quantityIndex.effectiveDoseUSv] =
      model.protection === 'garment'
        ? (weights.underGarment * underGarment + weights.collar * collarHp10) *
          factorOf('effective-dose-formula')
        : model.protection === 'unprotected'
          ? conversionFactors.effectiveUnprotected.factor *
            conversion(unprotectedSpread) *
            at(chest) *
            behindScreens(chest)
          : Number.NaN;
  };
}
