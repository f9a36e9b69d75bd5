import type { EChartsType } from 'echarts/core';
import { useCallback, useEffect, useMemo, useState } from 'react';
import { useMediaQuery } from '../lib/media-query';
import { EChart } from './echart';
import { buildScatterOption } from './scatter-option';
import { ToneLegend } from './tone-legend';
import type { ScatterArea, ScatterGuide, ScatterPoint } from './scatter.types';
import type { ChartColours } from './chart-colours';

type ScatterWithMarginalsProps = {
  points: readonly ScatterPoint[];
  guides?: readonly ScatterGuide[];
  xTitle: string;
  yTitle: string;
  formatX: (value: number) => string;
  formatY: (value: number) => string;
  toneTitle: string;
  /** Five: what each tone stands for. */
  toneNames: readonly string[];
  label: string;
  area: ScatterArea | null;
  /** A rectangle was drawn, or taken away: list what lies in it. */
  onArea: (area: ScatterArea | null) => void;
  /** A point was pressed. */
  onOpen?: (index: number) => void;
  height?: number;
};

type BrushEnd = { areas: { coordRange?: [[number, number], [number, number]] }[] };
type PointPress = { data?: { index?: number } };
const noGuides: readonly ScatterGuide[] = [];

/**
 * Points over a logarithmic x and a linear y, counts along both edges. Drawing a rectangle chooses; those
 * who use no pointer reach every point through the table that the page puts beside it.
 */
export function ScatterWithMarginals({
  points,
  guides = noGuides,
  xTitle,
  yTitle,
  formatX,
  formatY,
  toneTitle,
  toneNames,
  label,
  area,
  onArea,
  onOpen,
  height = 460,
}: ScatterWithMarginalsProps) {
  const isNarrow = useMediaQuery('(max-width: 47.99rem)');
  const [chart, setChart] = useState<EChartsType | null>(null);
  const buildOption = useCallback(
    (colours: ChartColours) =>
      buildScatterOption({ points, guides, xTitle, yTitle, formatX, formatY, isNarrow }, colours),
    [points, guides, xTitle, yTitle, formatX, formatY, isNarrow],
  );
  const events = useMemo(
    () => ({
      brushEnd: ({ areas }: BrushEnd) => onArea(readArea(areas[0]?.coordRange)),
      click: ({ data }: PointPress) => data?.index !== undefined && onOpen?.(data.index),
    }),
    [onArea, onOpen],
  );
  useEffect(() => {
    if (chart && !chart.isDisposed()) drawArea(chart, area);
  }, [chart, area, buildOption]);

  return (
    <div className="flex flex-col gap-2">
      <EChart
        buildOption={buildOption}
        label={label}
        height={isNarrow ? Math.min(height, 380) : height}
        events={events}
        onReady={setChart}
      />
      <ToneLegend title={toneTitle} names={toneNames} />
    </div>
  );
}

function readArea(range: [[number, number], [number, number]] | undefined): ScatterArea | null {
  if (!range) return null;
  const [[xFrom, xTo], [yFrom, yTo]] = range;
  return { xFrom: 10 ** xFrom, xTo: 10 ** xTo, yFrom, yTo };
}

function drawArea(chart: EChartsType, area: ScatterArea | null): void {
  const brushOption = { brushType: 'rect', brushMode: 'single' };
  chart.dispatchAction({ type: 'takeGlobalCursor', key: 'brush', brushOption });
  const coordRange = area && [
    [Math.log10(area.xFrom), Math.log10(area.xTo)],
    [area.yFrom, area.yTo],
  ];
  const areas = coordRange ? [{ brushType: 'rect', xAxisIndex: 0, yAxisIndex: 0, coordRange }] : [];
  chart.dispatchAction({ type: 'brush', areas });
}
