import { Sentence } from '../../ui/sentence';
import { SentenceSelect } from '../../ui/sentence-select';
import type { GarmentFilter } from './garment-filter';
import { kindChoices } from './garment-values';

const states = [
  { value: 'in-service', label: 'in service' },
  { value: 'out', label: 'out of service' },
  { value: 'any', label: 'in and out of service' },
];
const dues = [
  { value: 'any', label: 'whenever they are due' },
  { value: 'overdue', label: 'overdue for inspection' },
  { value: 'undated', label: 'without a due date' },
];

type GarmentSentenceProps = {
  start: string;
  filter: GarmentFilter;
  onChange: (change: Partial<GarmentFilter>) => void;
};

export const GarmentSentence = ({ start, filter, onChange }: GarmentSentenceProps) => (
  <Sentence label="Which garments are listed">
    {start} of{' '}
    <SentenceSelect
      label="kind"
      value={filter.kind}
      choices={[{ value: 'any', label: 'any kind' }, ...kindChoices]}
      onChange={(kind) => onChange({ kind: kind as GarmentFilter['kind'] })}
    />{' '}
    <SentenceSelect
      label="state"
      value={filter.state}
      choices={states}
      onChange={(state) => onChange({ state: state as GarmentFilter['state'] })}
    />
    ,{' '}
    <SentenceSelect
      label="inspection"
      value={filter.due}
      choices={dues}
      onChange={(due) => onChange({ due: due as GarmentFilter['due'] })}
    />
  </Sentence>
);
