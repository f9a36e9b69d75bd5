import type { DoseReport } from '../../../shared/contract/dose-report';
import { reasons, sentenceOfReason, type ReasonCode } from '../../../shared/contract/outcome';
import { formatInstant } from '../../lib/clock';
import { paths } from '../../paths';
import { TextLink } from '../../ui/text-link';

/** For those who must not see details: the sentence that says the same of every file. */
const sentenceOf = (code: string) => (code in reasons ? sentenceOfReason(code as ReasonCode) : code);

const dayOf = (instant: string, timeZone: string) => formatInstant(instant, timeZone).slice(0, 10);

/** Why a file gave no report, how long its bytes stay, and what the reader remarked. */
export function ReportReason({ report, timeZone }: { report: DoseReport; timeZone: string }) {
  const { reasonDetail, reasonCode, warnings = [], procedureId, keptUntil, purgedAt } = report;
  return (
    <div className="flex flex-col gap-1 text-sm">
      {reasonCode && <p>{reasonDetail ?? sentenceOf(reasonCode)}</p>}
      {keptUntil && <p className="text-ink-2">Its bytes are kept until {dayOf(keptUntil, timeZone)}.</p>}
      {purgedAt && (
        <p className="text-ink-2">
          Its bytes were deleted on {dayOf(purgedAt, timeZone)}, the time of keeping being over.
        </p>
      )}
      {procedureId && (
        <TextLink to={paths.procedure(procedureId)} className="self-start">
          Open the procedure
        </TextLink>
      )}
      {warnings.length > 0 && (
        <details>
          <summary className="cursor-pointer text-ink-2">
            {warnings.length === 1 ? '1 warning of the reader' : `${warnings.length} warnings of the reader`}
          </summary>
          <ul className="ml-4 list-disc text-ink-2">
            {warnings.map((warning, index) => (
              <li key={index}>{warning.detail}</li>
            ))}
          </ul>
        </details>
      )}
    </div>
  );
}
