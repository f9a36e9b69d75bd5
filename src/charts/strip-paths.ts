import type { StripBlock } from './strip.types';

type Frame = { width: number; height: number; span: number; peak: number };
export type StripPaths = {
  /** y of the line that the blocks stand on. */
  base: number;
  /** One path for all blocks of a shade, in the order of their first block. */
  shades: { shade: number | null; path: string }[];
  caps: string;
};

const round = (value: number) => Math.round(value * 10) / 10;
const rectangle = (x: number, y: number, breadth: number, tall: number) =>
  `M${round(x)} ${round(y)}h${round(breadth)}v${round(tall)}h${round(-breadth)}z`;

/**
 * The blocks of a strip as few paths: fifty rows of up to 64 blocks would be thousands of elements.
 * Up is the square root of the rate, so that the long, faint parts stay in sight.
 */
export function buildStripPaths(
  blocks: readonly StripBlock[],
  { width, height, span, peak }: Frame,
): StripPaths {
  const base = blocks.some(({ side }) => side === 'below') ? height * 0.59 : height - 1.5;
  const room = { above: base - 2.5, below: height - base - 2.5 };
  const placeX = (value: number) => (span > 0 ? (value / span) * width : 0);
  const shades = new Map<number | null, string>();
  let caps = '';
  for (const { from, to, height: rate, shade, side, isPatterned } of blocks) {
    const x = placeX(from);
    const breadth = Math.max(1.4, placeX(to) - x);
    const tall = Math.max(1, Math.sqrt(Math.min(1, rate / (peak || 1))) * room[side]);
    const y = side === 'above' ? base - tall : base;
    shades.set(shade, (shades.get(shade) ?? '') + rectangle(x, y, breadth, tall));
    if (isPatterned) caps += rectangle(x - 0.3, side === 'above' ? y - 2 : y + tall, breadth + 0.6, 2);
  }
  return { base, shades: [...shades].map(([shade, path]) => ({ shade, path })), caps };
}
