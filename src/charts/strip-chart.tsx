import { buildStripPaths } from './strip-paths';
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
 * The strip of a list row, 28 px high: along is time, up is rate (square-root scale), shade is a class,
 * caps tell the second kind.
 */
export function StripChart({ blocks, span, peak, label, width = 220 }: StripChartProps) {
  const { base, shades, caps } = buildStripPaths(blocks, { width, height, span, peak });
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
      {shades.map(({ shade, path }) => (
        <path
          key={shade}
          d={path}
          className={`${findShadeFill(shade)} ${shade === null ? 'stroke-edge' : 'stroke-ramp-3'}`}
          strokeWidth={shade === null || shade < 2 ? 0.5 : 0}
        />
      ))}
      {caps && <path d={caps} className="fill-sounding" />}
      <path d={`M0 ${base}H${width}`} className="stroke-edge" strokeWidth="0.8" />
    </svg>
  );
}
