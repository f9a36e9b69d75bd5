import type { z } from 'zod';
import { SentenceSelect } from '../../ui/sentence-select';
import { Sentence } from '../../ui/sentence';
import { periodChoices, quantityChoices } from './exposure-words';
import type { ownFilterSchema } from './own-filter';

type OwnFilter = z.output<typeof ownFilterSchema>;

/** "My collar exposure by month, the last 12 months." */
export const OwnSentence = ({
  filter,
  onChange,
}: {
  filter: OwnFilter;
  onChange: (change: Partial<OwnFilter>) => void;
}) => (
  <Sentence label="Which of my figures are shown">
    My estimated{' '}
    <SentenceSelect
      label="quantity"
      value={filter.quantity}
      choices={quantityChoices}
      onChange={(quantity) => onChange({ quantity: quantity as OwnFilter['quantity'] })}
    />{' '}
    by month,{' '}
    <SentenceSelect
      label="period"
      value={filter.period}
      choices={periodChoices.filter(({ value }) => value !== '7d' && value !== '30d')}
      onChange={(period) => onChange({ period: period as OwnFilter['period'] })}
    />
    .
  </Sentence>
);
