import { regimeCount, regimeOf } from './accumulate-air-kerma';
import { bodyPoints, type BodyPoint } from './body-points';
import { createFactors, type FactorSlot } from './draw-factors';
import { scatterSpread, screenInputs, type EstimateInput } from './estimate-inputs';
import { beamFlags } from './event-beams';
import type { ExposureModel } from './exposure-model';
import { estimatedQuantities } from './exposure-types';
import { defectiveTransmission } from './garment-transmission';
import { conversionFactors } from './personal-quantities';
import { isBehindScreen, limitScreenProduct, screenFactors } from './screen-factors';
import { noSpread, type Spread } from './spread';

/** Values of all quantities in the order of `estimatedQuantities`. */
export type QuantityValues = Float64Array;

export const quantityIndex = Object.fromEntries(
  estimatedQuantities.map((quantity, index) => [quantity, index]),
) as Record<(typeof estimatedQuantities)[number], number>;

/** Parts of an exposure: 0 fluoroscopy, 1 acquisition. */
export type Part = 0 | 1;

type RelativeRange = { factor: number; low: number; high: number };
const spreadOf = ({ factor, low, high }: RelativeRange): Spread => ({
  low: low / factor,
  high: high / factor,
});

/** Collects the slots of an evaluation; each `add` answers where its factor will stand. */
function collectSlots() {
  const slots: FactorSlot[] = [];
  const add = (input: EstimateInput, spread: Spread | undefined) =>
    slots.push({ input, spread: spread ?? noSpread }) - 1;
  return { slots, add };
}

/**
 * The function that gives all quantities of one exposure (or one part of it) for inputs standing z
 * standard deviations off their nominal value, z in the order of `estimateInputs`. All z = 0 is the
 * deterministic estimate. Quantities that cannot be estimated come out as NaN.
 */
