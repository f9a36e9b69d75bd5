import type { StripScale } from './strip-scale';
import type { StripWindow } from './strip-window';
import { findClockTicks, findRootTicks, formatClock } from './ticks';

type StripAxesProps = {
  scale: StripScale;
  window: StripWindow;
  originS: number;
  formatRate: (rate: number) => string;
};

const leastTickPx = 74;

/** Clock times below, rates at the left; hairlines only. */
export function StripAxes({ scale, window, originS, formatRate }: StripAxesProps) {
  const { plotLeft, plotRight, plotBottom, base } = scale;
  const most = Math.max(1, Math.floor((plotRight - plotLeft) / leastTickPx));
  const times = findClockTicks(window.from, window.to, originS, most).filter(
    // A label cut by the picture's edge would read as another time.
    (at) => scale.placeX(at) <= plotRight - 12,
  );
  const hasSeconds = times.length > 1 && times[1]! - times[0]! < 60;
  const above = findSideTicks(scale.peakAbove, base - scale.plotTop);
  const below = findSideTicks(scale.peakBelow, plotBottom - base).filter((rate) => rate > 0);
  const rates = [
    ...above.map((rate) => ({ rate, y: base - scale.tall(rate) })),
    ...below.map((rate) => ({ rate, y: base + scale.tall(rate) })),
  ];
  return (
    <g aria-hidden="true" className="text-xs" fontSize="12">
      {rates.map(({ rate, y }) => (
        <g key={y}>
          <path d={`M${plotLeft} ${y}H${plotRight}`} className={rate === 0 ? 'stroke-edge' : 'stroke-rule'} />
          <text x={plotLeft - 6} y={y + 4} textAnchor="end" className="fill-ink-2">
            {formatRate(rate)}
          </text>
        </g>
      ))}
      {times.map((at) => (
        <g key={at}>
          <path d={`M${scale.placeX(at)} ${plotBottom}v5`} className="stroke-edge" />
          <text x={scale.placeX(at)} y={plotBottom + 18} textAnchor="middle" className="fill-ink-2">
            {formatClock(originS + at, hasSeconds)}
          </text>
        </g>
      ))}
      <path d={`M${plotLeft} ${plotBottom}H${plotRight}`} className="stroke-edge" />
    </g>
  );
}

function findSideTicks(peak: number, lengthPx: number): number[] {
  if (!(peak > 0) || lengthPx < 16) return peak > 0 ? [0] : [];
  return findRootTicks(peak, 22 / lengthPx);
}
