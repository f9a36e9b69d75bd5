import type { ExposureFilter, ExposureFilterInput } from '../../../shared/contract/staff-exposure';
import { Sentence } from '../../ui/sentence';
import { SentenceSelect } from '../../ui/sentence-select';
import type { Choice } from '../../ui/select-field';
import { dutyChoices, ownDutyChoices, periodChoices, quantityChoices } from './exposure-words';

type ExposureSentenceProps = {
  filter: ExposureFilter;
  onChange: (change: Partial<ExposureFilterInput>) => void;
  /** Empty: the reader may not list them. */
  types: readonly Choice[];
  rooms: readonly Choice[];
  /** The reader sees the own figures only. */
  isOwn: boolean;
};

/** "Estimated collar exposure of the operator in any type of procedure in any room, the last 12 months." */
export const ExposureSentence = ({ filter, onChange, types, rooms, isOwn }: ExposureSentenceProps) => (
  <Sentence label="Which exposures are shown">
    {isOwn ? 'My estimated ' : 'Estimated '}
    <SentenceSelect
      label="quantity"
      value={filter.quantity}
      choices={quantityChoices}
      onChange={(quantity) => onChange({ quantity: quantity as ExposureFilter['quantity'] })}
    />
    {isOwn ? ' ' : ' of '}
    <SentenceSelect
      label="duty"
      value={filter.duty}
      choices={isOwn ? ownDutyChoices : dutyChoices}
      onChange={(duty) => onChange({ duty: duty as ExposureFilter['duty'] })}
    />
    {types.length > 0 && (
      <>
        {' in '}
        <SentenceSelect
          label="procedure type"
          value={filter.type ?? ''}
          choices={[{ value: '', label: 'any type' }, ...types]}
          onChange={(type) => onChange({ type })}
        />
        {' of procedure'}
      </>
    )}
    {rooms.length > 0 && (
      <>
        {' in '}
        <SentenceSelect
          label="room"
          value={filter.room ?? ''}
          choices={[{ value: '', label: 'any room' }, ...rooms]}
          onChange={(room) => onChange({ room })}
        />
      </>
    )}
    {', '}
    <SentenceSelect
      label="period"
      value={filter.period}
      choices={periodChoices}
      onChange={(period) => onChange({ period: period as ExposureFilter['period'] })}
    />
    .
  </Sentence>
);
