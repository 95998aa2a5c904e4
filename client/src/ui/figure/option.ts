import type { EChartsCoreOption } from 'echarts/core';
import { type TextRun } from '../../lib/typeset';
import { chartFontFamily } from '../theme/palette';
import { figureLayout, isNarrow, scaled, type PanelBox } from './layout';
import { type Look } from './look';
import { gridLines, markSeries, temperatureBand, type Panel } from './mark-series';
import { type AxisSpec, type FigureSpec } from './spec';

/** What ECharts draws for a figure of this width in these colours. It is drawn still: pointer and keys are the frame's. */
export function figureOption(spec: FigureSpec, width: number, look: Look): EChartsCoreOption {
  const layout = figureLayout(spec, width);
  const x = spec.x(width);
  const last = spec.panels.length - 1;
  const panels = spec.panels.map((panel, index): Panel => ({
    index,
    x,
    y: panel.y,
    box: layout.panels[index]!,
    width,
    look,
  }));
  return {
    animation: false,
    backgroundColor: 'transparent',
    textStyle: { fontFamily: chartFontFamily },
    grid: layout.panels.map((box) => gridOf(box, width, layout.height)),
    xAxis: panels.map((panel) => xAxis(panel, panel.index === last)),
    yAxis: panels.map(yAxis),
    series: [
      ...panels.map(gridLines),
      ...panels.flatMap((panel) => spec.panels[panel.index]!.marks.flatMap((mark) => markSeries(mark, panel))),
      ...(spec.temperatureRule ? [temperatureBand(spec.temperatureRule, panels[last]!)] : []),
    ],
  };
}

const gridOf = ({ left, right, top, bottom }: PanelBox, width: number, height: number) => ({
  left,
  right: width - right,
  top,
  bottom: height - bottom,
  containLabel: false,
  outerBoundsMode: 'none',
});

const fontSize = (width: number) => (isNarrow(width) ? 12 : 12.5);

function xAxis({ index, x, look, width }: Panel, isLast: boolean) {
  return {
    ...axis(x, look, width),
    gridIndex: index,
    axisLine: { show: true, onZero: false, lineStyle: { color: look.ink, width: 1 } },
    axisTick: {
      show: true,
      customValues: x.ticks.map((tick) => scaled(x, tick)),
      length: isLast ? 5 : 4,
      lineStyle: { color: look.ink },
    },
    axisLabel: { ...labels(x, look, width), show: isLast, margin: 9 },
    ...(isLast ? { name: rich(x.title), nameLocation: 'end', nameGap: 0 } : {}),
    nameTextStyle: { ...titleStyle(look), align: 'right', verticalAlign: 'top', padding: [10, 0, 0, 0] },
  };
}

function yAxis({ index, y, look, width, box }: Panel) {
  return {
    ...axis(y, look, width),
    gridIndex: index,
    axisLine: { show: false },
    axisTick: { show: false },
    axisLabel: { ...labels(y, look, width), margin: 10 },
    name: rich(y.title),
    nameLocation: 'end',
    nameGap: 14,
    nameTextStyle: { ...titleStyle(look), align: 'left', padding: [0, 0, 0, -box.left] },
  };
}

const axis = (spec: AxisSpec, look: Look, width: number) => ({
  type: 'value',
  min: scaled(spec, spec.min),
  max: scaled(spec, spec.max),
  splitLine: { show: false },
  silent: true,
  nameTruncate: { maxWidth: width },
  axisLine: { lineStyle: { color: look.ink } },
});

const labels = (spec: AxisSpec, look: Look, width: number) => ({
  customValues: spec.ticks.map((tick) => scaled(spec, tick)),
  formatter: (value: number) => spec.format(nearest(spec, value)),
  color: look.ink2,
  fontSize: fontSize(width),
  hideOverlap: true,
});

/** The tick that a value of the chart's own scale stands for: exp(ln x) is not x to the last digit. */
const nearest = (spec: AxisSpec, value: number): number =>
  spec.ticks.reduce((best, tick) =>
    Math.abs(scaled(spec, tick) - value) < Math.abs(scaled(spec, best) - value) ? tick : best,
  );

const STYLE_KEY = { PLAIN: 'r', STRONG: 'b', QUANTITY: 'q', SUBSCRIPT: 'l', SUPERSCRIPT: 'h' } as const;

/** Runs in the mark-up of a rich label. */
const rich = (runs: readonly TextRun[]): string =>
  runs.map(({ text, style }) => `{${STYLE_KEY[style]}|${text}}`).join('');

function titleStyle(look: Look) {
  const base = { fontSize: 13, color: look.ink, fontFamily: chartFontFamily };
  return {
    ...base,
    rich: {
      r: base,
      b: { ...base, fontWeight: 600 },
      q: { ...base, fontStyle: 'italic' },
      l: { ...base, fontSize: 9.5, verticalAlign: 'bottom' },
      h: { ...base, fontSize: 9.5, verticalAlign: 'top' },
    },
  };
}
