import type { EChartsCoreOption, EChartsType } from 'echarts/core';
import EChartsReact from 'echarts-for-react/esm/core';
import { useMemo } from 'react';
import { usePrefersStill } from '../lib/media-query';
import { useChartColours, type ChartColours } from './chart-colours';
import { echarts } from './echarts-core';

type EventHandlers = Record<string, (event: never, chart: EChartsType) => void>;

type EChartProps = {
  /** Keep it stable with useCallback: a new function draws the chart anew. */
  buildOption: (colours: ChartColours) => EChartsCoreOption;
  /** The picture in words. */
  label: string;
  height: number;
  events?: EventHandlers;
  onReady?: (chart: EChartsType) => void;
};

/**
 * The one way to a canvas chart: colours of the theme in force, the page's type, no movement for those who
 * asked for none, tooltips drawn on the canvas because the content security policy forbids inline styles.
 */
export function EChart({ buildOption, label, height, events, onReady }: EChartProps) {
  const colours = useChartColours();
  const isStill = usePrefersStill();
  const option = useMemo(() => {
    const { tooltip, ...rest } = buildOption(colours);
    return {
      animation: !isStill,
      animationDuration: 300,
      backgroundColor: 'transparent',
      textStyle: { fontFamily: "'Roboto Flex Variable', system-ui, sans-serif", color: colours['ink-2'] },
      aria: { enabled: true, label: { description: label } },
      ...rest,
      tooltip: {
        renderMode: 'richText',
        confine: true,
        transitionDuration: 0,
        backgroundColor: colours.surface,
        borderColor: colours.edge,
        borderWidth: 1,
        padding: [6, 10],
        textStyle: { color: colours.ink, fontSize: 13, lineHeight: 18 },
        ...(typeof tooltip === 'object' ? tooltip : {}),
      },
    };
  }, [buildOption, colours, isStill, label]);

  return (
    <EChartsReact
      echarts={echarts}
      option={option}
      notMerge
      onEvents={events}
      onChartReady={onReady}
      style={{ height, width: '100%' }}
    />
  );
}
