import { findDecades, placeOnLogScale } from '../lib/log-scale';

type IntervalMarkProps = {
  nominal: number | null;
  low: number | null;
  high: number | null;
  /** Ends of the shared logarithmic scale: the same for every row that is compared. */
  scaleFrom: number;
  scaleTo: number;
  /** Read out: "430 µSv, interval 140 to 1 300". */
  label: string;
  width?: number;
  /** A tick across the scale, for a limit or an expected value. */
  reference?: number;
};

const height = 20;

/** Dot and interval on a log scale; never a filled bar, for an estimate is not an amount. */
export function IntervalMark({
  nominal,
  low,
  high,
  scaleFrom,
  scaleTo,
  label,
  width = 120,
  reference,
}: IntervalMarkProps) {
  const place = (value: number) => 6 + placeOnLogScale(value, scaleFrom, scaleTo) * (width - 12);
  const middle = height / 2;
  return (
    <svg role="img" aria-label={label} width={width} height={height} className="inline-block align-middle">
      <path d={`M6 ${middle}H${width - 6}`} className="stroke-rule" />
      {findDecades(scaleFrom, scaleTo).map((value) => (
        <path key={value} d={`M${place(value)} ${middle - 2}v4`} className="stroke-edge" />
      ))}
      {reference !== undefined && (
        <path d={`M${place(reference)} 3v${height - 6}`} className="stroke-ink-2" strokeDasharray="2 1.5" />
      )}
      {low !== null && high !== null && (
        <path
          d={`M${place(low)} ${middle - 4}v8M${place(low)} ${middle}H${place(high)}M${place(high)} ${middle - 4}v8`}
          className="fill-none stroke-lee"
          strokeWidth="1.6"
        />
      )}
      {nominal !== null && <circle cx={place(nominal)} cy={middle} r="4" className="fill-ink stroke-paper" />}
    </svg>
  );
}
