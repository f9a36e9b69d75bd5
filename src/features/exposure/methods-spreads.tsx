import {
  conditionSpreads,
  defaultKvpSpreadKv,
  effectiveDoseFormulaSpread,
  garmentTransmissionSpread,
  inputNames,
  kapCalibrationSpread,
  kapDisplaySpread,
  labelledLeadSpread,
  leadFreeSpread,
  missingAnglesSpread,
  roomPresetSpread,
  scatterSpread,
  tablePresetSpread,
  typicalKvpSpreadKv,
} from '../../../shared/dosimetry/estimate-inputs';
import type { Spread } from '../../../shared/dosimetry/spread';
import { formatDecimals } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import { Section } from '../../ui/margin-note';

/** Bits of a scatter regime. */
const [back, alongBody, throughTable] = [1, 2, 4];

const rows: { name: string; when: string; spread: Spread }[] = [
  { name: inputNames['kap-display'], when: 'no factor of the physicist holds', spread: kapDisplaySpread },
  { name: inputNames['kap-calibration'], when: 'a dated factor holds', spread: kapCalibrationSpread },
  { name: inputNames['scatter-model'], when: 'below 105°', spread: scatterSpread(0) },
  { name: inputNames['scatter-model'], when: 'from 105° on', spread: scatterSpread(back) },
  {
    name: inputNames['scatter-model'],
    when: 'within 30° of the patient’s long axis, 60–100°',
    spread: scatterSpread(alongBody),
  },
  {
    name: inputNames['scatter-model'],
    when: 'through table or detector, below 105°',
    spread: scatterSpread(throughTable),
  },
  {
    name: inputNames['positioner-angles'],
    when: 'taken as upright; plane B lateral',
    spread: missingAnglesSpread,
  },
  { name: inputNames.position, when: 'a usual place at the table', spread: tablePresetSpread },
  { name: inputNames.position, when: 'a usual place elsewhere', spread: roomPresetSpread },
  { name: inputNames['garment-transmission'], when: 'a garment was worn', spread: garmentTransmissionSpread },
  {
    name: inputNames['lead-equivalence'],
    when: 'the label says more than has been measured',
    spread: labelledLeadSpread,
  },
  {
    name: inputNames['lead-free-material'],
    when: 'known by narrow beam only',
    spread: leadFreeSpread,
  },
  { name: inputNames['garment-condition'], when: 'inspection overdue', spread: conditionSpreads.B },
  { name: inputNames['garment-condition'], when: 'condition unknown', spread: conditionSpreads.C },
  {
    name: inputNames['effective-dose-formula'],
    when: 'with every badge formula',
    spread: effectiveDoseFormulaSpread,
  },
];

const times = (factor: number): string => (factor === 1 ? '1' : formatDecimals(factor, factor < 0.1 ? 3 : 2));

/** Everything that makes the interval, from the same table that the estimate uses. */
export const MethodsSpreads = () => (
  <Section title="What the interval is made of" note="true value over the figure shown, about 95 %">
    <DataTable
      caption="Uncertain inputs with their ranges"
      rows={rows}
      rowKey={({ name, when }) => name + when}
      hasStickyHead={false}
      columns={[
        { key: 'name', head: 'Input', phone: 'title', cell: ({ name }) => name },
        { key: 'when', head: 'When', cell: ({ when }) => when },
        {
          key: 'low',
          head: 'Low end',
          unit: 'factor',
          align: 'end',
          cell: ({ spread }) => times(spread.low),
        },
        {
          key: 'high',
          head: 'High end',
          unit: 'factor',
          align: 'end',
          cell: ({ spread }) => times(spread.high),
        },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      Screens and conversions bring the ranges of their own tables. A missing kVp is taken from the procedure
      type (± {typicalKvpSpreadKv} kV), else as 80 kV (± {defaultKvpSpreadKv} kV). The figure shown is the
      plain calculation, which anyone can repeat by hand; the interval around it is skewed. Every input is
      systematic: drawn once for a procedure and person, shared by all events and by the months.
    </p>
  </Section>
);
