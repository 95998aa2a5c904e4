import type { CustomSeriesOption } from 'echarts/charts';
import { printPalette, seriesMark, temperatureColour } from './print-palette.js';

/** An element of a chart, as a custom series of ECharts takes it. */
type ChartElement = ReturnType<NonNullable<CustomSeriesOption['renderItem']>>;

/** Pixel of a point given in the coordinates of the axes. */
export type Place = (x: number, y: number) => [number, number];
export type XY = readonly [number, number];

/** A layer of one element for each index; `clip` keeps it inside the axes. */
function layer(
  z: number,
  count: number,
  clip: boolean,
  element: (index: number, place: Place) => ChartElement,
): CustomSeriesOption {
  return {
    type: 'custom',
    silent: true,
    animation: false,
    z,
    clip,
    data: Array.from({ length: count }, (_, i) => [i, i]),
    renderItem: ({ dataIndex }, api) =>
      element(dataIndex, (x, y) => {
        const [px = Number.NaN, py = Number.NaN] = api.coord([x, y]);
        return [px, py];
      }),
  };
}

interface Stroke {
  readonly colour: string;
  readonly width: number;
  readonly dash?: number[];
}

export const lineLayer = (z: number, points: readonly XY[], { colour, width, dash }: Stroke): CustomSeriesOption =>
  layer(z, 1, true, (_, place) => ({
    type: 'polyline',
    shape: { points: points.map(([x, y]) => place(x, y)) },
    style: { stroke: colour, lineWidth: width, fill: 'none', lineDash: dash ?? false },
  }));

/** The area between an upper and a lower line. */
export const bandLayer = (z: number, upper: readonly XY[], lower: readonly XY[]): CustomSeriesOption =>
  layer(z, 1, true, (_, place) => ({
    type: 'polygon',
    shape: { points: [...upper, ...[...lower].reverse()].map(([x, y]) => place(x, y)) },
    style: { fill: printPalette.band },
  }));

/** Horizontal hairlines at the figures of the vertical axis. */
export const gridLayer = (values: readonly number[], minimum: number, maximum: number): CustomSeriesOption =>
  layer(0, values.length, false, (i, place) => {
    const [x1, y1] = place(minimum, values[i] ?? Number.NaN);
    const [x2] = place(maximum, values[i] ?? Number.NaN);
    return { type: 'line', shape: { x1, y1, x2, y2: y1 }, style: { stroke: printPalette.rule, lineWidth: 1 } };
  });

const RULE_HEIGHT = 5;
const RULE_STEPS = 40;

/** The temperature rule: the axis coloured by temperature, only where the correlation holds. */
export function temperatureRuleLayer(minimum: number, maximum: number, bottom: number): CustomSeriesOption {
  const edge = (i: number): number => minimum + ((maximum - minimum) * i) / RULE_STEPS;
  return layer(6, RULE_STEPS, false, (i, place) => {
    const [x, y] = place(Math.log(edge(i)), bottom);
    const [end] = place(Math.log(edge(i + 1)), bottom);
    return {
      type: 'rect',
      // A hair of overlap, else the page shines through between two steps.
      shape: { x, y: y - RULE_HEIGHT / 2, width: end - x + 0.4, height: RULE_HEIGHT },
      style: { fill: temperatureColour(edge(i + 0.5)) },
    };
  });
}

export interface ChartPoint {
  readonly x: number;
  readonly y: number;
  /** Ends of the bar ±u */
  readonly low: number;
  readonly high: number;
  readonly isOpen: boolean;
}

const RADIUS = 3.2;

/** Points of a series above their bars; a bar that its point would hide is left away. */
export function pointLayers(mark: number, points: readonly ChartPoint[]): CustomSeriesOption[] {
  const { colour, path } = seriesMark(mark);
  const bars = layer(4, points.length, true, (i, place) => {
    const point = points[i];
    if (point === undefined) return null;
    const [x1, y1] = place(point.x, point.low);
    const [, y2] = place(point.x, point.high);
    if (Math.abs(y2 - y1) / 2 < RADIUS + 1.5) return null;
    return { type: 'line', shape: { x1, y1, x2: x1, y2 }, style: { stroke: colour, lineWidth: 1, opacity: 0.75 } };
  });
  const marks = layer(5, points.length, false, (i, place) => {
    const point = points[i];
    if (point === undefined) return null;
    const [x, y] = place(point.x, point.y);
    const style = point.isOpen
      ? { fill: printPalette.paper, stroke: colour, lineWidth: 1.3, strokeNoScale: true }
      : { fill: colour, stroke: printPalette.paper, lineWidth: 0.7, strokeNoScale: true };
    return { type: 'path', shape: { pathData: path }, x, y, scaleX: RADIUS, scaleY: RADIUS, style };
  });
  return [bars, marks];
}

/** Room that the value of a point beyond the scale takes, px */
const BEYOND_LABEL_WIDTH = 34;

/**
 * Points beyond the scale on one side, ascending in x: an arrow in their colour at the edge, and the value to its right where the
 * next arrow leaves room for it.
 */
export const beyondLayer = (
  mark: number,
  points: readonly { readonly x: number; readonly edge: number; readonly isAbove: boolean; readonly text: string }[],
): CustomSeriesOption =>
  layer(5, points.length, false, (i, place) => {
    const point = points[i];
    if (point === undefined) return null;
    const [x, edge] = place(point.x, point.edge);
    // Clear of the temperature rule, which lies on the lower edge.
    const y = point.isAbove ? edge : edge - RULE_HEIGHT;
    const next = points[i + 1];
    const hasRoom = next === undefined || place(next.x, next.edge)[0] - x > BEYOND_LABEL_WIDTH;
    const down = point.isAbove ? 7 : -7;
    const { colour } = seriesMark(mark);
    return {
      type: 'group',
      children: [
        {
          type: 'polygon',
          shape: {
            points: [
              [x, y],
              [x + 4, y + down],
              [x - 4, y + down],
            ],
          },
          style: { fill: printPalette.paper, stroke: colour, lineWidth: 1.2 },
        },
        {
          type: 'text',
          x: x + 7,
          y: y + down / 2,
          style: { text: hasRoom ? point.text : '', fill: printPalette.ink2, fontSize: 10, verticalAlign: 'middle' },
        },
      ],
    };
  });

/** A word at a point, moved by so many pixels. */
export const labelLayer = (
  text: string,
  x: number,
  y: number,
  {
    dx,
    dy,
    colour,
    align,
  }: { readonly dx: number; readonly dy: number; readonly colour: string; readonly align: 'left' | 'right' },
): CustomSeriesOption =>
  layer(7, 1, false, (_, place) => {
    const [px, py] = place(x, y);
    return {
      type: 'text',
      x: px + dx,
      y: py + dy,
      style: { text, fill: colour, fontSize: 10.5, align, verticalAlign: 'middle' },
    };
  });
