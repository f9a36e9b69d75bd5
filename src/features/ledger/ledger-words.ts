import {
  periodNames,
  periods,
  type ProcedureFilter,
  type ProcedureRow,
} from '../../../shared/contract/procedure-row';
import type { Job, PersonChoice } from '../../../shared/contract/person';
import { missingPartNames } from '../../../shared/contract/record';
import { formatInteger } from '../../../shared/units';
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
  { value: 'in-doubt', label: 'with a value in doubt' },
];

export const recordChoices: Choice[] = [
  { value: 'any', label: 'complete or not' },
  { value: 'incomplete', label: 'still incomplete' },
  { value: 'complete', label: 'complete' },
];

type OrderChoice = Choice & Pick<ProcedureFilter, 'sort' | 'order'>;

const bothWays = (sort: ProcedureFilter['sort'], highest: string, lowest: string): OrderChoice[] => [
  { value: `${sort} descending`, label: highest, sort, order: 'descending' },
  { value: `${sort} ascending`, label: lowest, sort, order: 'ascending' },
];

/** An order as one choice: what it sorts by and which way. */
export const orderChoices: OrderChoice[] = [
  ...bothWays('started', 'newest first', 'oldest first'),
  ...bothWays('reference-air-kerma', 'highest air kerma first', 'lowest air kerma first'),
  ...bothWays('kerma-area-product', 'highest area product first', 'lowest area product first'),
  ...bothWays('fluoroscopy-time', 'longest fluoroscopy first', 'shortest fluoroscopy first'),
  ...bothWays('kvp', 'highest kVp first', 'lowest kVp first'),
];

/** The choice that stands for an order. */
export const findOrder = ({ sort, order }: Pick<ProcedureFilter, 'sort' | 'order'>): string =>
  `${sort} ${order}`;

/** Who performs procedures, and can be asked for as operator. */
const operatorJobs: readonly Job[] = [
  'interventional-radiologist',
  'interventional-cardiologist',
  'electrophysiologist',
  'neuro-interventionalist',
  'other-physician',
];

export const listOperators = (people: readonly PersonChoice[]): Choice[] =>
  people.filter(({ job }) => operatorJobs.includes(job)).map(({ id, name }) => ({ value: id, label: name }));

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

/** "7 356 procedures." */
export function describeTotal(total: number, enteredByHand = 0): string {
  const typed = enteredByHand === 0 ? '' : `, ${formatInteger(enteredByHand)} of them entered by hand`;
  return `${formatInteger(total)} ${total === 1 ? 'procedure' : 'procedures'}${typed}.`;
}

/** Where the start of a procedure comes from, where no event tells it. */
export function describeTimeBasis(basis: ProcedureRow['timeBasis'], isManual: boolean): string {
  if (isManual) return 'time as typed';
  return basis === 'study' ? 'time of the study' : 'time of receipt';
}

/** "17 need details"; null when nothing is outstanding. */
export const describeIncomplete = (incomplete: number): string | null =>
  incomplete === 0 ? null : `${formatInteger(incomplete)} ${incomplete === 1 ? 'needs' : 'need'} details`;
