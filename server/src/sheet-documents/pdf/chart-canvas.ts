import { CustomChart, LineChart } from 'echarts/charts';
import { GridComponent } from 'echarts/components';
import * as echarts from 'echarts/core';
import { SVGRenderer } from 'echarts/renderers';
import { WORK_SANS, openFont } from './print-fonts.js';

echarts.use([LineChart, CustomChart, GridComponent, SVGRenderer]);

/** Node has no canvas to measure text on; without widths, labels would be placed by a guess. */
function measureWithFontkit(): void {
  const [regular, semibold] = [openFont(WORK_SANS, 400), openFont(WORK_SANS, 600)];
  echarts.setPlatformAPI({
    measureText: (text, css = '12px') => {
      const font = /\b(bold|[6-9]00)\b/.test(css) ? semibold : regular;
      const size = Number.parseFloat(/([\d.]+)px/.exec(css)?.[1] ?? '12');
      return { width: (font.layout(text).advanceWidth / font.unitsPerEm) * size };
    },
  });
}
let canMeasure = false;

/** A chart as an SVG text, drawn without a browser. Sizes in px. */
export function drawChart(option: echarts.EChartsCoreOption, width: number, height: number): string {
  if (!canMeasure) measureWithFontkit();
  canMeasure = true;
  const chart = echarts.init(null, null, { renderer: 'svg', ssr: true, width, height });
  try {
    chart.setOption(option);
    return chart.renderToSVGString();
  } finally {
    chart.dispose();
  }
}
