import { toneSizes } from './tone-sizes';
import { shadeFills } from './strip.types';

/** Tone and size of points, explained: five classes from least to most. */
export const ToneLegend = ({ title, names }: { title: string; names: readonly string[] }) => (
  <div className="flex flex-wrap items-center gap-x-5 gap-y-1 text-sm text-ink-2">
    <span>{title}</span>
    {names.map((name, tone) => (
      <span key={name} className="flex items-center gap-1.5">
        <svg width="14" height="14" aria-hidden="true">
          <circle
            cx="7"
            cy="7"
            r={(toneSizes[tone] ?? 12) / 2}
            className={`${shadeFills[tone] ?? 'fill-ramp-5'} stroke-ramp-3`}
            strokeWidth="0.8"
          />
        </svg>
        {name}
      </span>
    ))}
  </div>
);
