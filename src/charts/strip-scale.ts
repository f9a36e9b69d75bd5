import type { StripBlock } from './strip.types';
import type { StripWindow } from './strip-window';

export const stripMargin = { top: 8, right: 8, bottom: 24, left: 46 };

export type StripScale = {
  base: number;
  plotTop: number;
  plotBottom: number;
  plotLeft: number;
  plotRight: number;
  placeX: (value: number) => number;
  readX: (px: number) => number;
  /** Height in px of a rate; one scale for both sides, a square root so that faint parts stay in sight. */
  tall: (height: number) => number;
  peakAbove: number;
  peakBelow: number;
};

const findPeak = (blocks: readonly StripBlock[], side: StripBlock['side']): number =>
  blocks.reduce((peak, block) => (block.side === side ? Math.max(peak, block.height) : peak), 0);

/** Scales of the large strip for a width, a height and the window in sight. */
export function buildStripScale(
  blocks: readonly StripBlock[],
  window: StripWindow,
  width: number,
  height: number,
): StripScale {
  const plotTop = stripMargin.top;
  const plotBottom = height - stripMargin.bottom;
  const plotLeft = stripMargin.left;
  const plotRight = Math.max(plotLeft + 1, width - stripMargin.right);
  const peakAbove = findPeak(blocks, 'above');
  const peakBelow = findPeak(blocks, 'below');
  const roots = Math.sqrt(peakAbove) + Math.sqrt(peakBelow) || 1;
  const pxPerRoot = (plotBottom - plotTop) / roots;
  const pxPerUnit = (plotRight - plotLeft) / (window.to - window.from || 1);
  return {
    base: plotTop + Math.sqrt(peakAbove) * pxPerRoot,
    plotTop,
    plotBottom,
    plotLeft,
    plotRight,
    placeX: (value) => plotLeft + (value - window.from) * pxPerUnit,
    readX: (px) => window.from + (px - plotLeft) / pxPerUnit,
    tall: (rate) => Math.sqrt(Math.max(0, rate)) * pxPerRoot,
    peakAbove,
    peakBelow,
  };
}

/** The block at a place of the picture, the narrowest first where several lie; null in the gaps. */
export function findBlockAt(
  blocks: readonly StripBlock[],
  scale: StripScale,
  px: number,
  py: number,
  reachPx = 4,
): number | null {
  const side = py <= scale.base ? 'above' : 'below';
  const distance = (block: StripBlock): number =>
    Math.max(scale.placeX(block.from) - px, px - scale.placeX(block.to), 0);
  const near = blocks
    .map((block, index) => ({
      index,
      away: distance(block),
      breadth: block.to - block.from,
      side: block.side,
    }))
    .filter((found) => found.side === side && found.away <= reachPx)
    .sort((one, other) => one.away - other.away || one.breadth - other.breadth);
  return near[0]?.index ?? null;
}
