import type { StaffExposure } from '../../../shared/contract/staff-exposure';
import { effectiveDoseFormulas, type EffectiveDoseFormulaId } from '../../../shared/dosimetry/effective-dose';
import { inputNames, type EstimateInput } from '../../../shared/dosimetry/estimate-inputs';
import { conversionFactors } from '../../../shared/dosimetry/personal-quantities';
import { scatterModels, type ScatterModelId } from '../../../shared/dosimetry/scatter-air-kerma';
import { formatPercent } from '../../../shared/units';
import { formatDateTime } from '../../lib/clock';
import { Caution } from '../../ui/caution';
import type { Explanation } from '../../ui/explain-panel';
import { QuantitySign } from '../../ui/quantity-sign';
import {
  describeDuty,
  describeProtection,
  evidenceWords,
  exposureQuantities,
  nameExposed,
  writeFigure,
} from './exposure-words';

const nameInput = (input: string): string => inputNames[input as EstimateInput] ?? input;

const findFormula = (id: string) => effectiveDoseFormulas[id as EffectiveDoseFormulaId] ?? null;

const findModel = (id: string) => scatterModels[id as ScatterModelId] ?? null;

const Formula = ({ exposure }: { exposure: StaffExposure }) => (
  <div className="flex flex-col gap-1">
    <p>
      <QuantitySign of="scatterAirKerma" /> = Σ <QuantitySign of="kermaAreaProduct" /> · S(θ, kVp) / d², over
      the irradiation events
    </p>
    <p className="text-sm font-normal">
      S: scatter per kerma–area product at 1 m, by the angle θ from the beam and the event’s kVp; d: distance
      of the collar or the eye from the patient in the beam.
    </p>
    <p>
      <QuantitySign of="hp10" /> = {conversionFactors.hp10.factor} · <QuantitySign of="scatterAirKerma" /> ·
      screens
    </p>
    <p>
      <QuantitySign of="hp3" /> = {conversionFactors.hp3.factor} · <QuantitySign of="scatterAirKerma" /> at
      the eye · screens · glasses
    </p>
    <p>
      <QuantitySign of="effectiveDose" /> ={' '}
      {findFormula(exposure.effectiveDoseFormula)?.name ??
        `${conversionFactors.effectiveUnprotected.factor} · air kerma at the trunk (no garment)`}
    </p>
  </div>
);

const Remarks = ({ exposure }: { exposure: StaffExposure }) => (
  <>
    <div className="text-sm">
      <h3 className="font-semibold">What makes the interval wide</h3>
      <ol>
        {exposure.contributions.slice(0, 6).map(({ input, share }) => (
          <li key={input} className="flex justify-between gap-4 border-b border-rule py-0.5">
            {nameInput(input)} <span>{formatPercent(share)}</span>
          </li>
        ))}
        {exposure.contributions.length === 0 && (
          <li>Nothing uncertain enters: the value is zero or not estimable.</li>
        )}
      </ol>
    </div>
    {exposure.gaps.length + exposure.warnings.length > 0 && (
      <div className="text-sm">
        <h3 className="font-semibold">Taken, left out, not known</h3>
        <ul className="list-disc pl-5">
          {[...exposure.gaps, ...exposure.warnings].map(({ code, detail }) => (
            <li key={code}>{detail}</li>
          ))}
        </ul>
      </div>
    )}
    <Caution of="scatter-interval" />
    <Caution of="garment-condition" values={{ date: exposure.garmentConfirmedOn ?? 'on no known day' }} />
    <Caution of="estimate-not-record" />
  </>
);

/** Everything that one person's figures can say about themselves. */
export function explainExposure(exposure: StaffExposure): Explanation {
  // Stored as the model's key and version: "williams-bir 1996".
  const model = findModel(exposure.scatterModel.split(' ')[0] ?? '');
  const formula = findFormula(exposure.effectiveDoseFormula);
  const share = exposure.fluoroscopyShare;
  return {
    title: `How calculated: ${nameExposed(exposure)}, ${describeDuty(exposure).toLowerCase()}`,
    formula: <Formula exposure={exposure} />,
    inputs: [
      ...exposureQuantities.map((quantity) => ({
        name: quantity.head,
        value: writeFigure(quantity.read(exposure), quantity.unit),
      })),
      { name: 'Worn and between', value: describeProtection(exposure) },
      {
        name: 'Garment condition',
        value: evidenceWords[exposure.evidenceGrade],
        origin: confirmed(exposure),
      },
      {
        name: 'Part from fluoroscopy',
        value: share === null ? 'not known' : formatPercent(share),
        origin: 'of Hp(10) at the collar; the rest from acquisitions',
      },
    ],
    source: [
      model ? `${model.name}; ${model.source}.` : `${exposure.scatterModel}.`,
      formula
        ? ` Effective dose: ${formula.source}.${formula.caution ? ` ${formula.caution}` : ''}`
        : ' Effective dose: air kerma at the trunk, own calculation.',
    ].join(''),
    interval:
      exposure.intervalMethod === 'draws'
        ? 'About 95 %, from 2,000 seeded draws of everything uncertain, each drawn once for the whole procedure.'
        : 'About 95 %, in closed form from the spreads of everything uncertain.',
    method: exposure.method,
    methodVersion: `${exposure.methodVersion}, computed ${formatDateTime(exposure.computedAt)}`,
    notes: <Remarks exposure={exposure} />,
  };
}

const confirmed = (exposure: StaffExposure): string | undefined =>
  exposure.garmentConfirmedOn === null ? undefined : `last inspected ${exposure.garmentConfirmedOn}`;
