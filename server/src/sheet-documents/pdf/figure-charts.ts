import type { CustomSeriesOption } from 'echarts/charts';
import type { EChartsCoreOption } from 'echarts/core';
import { formatNumber, formatSigned, inPrintedUnit } from '../format-quantity.js';
import type { FigureAxis, FigureSeries, SheetFigures } from '../sheet-figures.types.js';
import { sheetStrings } from '../sheet-strings.js';
import { drawChart } from './chart-canvas.js';
import {
  bandLayer,
  beyondLayer,
  gridLayer,
  labelLayer,
  lineLayer,
  pointLayers,
  temperatureRuleLayer,
  type ChartPoint,
  type XY,
} from './chart-layers.js';
import { WORK_SANS } from './print-fonts.js';
import { printPalette } from './print-palette.js';

/** Width of the column at 96 px to the inch. */
export const CHART_WIDTH = 484;
const CHART_MARGINS = { left: 46, right: 12, top: 8, bottom: 26 } as const;
/** Room at the right end of the axis for its title */
const AXIS_TITLE_WIDTH = 40;
const DASHES: readonly (number[] | undefined)[] = [undefined, [6, 3], [2, 2]];

/** Figure 1: diffusivity against temperature, both axes logarithmic. */
export function diffusivityChart(figures: SheetFigures, fitLabel: string, height: number): string {
  const { curve, diffusivityAxis } = figures;
  const line = curve.temperatures.map((T, i): XY => [Math.log(T), Math.log(curve.diffusivities[i] ?? Number.NaN)]);
  const band = (sign: 1 | -1): XY[] =>
    inside(curve, line).map(([x, y], i) => [
      x,
      y + sign * (curve.relativeExpandedUncertainties[curve.firstInside + i] ?? 0),
    ]);
  const middle = line[Math.round(0.3 * curve.firstInside + 0.7 * curve.lastInside)] ?? [0, 0];
  const bottom = Math.log(diffusivityAxis.minimum);
  const places = Math.max(...diffusivityAxis.ticks.map((tick) => decimalsOf(inPrintedUnit('diffusivity', tick))));
  return draw(figures, height, {
    minimum: bottom,
    maximum: Math.log(diffusivityAxis.maximum),
    ticks: diffusivityAxis.ticks.map(Math.log),
    format: (value) => formatNumber(inPrintedUnit('diffusivity', Number(Math.exp(value).toPrecision(9))), places),
    layers: [
      bandLayer(1, band(1), band(-1)),
      ...curveLayers(curve, line),
      ...figures.series.flatMap((series) => pointLayers(series.mark, diffusivityPoints(series))),
      ...figures.series.filter((series) => !series.used).map(leftOutLabel),
      labelLayer(fitLabel, middle[0], middle[1], { dx: 10, dy: 14, colour: printPalette.accent, align: 'left' }),
      labelLayer(sheetStrings.figureKeys.validity, Math.log(validityOf(figures)[0]), bottom, {
        dx: 3,
        dy: -10,
        colour: printPalette.ink2,
        align: 'left',
      }),
    ],
  });
}

/** A series left out is named at its last point. */
function leftOutLabel(series: FigureSeries): CustomSeriesOption {
  const last = series.temperatures.reduce((best, T, i) => (T > (series.temperatures[best] ?? 0) ? i : best), 0);
  const text = sheetStrings.figureKeys.leftOut.replace('{key}', series.key);
  return labelLayer(text, Math.log(series.temperatures[last] ?? 1), Math.log(series.reducedDiffusivities[last] ?? 1), {
    dx: -8,
    dy: -4,
    colour: printPalette.ink2,
    align: 'right',
  });
}

/** Figure 2: deviation of each point from the fit, in percent. */
export function deviationChart(figures: SheetFigures, height: number): string {
  const { curve, deviationAxis } = figures;
  const band = (column: readonly number[], sign: 1 | -1): XY[] =>
    inside(curve, column).map((part, i) => [
      Math.log(curve.temperatures[curve.firstInside + i] ?? Number.NaN),
      100 * Math.expm1(sign * part),
    ]);
  const newLaboratory = curve.relativeNewLaboratory;
  const dotted = { colour: printPalette.accent, width: 1.2, dash: [1.5, 2.5] };
  return draw(figures, height, {
    ...deviationAxis,
    format: (value) => formatSigned(value, Math.max(...deviationAxis.ticks.map(decimalsOf))),
    layers: [
      bandLayer(1, band(curve.relativeExpandedUncertainties, 1), band(curve.relativeExpandedUncertainties, -1)),
      ...(newLaboratory === null
        ? []
        : [lineLayer(2, band(newLaboratory, 1), dotted), lineLayer(2, band(newLaboratory, -1), dotted)]),
      ...figures.estimates.map(({ temperatures, deviations }, i) =>
        lineLayer(
          2,
          temperatures.map((T, j): XY => [Math.log(T), deviations[j] ?? Number.NaN]),
          estimateStroke(i),
        ),
      ),
      ...curveLayers(
        curve,
        curve.temperatures.map((T): XY => [Math.log(T), 0]),
      ),
      ...figures.series.flatMap((series) => deviationLayers(series, deviationAxis)),
    ],
  });
}

