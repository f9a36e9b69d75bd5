import { useId, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { useElementWidth } from './element-width';
import { HatchPattern, outlineBlock, StripBlocks } from './strip-blocks';
import { StripAxes } from './strip-axes';
import { buildStripScale, findBlockAt } from './strip-scale';
import { StripToolbar } from './strip-toolbar';
import type { StripBlock } from './strip.types';
import { placeWindow, showStretch, zoomWindow, type StripWindow } from './strip-window';
import { useStripGestures } from './use-strip-gestures';

type StripExplorerProps = {
  /** In order of time; seconds from the start. */
  blocks: readonly StripBlock[];
  span: number;
  /** Second of the day at which the strip starts, so that the axis shows clock times. */
  originS: number;
  label: string;
  rateTitle: string;
  formatRate: (rate: number) => string;
  /** One block in words: shown while it is pointed at, read out while it is walked to. */
  describe: (index: number) => string;
  /** Called when a block is picked by press or Enter: to mark its row in the table beside. */
  onPick?: (index: number) => void;
  height?: number;
};

/** The large strip: zoom by drag, wheel or keys; arrow keys walk from block to block. */
export function StripExplorer({
  blocks,
  span,
  originS,
  label,
  rateTitle,
  formatRate,
  describe,
  onPick,
  height = 248,
}: StripExplorerProps) {
  const surface = useRef<HTMLDivElement>(null);
  const width = useElementWidth(surface);
  const patternId = useId();
  const [window, setWindow] = useState<StripWindow>({ from: 0, to: span });
  const [focused, setFocused] = useState<number | null>(null);
  const [pointed, setPointed] = useState<number | null>(null);
  const scale = useMemo(
    () => buildStripScale(blocks, window, width, height),
    [blocks, window, width, height],
  );

  const zoom = (factor: number, anchor?: number) => {
    const focusedBlock = focused === null ? undefined : blocks[focused];
    const middle = focusedBlock ? (focusedBlock.from + focusedBlock.to) / 2 : (window.from + window.to) / 2;
    setWindow(zoomWindow(window, factor, anchor ?? middle, span));
  };
  const showAll = () => setWindow({ from: 0, to: span });
  const focus = (index: number) => {
    const block = blocks[Math.min(Math.max(index, 0), blocks.length - 1)];
    if (!block) return;
    setFocused(blocks.indexOf(block));
    setWindow(showStretch(window, block.from, block.to, span));
  };
  const pick = (index: number | null) => {
    setFocused(index);
    if (index !== null) onPick?.(index);
  };
  const gestures = useStripGestures({
    surface,
    scale,
    onZoom: zoom,
    onWindow: ({ from, to }) => setWindow(placeWindow((from + to) / 2, to - from, span)),
    onPoint: (px, py) => setPointed(findBlockAt(blocks, scale, px, py)),
    onPick: (px, py) => pick(findBlockAt(blocks, scale, px, py)),
    onLeave: () => setPointed(null),
  });
  const pressKey = (event: KeyboardEvent) => {
    const deeds: Record<string, () => void> = {
      ArrowRight: () => focus((focused ?? -1) + 1),
      ArrowLeft: () => focus((focused ?? blocks.length) - 1),
      Home: () => focus(0),
      End: () => focus(blocks.length - 1),
      '+': () => zoom(0.5),
      '=': () => zoom(0.5),
      '-': () => zoom(2),
      '0': showAll,
      Escape: showAll,
      Enter: () => pick(focused),
    };
    const deed = deeds[event.key];
    if (!deed || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    deed();
  };
  const told = pointed ?? focused;
  const toldBlock = told === null ? undefined : blocks[told];

  return (
    <div className="flex flex-col gap-1.5">
      <StripToolbar
        readout={told === null ? null : describe(told)}
        rateTitle={rateTitle}
        isWhole={window.to - window.from >= span}
        onZoom={zoom}
        onShowAll={showAll}
      />
      <div
        ref={surface}
        tabIndex={0}
        role="slider"
        aria-label={label}
        aria-valuemin={1}
        aria-valuemax={blocks.length}
        aria-valuenow={(focused ?? 0) + 1}
        aria-valuetext={blocks.length === 0 ? 'empty' : describe(focused ?? 0)}
        onKeyDown={pressKey}
        onDoubleClick={showAll}
        {...gestures.handlers}
        style={{ height }}
        className="w-full cursor-crosshair touch-pan-y select-none"
      >
        {width > 0 && (
          <svg width={width} height={height} className="block" aria-hidden="true">
            <defs>
              <HatchPattern id={patternId} />
              <clipPath id={`${patternId}-plot`}>
                <rect x={scale.plotLeft} y="0" width={scale.plotRight - scale.plotLeft} height={height} />
              </clipPath>
            </defs>
            <StripAxes {...{ scale, window, originS, formatRate }} />
            <g clipPath={`url(#${patternId}-plot)`}>
              <StripBlocks {...{ blocks, scale, patternId }} />
              {toldBlock && (
                <rect {...outlineBlock(toldBlock, scale)} className="fill-none stroke-ink" strokeWidth="2" />
              )}
              {gestures.drag && (
                <rect
                  x={Math.min(gestures.drag.startPx, gestures.drag.nowPx)}
                  y={scale.plotTop}
                  width={Math.abs(gestures.drag.nowPx - gestures.drag.startPx)}
                  height={scale.plotBottom - scale.plotTop}
                  className="fill-ramp-3/25 stroke-lee"
                />
              )}
            </g>
          </svg>
        )}
      </div>
    </div>
  );
}
