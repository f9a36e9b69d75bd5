import { BarChart, LineChart, ScatterChart } from 'echarts/charts';
import { AriaComponent, BrushComponent, GridComponent, TooltipComponent } from 'echarts/components';
import * as echarts from 'echarts/core';
import { CanvasRenderer } from 'echarts/renderers';

// Only what the charts of this folder use; every addition costs each reader of a chart page.
echarts.use([
  BarChart,
  LineChart,
  ScatterChart,
  AriaComponent,
  BrushComponent,
  GridComponent,
  TooltipComponent,
  CanvasRenderer,
]);

export { echarts };
