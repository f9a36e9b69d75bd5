import type { Procedure } from '../../../shared/contract/procedure';
import { joinClassNames } from '../../lib/class-names';
import { AttentionMark } from '../../ui/attention-mark';
import { MarginNote } from '../../ui/margin-note';

const words: Record<Procedure['dataChecks'][number]['result'], string> = {
  passed: 'passed',
  noted: 'noted',
  failed: 'failed',
  'not-checked': 'not checked',
};

/** What the machine's figures were held against, and what came of it. */
export const DataChecksNote = ({ checks }: { checks: Procedure['dataChecks'] }) => (
  <MarginNote title="Data checks">
    {checks.length === 0 && <p className="text-sm text-ink-2">None was run.</p>}
    <ul>
      {checks.map(({ code, detail, result }) => {
        const isOdd = result === 'noted' || result === 'failed';
        return (
          <li key={code} className="border-b border-rule py-1.5 text-sm">
            {isOdd ? (
              <AttentionMark strength="note">
                <span className="font-normal">{detail}</span>
              </AttentionMark>
            ) : (
              <span className={joinClassNames(result === 'not-checked' && 'text-ink-2')}>
                {detail} <span className="text-ink-2">({words[result]})</span>
              </span>
            )}
          </li>
        );
      })}
    </ul>
  </MarginNote>
);
