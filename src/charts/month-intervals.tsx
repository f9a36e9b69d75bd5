import { useRef } from 'react';
import { useElementWidth } from './element-width';
import { findRoundTicks } from './ticks';

export type MonthInterval = {
  /** "2026-11" */
  month: string;
  nominal: number | null;
  low: number | null;
  high: number | null;
  /** The second series: a tick; marked where it needs a look. */
  second?: number | null;
  isSecondMarked?: boolean;
  /** Shown on hover. */
  text: string;
};

type MonthIntervalsProps = {
  months: readonly MonthInterval[];
  label: string;
  formatY: (value: number) => string;
  height?: number;
};

const margin = { top: 10, right: 8, bottom: 24, left: 44 };
const names = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** One dot with its interval a month, and a tick for what was read on another instrument. */
export function MonthIntervals({ months, label, formatY, height = 190 }: MonthIntervalsProps) {
  const box = useRef<HTMLDivElement>(null);
  const width = useElementWidth(box);
  const top = Math.max(
    0,
    ...months.flatMap((month) => [month.high ?? month.nominal ?? 0, month.second ?? 0]),
  );
  const ticks = findRoundTicks(0, top || 1, 4);
  const plotWidth = Math.max(1, width - margin.left - margin.right);
  const plotHeight = height - margin.top - margin.bottom;
  const step = plotWidth / Math.max(1, months.length);
  const every = Math.max(1, Math.ceil(34 / step));
  const placeX = (index: number) => margin.left + (index + 0.5) * step;
  const placeY = (value: number) => margin.top + plotHeight * (1 - value / (top * 1.04 || 1));
  const half = Math.min(8, step * 0.32);

  return (
    <div ref={box} style={{ height }}>
      {width > 0 && (
        <svg role="img" aria-label={label} width={width} height={height} fontSize="12" className="block">
          {ticks.map((tick) => (
            <g key={tick}>
              <path
                d={`M${margin.left} ${placeY(tick)}H${width - margin.right}`}
                className={tick === 0 ? 'stroke-edge' : 'stroke-rule'}
              />
              <text x={margin.left - 8} y={placeY(tick) + 4} textAnchor="end" className="fill-ink-2">
                {formatY(tick)}
              </text>
            </g>
          ))}
          {months.map((month, index) => (
            <g key={month.month}>
              <title>{month.text}</title>
              <rect
                x={placeX(index) - step / 2}
                y={margin.top}
                width={step}
                height={plotHeight}
                className="fill-transparent hover:fill-ramp-1/50"
              />
              {month.low !== null && month.high !== null && (
                <path
                  d={`M${placeX(index)} ${placeY(month.low)}V${placeY(month.high)}`}
                  className="stroke-lee"
                  strokeWidth="1.8"
                />
              )}
              {month.nominal !== null && (
                <circle
                  cx={placeX(index)}
                  cy={placeY(month.nominal)}
                  r="4"
                  className="fill-lee stroke-paper"
                />
              )}
              {month.second !== null && month.second !== undefined && (
                <path
                  d={`M${placeX(index) - half} ${placeY(month.second)}h${half * 2}`}
                  className={month.isSecondMarked ? 'stroke-beacon' : 'stroke-ink'}
                  strokeWidth="2.4"
                />
              )}
              {index % every === 0 && (
                <text x={placeX(index)} y={height - 7} textAnchor="middle" className="fill-ink-2">
                  {nameMonth(month.month, index === 0)}
                </text>
              )}
            </g>
          ))}
        </svg>
      )}
    </div>
  );
}

/** "Nov"; January and the first month carry their year. */
function nameMonth(month: string, isFirst: boolean): string {
  const [year = '', number = '1'] = month.split('-');
  const name = names[Number(number) - 1] ?? month;
  return isFirst || name === 'Jan' ? `${name} ${year.slice(2)}` : name;
}
