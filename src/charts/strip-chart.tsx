import { findShadeFill, type StripBlock } from './strip.types';

type StripChartProps = {
  blocks: readonly StripBlock[];
  /** Length of the whole, in the blocks' unit. */
  span: number;
  /** Height that fills the strip; the same for all rows, or the row's own peak. */
  peak: number;
  /** Read out in place of the picture. */
  label: string;
  width?: number;
};

const height = 28;

/**
 * The strip of a list row, 28 px high: along is time, up is rate (square-root scale, so that the long,
 * faint parts stay in sight), shade is a class, caps tell the second kind.
 */
export function StripChart({ blocks, span, peak, label, width = 220 }: StripChartProps) {
  const hasBelow = blocks.some((block) => block.side === 'below');
  const base = hasBelow ? 16.5 : height - 1.5;
  const room = { above: base - 2.5, below: height - base - 2.5 };
  const placeX = (value: number) => (span > 0 ? (value / span) * width : 0);

  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className="block max-md:w-full"
      preserveAspectRatio="none"
    >
      {blocks.map((block, place) => {
        const x = placeX(block.from);
        const breadth = Math.max(1.4, placeX(block.to) - x);
        const tall = Math.max(1, Math.sqrt(Math.min(1, block.height / (peak || 1))) * room[block.side]);
        const y = block.side === 'above' ? base - tall : base;
        const capY = block.side === 'above' ? y - 2 : y + tall;
        return (
          <g key={place}>
            <rect
              x={x}
              y={y}
              width={breadth}
              height={tall}
              className={`${findShadeFill(block.shade)} ${block.shade === null ? 'stroke-edge' : 'stroke-ramp-3'}`}
              strokeWidth={block.shade === null || block.shade < 2 ? 0.5 : 0}
            />
            {block.isPatterned && (
              <rect x={x - 0.3} y={capY} width={breadth + 0.6} height="2" className="fill-sounding" />
            )}
          </g>
        );
      })}
      <path d={`M0 ${base}H${width}`} className="stroke-edge" strokeWidth="0.8" />
    </svg>
  );
}
