import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../ui/button';
import { MarginNote } from '../../ui/margin-note';
import { ProblemNote } from '../../ui/problem-note';
import { DefinitionList, DefinitionRow } from '../../ui/definition-row';
import { procedureQueries } from './queries';

/** DICOM parts a name by carets; people read "family, given". */
const writeName = (name: string): string => name.split('^').filter(Boolean).join(', ');

type PatientNoteProps = {
  procedureId: string;
  /** Shown at once to those who match files with patients all day; on request to others. */
  isShownAtOnce: boolean;
};

/** Who the patient is. Every look is written down, so nobody looks by accident. */
export function PatientNote({ procedureId, isShownAtOnce }: PatientNoteProps) {
  const [isAsked, setIsAsked] = useState(isShownAtOnce);
  const { data, error, isFetching } = useQuery({
    ...procedureQueries.patient(procedureId),
    enabled: isAsked,
  });
  const isAbsent = error !== null && 'status' in error && error.status === 404;
  return (
    <MarginNote title="Patient">
      {!isAsked && (
        <Button isSmall className="self-start" onClick={() => setIsAsked(true)}>
          Show patient
        </Button>
      )}
      {isFetching && !data && <p className="text-sm text-ink-2">Asking …</p>}
      {isAbsent ? (
        <p className="text-sm">No identity is kept for this procedure.</p>
      ) : (
        <ProblemNote error={error} />
      )}
      {data && (
        <DefinitionList>
          <DefinitionRow name="Name">
            {data.name === null ? 'not reported' : writeName(data.name)}
          </DefinitionRow>
          <DefinitionRow name="Patient ID">{data.id ?? 'not reported'}</DefinitionRow>
          <DefinitionRow name="Born">{data.birthDate ?? 'not reported'}</DefinitionRow>
          <DefinitionRow name="Sex">{data.sex ?? 'not reported'}</DefinitionRow>
          <DefinitionRow name="Accession">{data.accessionNumber ?? 'not reported'}</DefinitionRow>
        </DefinitionList>
      )}
      <p className="text-xs text-ink-2">Each look at a patient’s identity is recorded.</p>
    </MarginNote>
  );
}
