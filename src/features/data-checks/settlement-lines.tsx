import type { CheckSettlement } from '../../../shared/contract/data-check';
import { formatInstant } from '../../lib/clock';
import { describeDecision } from './check-words';

type SettlementLinesProps = { settlement: CheckSettlement; timeZone: string };

/** What was decided, why, by whom and when; who is left out where the reader may not know. */
export const SettlementLines = ({ settlement, timeZone }: SettlementLinesProps) => (
  <>
    <span className="font-semibold">{describeDecision(settlement)}.</span> “{settlement.reason}”
    <span className="block text-ink-2">
      {[formatInstant(settlement.decidedAt, timeZone), settlement.decidedBy].filter(Boolean).join(', ')}
      {settlement.endedAt && (
        <>
          {'; no longer from '}
          {[formatInstant(settlement.endedAt, timeZone), settlement.endedBy].filter(Boolean).join(', ')}
        </>
      )}
    </span>
  </>
);