/** How the estimate of that number is drawn: full, dashed, dotted. */
export function estimateStroke(index: number): { colour: string; width: number; dash?: number[] } {
  const dash = DASHES[index % DASHES.length];
  const stroke = { colour: printPalette.ink3, width: 1.1 };
  return dash === undefined ? stroke : { ...stroke, dash };
}

interface Plot {
  readonly minimum: number;
  readonly maximum: number;
  readonly ticks: readonly number[];
  readonly format: (value: number) => string;
  readonly layers: readonly CustomSeriesOption[];
}

function draw(figures: SheetFigures, height: number, plot: Plot): string {
  const { temperatureAxis } = figures;
  const [left, right] = [Math.log(temperatureAxis.minimum), Math.log(temperatureAxis.maximum)];
  const label = { color: printPalette.ink2, fontSize: 10.5, hideOverlap: false };
  const option: EChartsCoreOption = {
    animation: false,
    textStyle: { fontFamily: WORK_SANS },
    grid: { ...CHART_MARGINS, containLabel: false },
    xAxis: {
      type: 'value',
      min: left,
      max: right,
      axisLine: { show: true, onZero: false, lineStyle: { color: printPalette.ink, width: 1 } },
      axisTick: {
        show: true,
        customValues: temperatureAxis.ticks.map(Math.log),
        length: 4,
        lineStyle: { color: printPalette.ink },
      },
      axisLabel: {
        ...label,
        customValues: ticksLeftOfTitle(temperatureAxis).map(Math.log),
        formatter: (value: number) => formatNumber(Math.exp(value), 0),
      },
      splitLine: { show: false },
    },
    yAxis: {
      type: 'value',
      min: plot.minimum,
      max: plot.maximum,
      axisLine: { show: false },
      axisTick: { show: false },
      axisLabel: { ...label, customValues: [...plot.ticks], formatter: plot.format },
      splitLine: { show: false },
    },
    series: [
      gridLayer(plot.ticks, left, right),
      ...plot.layers,
      temperatureRuleLayer(...validityOf(figures), plot.minimum),
    ],
  };
  return drawChart(option, CHART_WIDTH, height);
}

function ticksLeftOfTitle(axis: FigureAxis): number[] {
  const width = CHART_WIDTH - CHART_MARGINS.left - CHART_MARGINS.right;
  const place = (T: number): number => (width * Math.log(T / axis.minimum)) / Math.log(axis.maximum / axis.minimum);
  return axis.ticks.filter((tick) => place(tick) < width - AXIS_TITLE_WIDTH);
}

const validityOf = ({ curve }: SheetFigures): [number, number] => [
  curve.temperatures[curve.firstInside] ?? Number.NaN,
  curve.temperatures[curve.lastInside] ?? Number.NaN,
];

const inside = <T>({ firstInside, lastInside }: SheetFigures['curve'], column: readonly T[]): T[] =>
  column.slice(firstInside, lastInside + 1);

/** The fitted line, broken outside the range. */
function curveLayers(curve: SheetFigures['curve'], line: readonly XY[]): CustomSeriesOption[] {
  const broken = { colour: printPalette.accent, width: 1.2, dash: [5, 4] };
  return [
    lineLayer(3, inside(curve, line), { colour: printPalette.accent, width: 1.5 }),
    lineLayer(3, line.slice(0, curve.firstInside + 1), broken),
    lineLayer(3, line.slice(curve.lastInside), broken),
  ];
}

function diffusivityPoints(series: FigureSeries): ChartPoint[] {
  const leftOut = new Set(series.leftOut);
  return series.temperatures.map((T, i) => {
    const y = Math.log(series.reducedDiffusivities[i] ?? Number.NaN);
    const u = series.relativeUncertainties[i] ?? 0;
    return { x: Math.log(T), y, low: y - u, high: y + u, isOpen: leftOut.has(i) };
  });
}

function deviationLayers(series: FigureSeries, axis: FigureAxis): CustomSeriesOption[] {
  const leftOut = new Set(series.leftOut);
  const points = series.temperatures.map((T, i): ChartPoint => {
    const y = series.deviations[i] ?? Number.NaN;
    const u = 100 * (series.relativeUncertainties[i] ?? 0);
    const low = Math.max(axis.minimum, y - u);
    return { x: Math.log(T), y, low, high: Math.min(axis.maximum, y + u), isOpen: leftOut.has(i) };
  });
  const isInside = ({ y }: ChartPoint): boolean => y >= axis.minimum && y <= axis.maximum;
  const beyond = (isAbove: boolean) =>
    points
      .filter(({ y }) => (isAbove ? y > axis.maximum : y < axis.minimum))
      .sort((a, b) => a.x - b.x)
      .map(({ x, y }) => ({ x, edge: isAbove ? axis.maximum : axis.minimum, isAbove, text: formatSigned(y, 1) }));
  return [
    ...pointLayers(series.mark, points.filter(isInside)),
    beyondLayer(series.mark, beyond(true)),
    beyondLayer(series.mark, beyond(false)),
  ];
}

function decimalsOf(value: number): number {
  const [mantissa = '', exponent = '0'] = Number(value.toPrecision(6)).toExponential().split('e');
  return Math.max(0, (mantissa.split('.')[1] ?? '').length - Number(exponent));
}
