import type { ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { effectiveDoseFormulas, defaultEffectiveDoseFormula } from '../../../shared/dosimetry/effective-dose';
import { conversionFactors } from '../../../shared/dosimetry/personal-quantities';
import { defaultScatterModel, scatterModels } from '../../../shared/dosimetry/scatter-air-kerma';
import { paths } from '../../paths';
import { Caution } from '../../ui/caution';
import type { Explanation } from '../../ui/explain-panel';
import { TextLink } from '../../ui/text-link';
import { quantityWords } from './exposure-words';

const { hp10, hp3, hp10BehindLead } = conversionFactors;
const formula = effectiveDoseFormulas[defaultEffectiveDoseFormula];

const steps: Record<ExposureQuantity, { name: string; value: string; origin: string }> = {
  collarHp10USv: {
    name: 'At the collar',
    value: `Hp(10) = ${hp10.factor} · K, times the screens`,
    origin: 'over the garment: what a collar badge would read',
  },
  eyeHp3USv: {
    name: 'At the eye',
    value: `Hp(3) = ${hp3.factor} · K, times glasses and screens`,
    origin: 'where they were recorded as used',
  },
  underGarmentHp10USv: {
    name: 'Under the garment',
    value: `Hp(10) = ${hp10BehindLead.factor} · T · K at the waist`,
    origin: 'T: transmission of the garment’s lead at the event’s kVp (NCRP 147)',
  },
  effectiveDoseUSv: {
    name: 'Effective dose',
    value: formula.name,
    origin: formula.caution ?? formula.source,
  },
};

/** How the figures of this page come about, for the panel. */
export function explainExposure(
  quantity: ExposureQuantity,
  { method, methodVersion }: { method: string; methodVersion: string },
): Explanation {
  const model = scatterModels[defaultScatterModel];
  return {
    title: `How ${quantityWords[quantity].phrase} is calculated`,
    formula: 'K = Σ S(θ, kVp) · KAP / d², over all irradiation events',
    inputs: [
      {
        name: 'KAP and kVp',
        value: 'of each event',
        origin: 'from the dose report; times the physicist’s factor where one holds',
      },
      {
        name: 'θ, the scatter angle',
        value: 'of each event and person',
        origin: 'from the C-arm’s angles and where the person stood',
      },
      { name: 'd, the distance', value: 'isocentre to body point', origin: 'from the place and the stature' },
      { name: 'S, scatter per KAP at 1 m', value: model.name, origin: model.source },
      steps[quantity],
    ],
    source: `${model.source}; NCRP 147 for lead; all constants on the page Methods`,
    interval:
      'About 95 %, skewed: KAP display, scatter model, place, screens and garment, each drawn once for a procedure. They are shared by a person’s procedures, so in a month the ends add up like the figures themselves.',
    method,
    methodVersion,
    notes: (
      <>
        <p>
          Not in it: hands, scatter from walls and tube housing, moving between events.{' '}
          <TextLink to={paths.methods}>Methods</TextLink> says what biases are known.
        </p>
        <Caution of="estimate-not-record" />
        <Caution of="scatter-interval" />
      </>
    ),
  };
}
