import type { ReactNode } from 'react';
import type { ProcedureFilter, ProcedureFilterInput } from '../../../shared/contract/procedure-row';
import { Sentence } from '../../ui/sentence';
import { SentenceSelect } from '../../ui/sentence-select';
import type { Choice } from '../../ui/select-field';
import {
  attentionChoices,
  findOrder,
  kindChoices,
  orderChoices,
  periodChoices,
  recordChoices,
} from './ledger-words';

type LedgerSentenceProps = {
  filter: ProcedureFilter;
  onChange: (change: Partial<ProcedureFilterInput>) => void;
  types: readonly Choice[];
  rooms: readonly Choice[];
  /** Empty: the reader sees own procedures only. */
  operators: readonly Choice[];
};

/** A comma or full stop never begins a line. */
const WithMark = ({ mark, children }: { mark: string; children: ReactNode }) => (
  <span className="inline-block max-w-full">
    {children}
    {mark}
  </span>
);

/** "Procedures of any type in any room by any operator in the last 90 days, flagged or not, complete or not, newest first." */
export const LedgerSentence = ({ filter, onChange, types, rooms, operators }: LedgerSentenceProps) => (
  <Sentence label="Which procedures are shown">
    <SentenceSelect
      label="kind"
      value={filter.kind}
      choices={kindChoices}
      onChange={(kind) => onChange({ kind: kind as ProcedureFilter['kind'] })}
    />
    {' of '}
    <SentenceSelect
      label="procedure type"
      value={filter.type ?? ''}
      choices={[{ value: '', label: 'any type' }, ...types]}
      onChange={(type) => onChange({ type })}
    />
    {' in '}
    <SentenceSelect
      label="room"
      value={filter.room ?? ''}
      choices={[{ value: '', label: 'any room' }, ...rooms]}
      onChange={(room) => onChange({ room })}
    />
    {operators.length > 0 && (
      <>
        {' by '}
        <SentenceSelect
          label="operator"
          value={filter.operator ?? ''}
          choices={[{ value: '', label: 'any operator' }, ...operators]}
          onChange={(operator) => onChange({ operator })}
        />
      </>
    )}
    {' in '}
    <WithMark mark=",">
      <SentenceSelect
        label="period"
        value={filter.period}
        choices={periodChoices}
        onChange={(period) => onChange({ period: period as ProcedureFilter['period'] })}
      />
    </WithMark>{' '}
    <WithMark mark=",">
      <SentenceSelect
        label="attention"
        value={filter.attention}
        choices={attentionChoices}
        onChange={(attention) => onChange({ attention: attention as ProcedureFilter['attention'] })}
      />
    </WithMark>{' '}
    <WithMark mark=",">
      <SentenceSelect
        label="record"
        value={filter.record}
        choices={recordChoices}
        onChange={(record) => onChange({ record: record as ProcedureFilter['record'] })}
      />
    </WithMark>{' '}
    <WithMark mark=".">
      <SentenceSelect
        label="order"
        value={findOrder(filter)}
        choices={orderChoices}
        onChange={(value) => {
          const chosen = orderChoices.find((choice) => choice.value === value);
          if (chosen) onChange({ sort: chosen.sort, order: chosen.order });
        }}
      />
    </WithMark>
  </Sentence>
);
