import { quantile } from 'simple-statistics';
import { plausibleFieldAreaCm2 } from '../../shared/dosimetry/field-plausibility';
import {
  arithmetic,
  found,
  isOutside,
  notChecked,
  ofPlane,
  passed,
  practice,
  write,
  writeBounds,
  writePercent,
  type CheckFacts,
  type CheckRule,
} from './check-rule';

const meanFieldArea: CheckRule = {
  code: 'mean-field-area',
  name: 'Mean field area',
  looksAt: 'P KA over K a,r of each plane: the mean field area at the reference point.',
  remedy:
    'One of the two is probably in another unit: compare with the machine’s screen, and correct the total.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  ...plausibleFieldAreaCm2,
  unit: 'cm²',
  check({ planes }, bounds) {
    const areas = planes.flatMap((plane) => {
      const { kermaAreaProductGyCm2: product, referenceAirKermaGy: kerma } = plane.displayed;
      return product === null || kerma === null || kerma <= 0 ? [] : [{ plane, areaCm2: product / kerma }];
    });
    if (areas.length === 0) return notChecked('P KA or K a,r is missing: no mean field area.');
    const odd = areas.find(({ areaCm2 }) => isOutside(areaCm2, bounds));
    return odd
      ? found(
          `Mean field area at the reference point${ofPlane(odd.plane, planes)} ${write(odd.areaCm2)} cm²: a unit slip? Outside ${writeBounds(bounds)} cm²`,
          odd.areaCm2,
        )
      : passed(
          `Mean field area at the reference point ${areas.map(({ areaCm2 }) => write(areaCm2)).join(' and ')} cm²`,
        );
  },
};

/** Fewer of a kind say little about it. */
const fewestOfType = 20;

const fieldAreaForType: CheckRule = {
  code: 'field-area-for-type',
  name: 'Mean field area for its type',
  looksAt: `Mean field area against the median of the newest procedures of the same type, from ${fewestOfType} of them on.`,
  remedy: 'A unit slip, or recorded under the wrong type: look at both.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: 5,
  unit: 'times',
  check({ together, context: { typeFieldArea } }, { high }) {
    const [product, kerma] = [together.kermaAreaProduct.displayed, together.referenceAirKerma.displayed];
    if (product === null || kerma === null || kerma <= 0 || product <= 0)
      return notChecked('P KA or K a,r is missing: no mean field area.');
    if (typeFieldArea === null || typeFieldArea.count < fewestOfType)
      return notChecked('Fewer than 20 other procedures of its type.');
    const areaCm2 = product / kerma;
    const ratio = areaCm2 / typeFieldArea.medianCm2;
    const off = Math.max(ratio, 1 / ratio);
    return high !== null && off > high
      ? found(
          `Mean field area ${write(areaCm2)} cm² is ${ratio > 1 ? `${write(off)} times` : `1/${write(off)} of`} the median of its type, ${write(typeFieldArea.medianCm2)} cm²: a unit slip?`,
          areaCm2,
        )
      : passed(`Mean field area fits its type’s median of ${write(typeFieldArea.medianCm2)} cm²`);
  },
};

/**
 * P KA that an event should have by its field: area at the detector, brought to the reference point by the square of
 * the distances, times K a,r. The median over events of reported over expected; null where no event tells enough.
 */
function medianOfExpected({ input }: CheckFacts): number | null {
  const ratios = input.events.flatMap((event) => {
    const { kermaAreaProductGyCm2: product, referenceAirKermaGy: kermaGy, fieldAreaCm2 } = event;
    const referenceMm = event.sourceToReferencePointMm ?? referenceDistanceMm(event.sourceToIsocenterMm);
    const detectorMm = event.sourceToDetectorMm;
    if (!product || !kermaGy || !fieldAreaCm2 || !referenceMm || !detectorMm) return [];
    const ratio = product / (fieldAreaCm2 * (referenceMm / detectorMm) ** 2 * kermaGy);
    return ratio > 0 ? [ratio] : [];
  });
  return ratios.length === 0 ? null : quantile(ratios, 0.5);
}

/** 15 cm from the isocentre towards the focus (IEC 60601-2-43). */
const referenceDistanceMm = (sourceToIsocenterMm: number | null): number | null =>
  sourceToIsocenterMm === null ? null : sourceToIsocenterMm - 150;

/** From here on it is a unit slip and no longer a question of collimation. */
const unitSlipFactor = 3;
const notTold = 'Events do not tell field area and distances.';

const collimatedArea: CheckRule = {
  code: 'collimated-area',
  name: 'Collimated field',
  looksAt:
    'P KA of the events against field area × K a,r, brought from the detector to the reference point; median over events.',
  remedy: 'Field size or one of the two meters is off: have the machine’s figures measured.',
  source: practice,
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: 30,
  unit: '%',
  check(facts, { high }) {
    const ratio = medianOfExpected(facts);
    if (ratio === null) return notChecked(notTold);
    if (Math.max(ratio, 1 / ratio) > unitSlipFactor)
      return notChecked(
        'Too far off for a question of collimation: see the unit check of the collimated field.',
      );
    const share = Math.abs(ratio - 1);
    return high !== null && share * 100 > high
      ? found(`P KA of the events is ${writePercent(share)} off what field area and K a,r give`, ratio)
      : passed(`P KA of the events fits field area × K a,r within ${writePercent(share)}`);
  },
};

const collimatedAreaUnit: CheckRule = {
  code: 'collimated-area-unit',
  name: 'Unit by the collimated field',
  looksAt: 'The same comparison, for differences so large that only a unit can be wrong.',
  remedy: 'Compare with the machine’s screen, and correct the total that is in another unit.',
  source: arithmetic,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: unitSlipFactor,
  unit: 'times',
  check(facts, { high }) {
    const ratio = medianOfExpected(facts);
    if (ratio === null) return notChecked(notTold);
    return high !== null && Math.max(ratio, 1 / ratio) > high
      ? found(
          `P KA of the events is ${write(ratio)} times what field area and K a,r give: a unit slip?`,
          ratio,
        )
      : passed('Units of P KA and K a,r fit the field area');
  },
};

export const fieldAreaRules: CheckRule[] = [
  meanFieldArea,
  fieldAreaForType,
  collimatedArea,
  collimatedAreaUnit,
];
