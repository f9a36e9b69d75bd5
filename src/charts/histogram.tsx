type HistogramProps = {
  counts: readonly number[];
  label: string;
  /** Ends of the axis, as printed. */
  fromText: string;
  toText: string;
  height?: number;
  /** Bin that holds the value in question. */
  markedBin?: number | null;
};

/** Counts in equal bins; hairline bars, ends of the axis printed, no counts invented by smoothing. */
export function Histogram({ counts, label, fromText, toText, height = 64, markedBin }: HistogramProps) {
  const most = Math.max(1, ...counts);
  const breadth = 100 / Math.max(1, counts.length);
  return (
    <figure className="m-0">
      <svg role="img" aria-label={label} width="100%" height={height} className="block">
        {counts.map((count, place) => (
          <rect
            key={place}
            x={`${place * breadth}%`}
            y={height - 1 - (count / most) * (height - 4)}
            width={`${breadth * 0.92}%`}
            height={(count / most) * (height - 4)}
            className={place === markedBin ? 'fill-ramp-5' : 'fill-ramp-2 stroke-ramp-3'}
            strokeWidth="0.6"
          />
        ))}
        <line x1="0" x2="100%" y1={height - 0.5} y2={height - 0.5} className="stroke-edge" />
      </svg>
      <figcaption className="flex justify-between text-xs text-ink-2">
        <span>{fromText}</span>
        <span>{toText}</span>
      </figcaption>
    </figure>
  );
}
