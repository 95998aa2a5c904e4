import { CustomChart, LineChart, ScatterChart } from 'echarts/charts';
import { GridComponent } from 'echarts/components';
import { init, use as register, type EChartsCoreOption } from 'echarts/core';
import { SVGRenderer } from 'echarts/renderers';

// This file and ECharts with it are loaded when the first figure comes near the screen.
register([CustomChart, LineChart, ScatterChart, GridComponent, SVGRenderer]);

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** Draws into an element; call the answer to take the drawing away. */
export function drawChart(element: HTMLElement, option: EChartsCoreOption, size: Size): () => void {
  const chart = init(element, null, { renderer: 'svg', ...size });
  chart.setOption(option);
  return () => chart.dispose();
}

/** The same drawing as the text of an SVG file. */
export function chartSvg(option: EChartsCoreOption, size: Size): string {
  const chart = init(null, null, { renderer: 'svg', ssr: true, ...size });
  try {
    chart.setOption(option);
    return chart.renderToSVGString();
  } finally {
    chart.dispose();
  }
}