export function createEvaluator(model: ExposureModel, part?: Part) {
  const { slots, add } = collectSlots();
  const { spreads, defectAreaFraction, effectiveDoseWeights, protection } = model;
  const kapDisplay = add('kap-display', spreads['kap-display']);
  const kapCalibration = add('kap-calibration', spreads['kap-calibration']);
  const angles = add('positioner-angles', spreads['positioner-angles']);
  const kvp = add('tube-voltage', spreads['tube-voltage']);
  const kvpTransmission = add('tube-voltage', model.kvpTransmissionSpread);
  const places = model.positionSpreads.map((spread) => add('position', spread));
  const regimes = Array.from({ length: regimeCount }, (_, regime) =>
    add('scatter-model', scatterSpread(regime)),
  );
  const garment = (
    ['garment-transmission', 'lead-equivalence', 'garment-condition', 'lead-free-material'] as const
  ).map((input) => add(input, spreads[input]));
  const hp10 = add('quantity-conversion', spreadOf(conversionFactors.hp10));
  const hp3 = add('quantity-conversion', spreadOf(conversionFactors.hp3));
  const behindLead = add('quantity-conversion', spreadOf(conversionFactors.hp10BehindLead));
  const unprotected = add('quantity-conversion', spreadOf(conversionFactors.effectiveUnprotected));
  const formula = add('effective-dose-formula', spreads['effective-dose-formula']);
  const screenSlots = model.screens.map((screen) => ({
    screen,
    factor: screenFactors[screen].factor,
    slot: add(screenInputs[screen], spreadOf(screenFactors[screen])),
  }));

  const fillFactors = createFactors(slots);
  const factors = new Float64Array(slots.length);
  const f = (slot: number) => factors[slot] as number;

  const sums = model.sums
    .filter(({ errorClass }) => part === undefined || (errorClass & beamFlags.acquisition) === part)
    .map(({ point, errorClass, airKermaUGy, transmittedUGy }) => ({
      point: bodyPoints.indexOf(point),
      isWaist: point === 'waist',
      airKermaUGy,
      soundTransmission: transmittedUGy / airKermaUGy,
      kap: (errorClass & beamFlags.calibrated) !== 0 ? kapCalibration : kapDisplay,
      isAngleMissing: (errorClass & beamFlags.anglesMissing) !== 0,
      isKvpMissing: (errorClass & beamFlags.kvpMissing) !== 0,
      place: places[errorClass & beamFlags.acquisition] as number,
      regime: regimes[regimeOf(errorClass)] as number,
    }));
  const airKerma = new Float64Array(bodyPoints.length);
  const pointIndex = (point: BodyPoint) => bodyPoints.indexOf(point);
  const [eye, collar, chest, waist, lowerLeg] = [
    pointIndex('eye'),
    pointIndex('collar'),
    pointIndex('chest'),
    pointIndex('waist'),
    pointIndex('lowerLeg'),
  ];
  const screensAt = bodyPoints.map((point) =>
    screenSlots.filter(({ screen }) => isBehindScreen(screen, point, model.statureM)),
  );
  const behindScreens = (point: number) => {
    let product = 1;
    for (const { factor, slot } of screensAt[point] as (typeof screensAt)[number])
      product *= factor * f(slot);
    return limitScreenProduct(product);
  };
  const conversion = {
    hp10: conversionFactors.hp10.factor,
    hp3: conversionFactors.hp3.factor,
    behindLead: conversionFactors.hp10BehindLead.factor,
    unprotected: conversionFactors.effectiveUnprotected.factor,
  };
  const at = { ...quantityIndex };

  return function evaluate(z: Float64Array, out: QuantityValues): void {
    fillFactors(z, factors);
    const garmentFactor = garment.reduce((product, slot) => product * f(slot), 1);
    airKerma.fill(0);
    let transmitted = 0;
    for (const sum of sums) {
      const value =
        sum.airKermaUGy *
        f(sum.kap) *
        (sum.isAngleMissing ? f(angles) : 1) *
        (sum.isKvpMissing ? f(kvp) : 1) *
        f(sum.place) *
        f(sum.regime);
      airKerma[sum.point] = (airKerma[sum.point] as number) + value;
      if (sum.isWaist) {
        const sound = sum.soundTransmission * garmentFactor * (sum.isKvpMissing ? f(kvpTransmission) : 1);
        transmitted += value * defectiveTransmission(Math.min(1, sound), defectAreaFraction);
      }
    }
    const atEye = airKerma[eye] as number;
    const atCollar = airKerma[collar] as number;
    const atChest = airKerma[chest] as number;
    const atLowerLeg = airKerma[lowerLeg] as number;
    const collarHp10 = conversion.hp10 * f(hp10) * atCollar * behindScreens(collar);
    const underGarment = conversion.behindLead * f(behindLead) * transmitted * behindScreens(waist);

    out[at.eyeAirKermaUGy] = atEye;
    out[at.collarAirKermaUGy] = atCollar;
    out[at.chestAirKermaUGy] = atChest;
    out[at.waistAirKermaUGy] = airKerma[waist] as number;
    out[at.lowerLegAirKermaUGy] = atLowerLeg;
    out[at.collarHp10USv] = collarHp10;
    out[at.eyeHp3USv] = conversion.hp3 * f(hp3) * atEye * behindScreens(eye);
    out[at.lowerLegHp007USv] = conversion.hp3 * f(hp3) * atLowerLeg * behindScreens(lowerLeg);
    out[at.underGarmentHp10USv] = protection === 'garment' ? underGarment : Number.NaN;
    out[at.effectiveDoseUSv] = Number.NaN;
    if (protection === 'garment') {
      const { underGarment: u, collar: c } = effectiveDoseWeights;
      out[at.effectiveDoseUSv] = (u * underGarment + c * collarHp10) * f(formula);
    } else if (protection === 'unprotected') {
      out[at.effectiveDoseUSv] = conversion.unprotected * f(unprotected) * atChest * behindScreens(chest);
    }
  };
}
