import { screenFactors, screenProductFloor, type Screen } from '../../../shared/dosimetry/screen-factors';
import { conversionFactors } from '../../../shared/dosimetry/personal-quantities';
import {
  defaultEffectiveDoseFormula,
  effectiveDoseFormulas,
  type EffectiveDoseFormulaId,
} from '../../../shared/dosimetry/effective-dose';
import { DataTable } from '../../ui/data-table';
import { Section } from '../../ui/margin-note';

const screenNames: Record<Screen, { name: string; protects: string }> = {
  ceilingScreen: { name: 'Ceiling screen', protects: 'eye and collar' },
  tableSkirt: { name: 'Table skirt', protects: 'lower leg, and the waist where it is below the table top' },
  mobileScreen: { name: 'Mobile screen', protects: 'the whole person' },
  glasses: { name: 'Lead glasses', protects: 'the eye' },
};
const conversions: { key: keyof typeof conversionFactors; name: string; from: string }[] = [
  { key: 'hp10', name: 'Hp(10) over the garment', from: 'air kerma at the collar' },
  { key: 'hp3', name: 'Hp(3) and Hp(0.07)', from: 'air kerma at the eye or the skin' },
  {
    key: 'hp10BehindLead',
    name: 'Hp(10) behind 0.25–0.5 mm lead',
    from: 'air kerma that passed the garment',
  },
  { key: 'effectiveUnprotected', name: 'Effective dose without a garment', from: 'air kerma at the trunk' },
];
const formulas = Object.entries(effectiveDoseFormulas) as [
  EffectiveDoseFormulaId,
  (typeof effectiveDoseFormulas)[EffectiveDoseFormulaId],
][];

export const MethodsScreens = () => (
  <Section title="Screens and glasses" note="share of the scatter that passes, in practice">
    <DataTable
      caption="Transmission factors of screens and glasses"
      rows={Object.entries(screenFactors) as [Screen, (typeof screenFactors)[Screen]][]}
      rowKey={([screen]) => screen}
      hasStickyHead={false}
      columns={[
        { key: 'name', head: 'Screen', phone: 'title', cell: ([screen]) => screenNames[screen].name },
        { key: 'protects', head: 'Stands before', cell: ([screen]) => screenNames[screen].protects },
        { key: 'factor', head: 'Factor', align: 'end', cell: ([, { factor }]) => factor },
        { key: 'range', head: 'Range', align: 'end', cell: ([, { low, high }]) => `${low}–${high}` },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      Our choices, leaning on published clinical averages (from memory, to be confirmed by your physicist).
      Together never below {screenProductFloor}: walls and the wearer’s own body scatter on.
    </p>
  </Section>
);

export const MethodsQuantities = () => (
  <Section title="From air kerma to dose quantities" note="Sv/Gy, for scatter of 60–120 kVp">
    <DataTable
      caption="Conversion factors"
      rows={conversions}
      rowKey={({ key }) => key}
      hasStickyHead={false}
      columns={[
        { key: 'name', head: 'Quantity', phone: 'title', cell: ({ name }) => name },
        { key: 'from', head: 'From', cell: ({ from }) => from },
        { key: 'factor', head: 'Factor', align: 'end', cell: ({ key }) => conversionFactors[key].factor },
        {
          key: 'range',
          head: 'Range',
          align: 'end',
          cell: ({ key }) => `${conversionFactors[key].low}–${conversionFactors[key].high}`,
        },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      Own transport calculation with coefficients that agree with ICRU 57 and ICRP 74 within 1.3 % (those from
      memory).
    </p>
    <DataTable
      caption="Formulas for the effective dose from two dosemeters"
      rows={formulas}
      rowKey={([id]) => id}
      hasStickyHead={false}
      columns={[
        {
          key: 'name',
          head: 'Effective dose from collar (Ho, Hn) and waist under the garment (Hu, Hw)',
          phone: 'title',
          cell: ([id, { name }]) => (id === defaultEffectiveDoseFormula ? `${name}, default` : name),
        },
        { key: 'source', head: 'Source', phone: 'wide', cell: ([, { source }]) => source },
        { key: 'caution', head: 'Caution', phone: 'wide', cell: ([, { caution }]) => caution },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      Without a garment, or turned away without a back panel, no badge formula applies: E ={' '}
      {conversionFactors.effectiveUnprotected.factor} · K. Where the garment is not known, the value under it
      and E stay empty.
    </p>
  </Section>
);
