import type { DataCheck } from '../../../shared/contract/data-check';
import { MarginNote } from '../../ui/margin-note';
import { countChecks, isFinding } from './check-words';

/** What the machine's figures were held against, and what came of it. */
export const ChecksNote = ({ checks }: { checks: readonly DataCheck[] }) => (
  <MarginNote title="Data checks">
    {checks.length === 0 ? (
      <p className="text-sm text-ink-2">None was run.</p>
    ) : (
      <p className="text-sm">{countChecks(checks)}</p>
    )}
    {checks.length > 0 && (
      <details className="text-sm">
        <summary className="link-line target w-fit">Rule by rule</summary>
        <ul>
          {checks.map((check) => (
            <li key={check.code} className="border-b border-rule py-1.5">
              {check.detail}{' '}
              <span className="text-ink-2">
                ({isFinding(check) ? (check.settlement ? 'settled' : 'open') : check.result.replace('-', ' ')}
                )
              </span>
            </li>
          ))}
        </ul>
      </details>
    )}
  </MarginNote>
);
