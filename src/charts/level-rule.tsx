import { groupThousands } from '../../shared/units';
import { findDecades, findLogTicks, placeOnLogScale } from '../lib/log-scale';

type LevelRuleProps = {
  value: number | null;
  lowerQuartile: number | null;
  median: number | null;
  upperQuartile: number | null;
  /** Dashed ticks with a word each: reference and review levels. */
  references?: readonly { value: number; name: string }[];
  scaleFrom: number;
  scaleTo: number;
  /** The whole reading in words. */
  label: string;
  formatTick?: (value: number) => string;
  /** The mark turns to the attention colour and shape. */
  isMarked?: boolean;
};

const line = 16;
const height = 40;

/**
 * A ruler on a logarithmic scale: the middle half of comparable values as a band, their median, reference
 * ticks, and this value's mark. It fills the width it is given.
 */
export function LevelRule({
  value,
  lowerQuartile,
  median,
  upperQuartile,
  references = [],
  scaleFrom,
  scaleTo,
  label,
  formatTick = (at) => groupThousands(String(at)),
  isMarked,
}: LevelRuleProps) {
  const share = (at: number) => 0.02 + 0.96 * placeOnLogScale(at, scaleFrom, scaleTo);
  const place = (at: number) => `${(share(at) * 100).toFixed(2)}%`;
  return (
    <svg
      role="img"
      aria-label={label}
      width="100%"
      height={height}
      className="block min-w-40 overflow-visible"
    >
      <line x1="2%" x2="98%" y1={line} y2={line} className="stroke-edge" />
      {findLogTicks(scaleFrom, scaleTo).map((at) => (
        <line key={at} x1={place(at)} x2={place(at)} y1={line} y2={line + 4} className="stroke-edge" />
      ))}
      {findDecades(scaleFrom, scaleTo).map((at) => (
        <g key={at} aria-hidden="true">
          <line x1={place(at)} x2={place(at)} y1={line} y2={line + 8} className="stroke-edge" />
          <text x={place(at)} y={line + 20} textAnchor="middle" fontSize="11" className="fill-ink-2">
            {formatTick(at)}
          </text>
        </g>
      ))}
      {lowerQuartile !== null && upperQuartile !== null && (
        <rect
          x={place(lowerQuartile)}
          y={line - 4}
          width={`${((share(upperQuartile) - share(lowerQuartile)) * 100).toFixed(2)}%`}
          height="5"
          className="fill-ramp-2 stroke-ramp-4"
          strokeWidth="0.6"
        />
      )}
      {median !== null && (
        <line
          x1={place(median)}
          x2={place(median)}
          y1={line - 8}
          y2={line + 1}
          className="stroke-ink"
          strokeWidth="1.5"
        />
      )}
      {references.map((reference) => (
        <line
          key={reference.name}
          x1={place(reference.value)}
          x2={place(reference.value)}
          y1={line - 12}
          y2={line + 8}
          className="stroke-ink"
          strokeDasharray="2.5 2"
        >
          <title>{reference.name}</title>
        </line>
      ))}
      {value !== null && (
        <svg x={place(value)} y="0" className="overflow-visible">
          <path
            d={isMarked ? 'M0 -1.5L5.5 4.5 0 10.5 -5.5 4.5z' : 'M-5.5 0.5h11L0 10z'}
            className={isMarked ? 'fill-beacon stroke-paper' : 'fill-ink stroke-paper'}
          />
        </svg>
      )}
    </svg>
  );
}
