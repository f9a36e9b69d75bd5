import { useRef } from 'react';
import { useElementWidth } from '../../charts/element-width';

export type PlotLine = { name: string; points: readonly { x: number; y: number }[] };
type Axis = {
  from: number;
  to: number;
  ticks: readonly number[];
  title: string;
  format: (value: number) => string;
};

type LinePlotProps = {
  lines: readonly PlotLine[];
  x: Axis;
  y: Axis & { isLog?: boolean };
  label: string;
  height?: number;
};

const margin = { top: 22, right: 58, bottom: 40, left: 48 };
const nameHeight = 14;
const tones = ['stroke-ramp-3', 'stroke-lee', 'stroke-sounding', 'stroke-ink'];
const dashes = [undefined, '7 3', '2 3', '9 3 2 3'];

/** A few named curves over hairlines: told apart by dash and by the name at their end, not by tone alone. */
export function LinePlot({ lines, x, y, label, height = 260 }: LinePlotProps) {
  const box = useRef<HTMLDivElement>(null);
  const width = useElementWidth(box);
  const plotWidth = Math.max(1, width - margin.left - margin.right);
  const plotHeight = height - margin.top - margin.bottom;
  const shareY = (value: number) =>
    y.isLog ? Math.log(value / y.from) / Math.log(y.to / y.from) : (value - y.from) / (y.to - y.from);
  const placeX = (value: number) => margin.left + ((value - x.from) / (x.to - x.from)) * plotWidth;
  const placeY = (value: number) => margin.top + (1 - shareY(value)) * plotHeight;
  const namePlaces = spreadApart(lines.map(({ points }) => placeY(points.at(-1)?.y ?? y.from)));
  const draw = (points: PlotLine['points']) =>
    points.map((point, at) => `${at ? 'L' : 'M'}${placeX(point.x).toFixed(1)} ${placeY(point.y).toFixed(1)}`);
  return (
    <div ref={box} style={{ height }}>
      {width > 0 && (
        <svg role="img" aria-label={label} width={width} height={height} fontSize="12" className="block">
          {y.ticks.map((tick) => (
            <g key={tick}>
              <path d={`M${margin.left} ${placeY(tick)}h${plotWidth}`} className="stroke-rule" />
              <text x={margin.left - 8} y={placeY(tick) + 4} textAnchor="end" className="fill-ink-2">
                {y.format(tick)}
              </text>
            </g>
          ))}
          {x.ticks.map((tick) => (
            <g key={tick}>
              <path d={`M${placeX(tick)} ${margin.top}v${plotHeight}`} className="stroke-rule" />
              <text x={placeX(tick)} y={height - 22} textAnchor="middle" className="fill-ink-2">
                {x.format(tick)}
              </text>
            </g>
          ))}
          <text x={margin.left} y={12} className="fill-ink-2">
            {y.title}
          </text>
          <text x={margin.left + plotWidth} y={height - 5} textAnchor="end" className="fill-ink-2">
            {x.title}
          </text>
          {lines.map(({ name, points }, place) => {
            const last = points.at(-1);
            return (
              <g key={name}>
                <path
                  d={draw(points).join('')}
                  className={`fill-none ${tones[place % tones.length] ?? 'stroke-ink'}`}
                  strokeWidth="1.8"
                  strokeDasharray={dashes[place % dashes.length]}
                />
                {last && (
                  <text x={placeX(last.x) + 6} y={(namePlaces[place] ?? 0) + 4} className="fill-ink">
                    {name}
                  </text>
                )}
              </g>
            );
          })}
        </svg>
      )}
    </div>
  );
}

/** Pushes heights apart until the names at them can be read; their order stays. */
function spreadApart(heights: readonly number[]): number[] {
  const placed = new Array<number>(heights.length);
  let free = -Infinity;
  for (const { height, place } of heights
    .map((height, place) => ({ height, place }))
    .sort((one, other) => one.height - other.height)) {
    placed[place] = Math.max(height, free);
    free = Math.max(height, free) + nameHeight;
  }
  return placed;
}
