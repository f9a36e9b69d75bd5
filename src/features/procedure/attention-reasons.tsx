import type { Procedure } from '../../../shared/contract/procedure';
import { AttentionMark } from '../../ui/attention-mark';

/** Why the procedure asks for attention, strongest first. */
export const AttentionReasons = ({ attention }: { attention: Procedure['attention'] }) =>
  attention && attention.reasons.length > 0 ? (
    <ul aria-label="Attention" className="flex flex-col gap-0.5 text-base">
      {attention.reasons.map((reason) => (
        <li key={`${reason.code} ${reason.detail}`}>
          <AttentionMark strength={reason.level}>
            <span className="font-normal">{reason.detail}</span>
          </AttentionMark>
        </li>
      ))}
    </ul>
  ) : null;
