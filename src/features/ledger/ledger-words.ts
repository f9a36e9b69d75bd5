import {
  periodNames,
  periods,
  type ProcedureFilter,
  type ProcedureRow,
} from '../../../shared/contract/procedure';
import { missingPartNames } from '../../../shared/contract/record';
import type { Choice } from '../../ui/select-field';

export const kindChoices: Choice[] = [
  { value: 'fluoroscopy', label: 'Procedures' },
  { value: 'radiography', label: 'Radiography studies' },
  { value: 'quality-control', label: 'Test exposures' },
  { value: 'withdrawn', label: 'Withdrawn procedures' },
];

export const periodChoices: Choice[] = periods.map((period) => ({
  value: period,
  label: periodNames[period],
}));

export const attentionChoices: Choice[] = [
  { value: 'any', label: 'flagged or not' },
  { value: 'flagged', label: 'with anything flagged' },
  { value: 'act', label: 'flagged act' },
  { value: 'notify', label: 'flagged notify' },
  { value: 'note', label: 'flagged note' },
];

export const recordChoices: Choice[] = [
  { value: 'any', label: 'complete or not' },
  { value: 'incomplete', label: 'still incomplete' },
  { value: 'complete', label: 'complete' },
];

/** An order as one choice: what it sorts by and which way. */
export const orderChoices: (Choice & Pick<ProcedureFilter, 'sort' | 'order'>)[] = [
  { value: 'newest', label: 'newest first', sort: 'started', order: 'descending' },
  { value: 'oldest', label: 'oldest first', sort: 'started', order: 'ascending' },
  { value: 'kerma', label: 'highest air kerma first', sort: 'reference-air-kerma', order: 'descending' },
  {
    value: 'area-product',
    label: 'highest area product first',
    sort: 'kerma-area-product',
    order: 'descending',
  },
  { value: 'time', label: 'longest fluoroscopy first', sort: 'fluoroscopy-time', order: 'descending' },
  { value: 'kvp', label: 'highest kVp first', sort: 'kvp', order: 'descending' },
];

/** The choice that stands for an order; one reached by a column's head has none of its own. */
export const findOrder = ({ sort, order }: Pick<ProcedureFilter, 'sort' | 'order'>): string =>
  orderChoices.find((choice) => choice.sort === sort && choice.order === order)?.value ??
  'as the column says';

/** "needs operator, staff in the room", or that nothing is outstanding. */
export function describeRecordState({
  recordState,
  missing,
}: Pick<ProcedureRow, 'recordState' | 'missing'>): string {
  if (recordState === 'complete') return 'complete';
  return missing.length === 0
    ? 'incomplete'
    : `needs ${missing.map((part) => missingPartNames[part]).join(', ')}`;
}

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** The line under the filter sentence. */
export function describeCount({ total, incomplete }: { total: number; incomplete: number }): string {
  const found = `${counted(total, 'procedure', 'procedures')}.`;
  if (incomplete === 0) return found;
  return `${found} ${counted(incomplete, 'lacks', 'lack')} details.`;
}
