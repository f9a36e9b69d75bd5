import type { EChartsCoreOption } from 'echarts/core';
import { binValues } from './bin-values';
import type { ChartColours } from './chart-colours';
import { findDecades, findLogRange, findLogTicks } from '../lib/log-scale';
import type { ScatterGuide, ScatterPoint } from './scatter.types';
import { findRoundTicks } from './ticks';
import { toneSizes } from './tone-sizes';

export type ScatterOptionInput = {
  points: readonly ScatterPoint[];
  guides: readonly ScatterGuide[];
  xTitle: string;
  yTitle: string;
  formatX: (value: number) => string;
  formatY: (value: number) => string;
  isNarrow: boolean;
};

const bins = { x: 36, y: 24 };

/** Ends of both axes: x logarithmic (in powers of ten), y linear with a margin. */
export function findScatterRange(points: readonly ScatterPoint[]) {
  const x = findLogRange(points.map((point) => point.x)) ?? { from: 1, to: 100 };
  const ys = points.map((point) => point.y);
  const least = ys.reduce((one, other) => Math.min(one, other), Infinity);
  const most = ys.reduce((one, other) => Math.max(one, other), -Infinity);
  const yFrom = Number.isFinite(least) ? Math.floor(least / 5) * 5 - (least % 5 === 0 ? 5 : 0) : 0;
  const yTo = Number.isFinite(most) ? Math.ceil(most / 5) * 5 + (most % 5 === 0 ? 5 : 0) : 1;
  return { xFrom: Math.log10(x.from), xTo: Math.log10(x.to), yFrom, yTo };
}

/** A cloud of points with the counts along both edges; five tones are five series over one pair of axes. */
export function buildScatterOption(input: ScatterOptionInput, colours: ChartColours): EChartsCoreOption {
  const { points, guides, xTitle, yTitle, formatX, formatY, isNarrow } = input;
  const range = findScatterRange(points);
  const edge = isNarrow ? 40 : 70;
  const grid = { left: 58, top: edge + 6, right: edge + 8, bottom: 46 };
  const findTicks = isNarrow ? findDecades : findLogTicks;
  const xTicks = findTicks(10 ** range.xFrom, 10 ** range.xTo);
  const xPlaces = xTicks.map(Math.log10);
  const yPlaces = findRoundTicks(range.yFrom, range.yTo, 6);
  const placed = points.filter((point) => point.x > 0);
  const axis = {
    type: 'value',
    axisLine: { show: false },
    splitLine: { lineStyle: { color: colours.rule } },
    nameTextStyle: { color: colours['ink-2'], fontSize: 12 },
  };
  const label = (format: (value: number) => string, places: number[]) => ({
    color: colours['ink-2'],
    fontSize: 12,
    formatter: format,
    customValues: places,
  });
  const hidden = { show: false };
  const edgeBars = { color: colours.ramp[1], borderColor: colours.ramp[2], borderWidth: 0.6 };
  const xCounts = binValues(
    placed.map((point) => Math.log10(point.x)),
    range.xFrom,
    range.xTo,
    bins.x,
  );
  const yCounts = binValues(
    placed.map((point) => point.y),
    range.yFrom,
    range.yTo,
    bins.y,
  );

  return {
    tooltip: { trigger: 'item' },
    grid: [
      grid,
      { left: grid.left, right: grid.right, top: 0, height: edge },
      { right: 0, width: edge, top: grid.top, bottom: grid.bottom },
    ],
    xAxis: [
      {
        ...axis,
        min: range.xFrom,
        max: range.xTo,
        name: xTitle,
        nameLocation: 'middle',
        nameGap: 30,
        axisTick: { customValues: xPlaces, lineStyle: { color: colours.edge } },
        axisLabel: label((value) => formatX(Number((10 ** value).toPrecision(6))), xPlaces),
      },
      { ...hidden, type: 'category', gridIndex: 1, data: xCounts.map((_, place) => place) },
      { ...hidden, type: 'value', gridIndex: 2 },
    ],
    yAxis: [
      {
        ...axis,
        min: range.yFrom,
        name: yTitle,
        nameLocation: 'middle',
        nameGap: 40,
        max: range.yTo,
        axisTick: { customValues: yPlaces, show: false },
        axisLabel: label(formatY, yPlaces),
      },
      { ...hidden, type: 'value', gridIndex: 1 },
      { ...hidden, type: 'category', gridIndex: 2, data: yCounts.map((_, place) => place) },
    ],
    brush: {
      xAxisIndex: 0,
      yAxisIndex: 0,
      seriesIndex: toneSizes.map((_, tone) => tone),
      brushMode: 'single',
      brushStyle: { borderWidth: 1.5, color: 'transparent', borderColor: colours.lee },
      outOfBrush: { opacity: 0.22 },
    },
    series: [
      ...toneSizes.map((symbolSize, tone) => ({
        type: 'scatter',
        name: `tone-${tone}`,
        symbolSize,
        itemStyle: {
          color: colours.ramp[tone],
          borderColor: tone < 2 ? colours.ramp[2] : colours.paper,
          borderWidth: tone < 2 ? 0.8 : 0.5,
          opacity: 0.9,
        },
        emphasis: { itemStyle: { borderColor: colours.ink, borderWidth: 1.5, opacity: 1 } },
        data: points.flatMap((point, index) =>
          point.tone === tone && point.x > 0
            ? [{ value: [Math.log10(point.x), point.y], index, name: point.text }]
            : [],
        ),
        tooltip: { formatter: ({ name }: { name: string }) => name },
        z: 3 + tone,
      })),
      ...guides.map((guide) => ({
        type: 'line',
        silent: true,
        symbol: 'none',
        data: guide.points.map((point) => [Math.log10(point.x), point.y]),
        lineStyle: { color: colours.ink, width: 1, type: [5, 4] },
        endLabel: { show: true, formatter: guide.name, color: colours.ink, fontSize: 12 },
        z: 10,
      })),
      {
        type: 'bar',
        silent: true,
        xAxisIndex: 1,
        yAxisIndex: 1,
        data: xCounts,
        itemStyle: edgeBars,
        barCategoryGap: '8%',
      },
      {
        type: 'bar',
        silent: true,
        xAxisIndex: 2,
        yAxisIndex: 2,
        data: yCounts,
        itemStyle: edgeBars,
        barCategoryGap: '8%',
      },
    ],
  };
}
