import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import type { RegroupCandidate } from '../../../shared/contract/regrouping';
import { formatDateTime } from '../../lib/clock';
import { ProblemNote } from '../../ui/problem-note';
import { RadioGroup } from '../../ui/radio-group';
import { TextField } from '../../ui/text-field';
import { regroupingQueries } from './queries';
import { describeCandidate } from './regroup-words';

type TargetChoiceProps = {
  procedureId: string;
  value: string | null;
  onChange: (candidate: RegroupCandidate) => void;
};

/** The other procedure: of the same patient or, within a day, the same room; any other by its case number. */
export function TargetChoice({ procedureId, value, onChange }: TargetChoiceProps) {
  const [find, setFind] = useState('');
  const {
    data = [],
    error,
    isPending,
  } = useQuery({
    ...regroupingQueries.candidates(procedureId, useDeferredValue(find.trim())),
    placeholderData: keepPreviousData,
  });
  const choices = data.map((candidate) => ({
    value: candidate.id,
    label: (
      <>
        <span className="font-semibold">{candidate.caseNumber}</span>, {formatDateTime(candidate.startedAt)}
      </>
    ),
    hint: (
      <>
        {describeCandidate(candidate)}
        {candidate.refusal && <span className="block text-beacon">{candidate.refusal}</span>}
      </>
    ),
  }));
  return (
    <div className="flex flex-col gap-3">
      <TextField
        label="Case number"
        hint="Empty: procedures of the same patient within two weeks, and of the same room within 24 hours."
        placeholder="26-00412"
        autoComplete="off"
        value={find}
        onChange={({ target }) => setFind(target.value)}
      />
      <ProblemNote error={error} />
      {choices.length > 0 ? (
        <RadioGroup
          className="max-h-72 overflow-y-auto"
          legend="The other procedure"
          value={value}
          choices={choices}
          radio={{
            name: 'regroup-target',
            onChange: ({ target }) => {
              const chosen = data.find(({ id }) => id === target.value);
              if (chosen) onChange(chosen);
            },
          }}
        />
      ) : (
        <p role="status" className="text-sm text-ink-2">
          {isPending
            ? 'Looking for procedures …'
            : find.trim()
              ? 'No other procedure has a number that begins so.'
              : 'No other procedure of this patient or room is near. Type a case number.'}
        </p>
      )}
    </div>
  );
}
