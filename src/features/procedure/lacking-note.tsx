import { useWatch } from 'react-hook-form';
import type { PersonChoice } from '../../../shared/contract/person';
import type { RecordInput } from '../../../shared/contract/record';
import { findLacking } from './find-lacking';

/** Says while one types what the record still lacks; saving is possible all the same. */
export function LackingNote({ people }: { people: readonly PersonChoice[] }) {
  const values = useWatch<RecordInput>() as RecordInput;
  const lacking = findLacking(values, people);
  return (
    <div role="status" className="max-w-3xl text-sm">
      {lacking.length === 0 ? (
        <p>
          <strong className="font-semibold">Nothing is missing.</strong> Staff exposure is estimated when this
          is saved.
        </p>
      ) : (
        <p>
          <strong className="font-semibold">Still missing:</strong> {lacking.join('; ')}. It can be saved as
          it is, and staff exposure is estimated once it is complete.
        </p>
      )}
      <p className="text-ink-2">Unsaved entries are kept in this browser tab until they are saved.</p>
    </div>
  );
}
