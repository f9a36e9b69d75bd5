import { useId } from 'react';
import { HatchPattern } from './strip-blocks';
import { shadeFills } from './strip.types';

type StripLegendProps = {
  plainName: string;
  patternedName: string;
  /** What the shade stands for: "kVp". */
  shadeTitle: string;
  /** Limits between the five shades, ascending. */
  shadeLimits: readonly number[];
  /** The reading of the two sides, where there are two. */
  sidesNote?: string;
};

/** The strip, explained once. */
export function StripLegend({
  plainName,
  patternedName,
  shadeTitle,
  shadeLimits,
  sidesNote,
}: StripLegendProps) {
  const patternId = useId();
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-2 text-xs text-ink-2">
      <span className="flex items-center gap-2">
        <svg width="22" height="16" aria-hidden="true">
          <rect x="0" y="4" width="22" height="12" className="fill-ramp-2 stroke-ramp-4" strokeWidth="0.6" />
        </svg>
        {plainName}
      </span>
      <span className="flex items-center gap-2">
        <svg width="22" height="16" aria-hidden="true">
          <defs>
            <HatchPattern id={patternId} />
          </defs>
          <rect x="0" y="3" width="22" height="13" className="fill-ramp-2 stroke-ramp-4" strokeWidth="0.6" />
          <rect x="0" y="3" width="22" height="13" fill={`url(#${patternId})`} />
          <rect x="0" y="0" width="22" height="3" className="fill-sounding" />
        </svg>
        {patternedName}
      </span>
      <ShadeScale title={shadeTitle} limits={shadeLimits} />
      {sidesNote && <span>{sidesNote}</span>}
    </div>
  );
}

const step = 34;

function ShadeScale({ title, limits }: { title: string; limits: readonly number[] }) {
  const text = `${title}: below ${limits[0]}, then by shade from ${limits.join(', ')} on`;
  return (
    <span className="flex items-center gap-2">
      <span>{title}</span>
      <svg width={step * 5} height="26" role="img" aria-label={text}>
        {shadeFills.map((fill, place) => (
          <rect
            key={fill}
            x={place * step + 0.5}
            y="0.5"
            width={step - 1}
            height="10"
            className={`${fill} stroke-ramp-4`}
            strokeWidth="0.6"
          />
        ))}
        {limits.map((limit, place) => (
          <text
            key={limit}
            x={(place + 1) * step}
            y="23"
            textAnchor="middle"
            fontSize="11"
            className="fill-ink-2"
          >
            {limit}
          </text>
        ))}
      </svg>
    </span>
  );
}
