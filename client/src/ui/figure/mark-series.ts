import type { CustomSeriesOption, LineSeriesOption, ScatterSeriesOption } from 'echarts/charts';
import { formatSigned } from '../../lib/format-quantity';
import { temperatureColour } from '../temperature-ramp';
import { seriesMark } from '../theme/palette';
import { isNarrow, pointRadius, scaled, type PanelBox } from './layout';
import { type Look } from './look';
import {
  type AxisSpec,
  type BandMark,
  type ExtentMark,
  type FigurePoint,
  type LabelMark,
  type LineMark,
  type LineStyle,
  type Mark,
  type PointsMark,
} from './spec';

/** One panel, ready to be drawn in. */
export interface Panel {
  readonly index: number;
  readonly x: AxisSpec;
  readonly y: AxisSpec;
  readonly box: PanelBox;
  readonly width: number;
  readonly look: Look;
}

type Series = CustomSeriesOption | LineSeriesOption | ScatterSeriesOption;
type Pixel = readonly [number, number];

/** Drawing order: grid, band, estimates, fit, bars, points, words. */
const LAYER = { grid: 0, band: 1, line: 2, bar: 3, point: 4, word: 5, rule: 6 } as const;

const common = (panel: Panel, z: number) =>
  ({ xAxisIndex: panel.index, yAxisIndex: panel.index, silent: true, animation: false, z }) as const;

/** What ECharts draws for one mark. */
export function markSeries(mark: Mark, panel: Panel): Series[] {
  switch (mark.kind) {
    case 'line':
      return [line(mark, panel)];
    case 'band':
      return [band(mark, panel)];
    case 'points':
      return points(mark, panel);
    case 'extent':
      return [extent(mark, panel)];
    case 'label':
      return mark.wideOnly && isNarrow(panel.width) ? [] : [label(mark, panel)];
  }
}

/** Shapes placed by hand, at data coordinates, within one custom series. */
function shapes(
  panel: Panel,
  z: number,
  clip: boolean,
  draw: (at: (x: number, y: number) => Pixel) => object[],
): CustomSeriesOption {
  return {
    ...common(panel, z),
    type: 'custom',
    clip,
    // One item: the whole group is drawn at once.
    data: [[scaled(panel.x, panel.x.min), scaled(panel.y, panel.y.min)]],
    renderItem: (_params, api) => {
      const at = (x: number, y: number): Pixel => {
        const [left = 0, top = 0] = api.coord([scaled(panel.x, x), scaled(panel.y, y)]);
        return [left, top];
      };
      return { type: 'group', children: draw(at) } as ReturnType<NonNullable<CustomSeriesOption['renderItem']>>;
    },
  };
}

const segment = ([x1, y1]: Pixel, [x2, y2]: Pixel, style: object) => ({
  type: 'line',
  shape: { x1, y1, x2, y2 },
  style,
});

export const gridLines = (panel: Panel): CustomSeriesOption =>
  shapes(panel, LAYER.grid, false, (at) =>
    (panel.y.bare ? [] : panel.y.ticks).map((tick) => {
      const [, y] = at(panel.x.min, tick);
      const crisp = Math.round(y) + 0.5;
      return segment([panel.box.left, crisp], [panel.box.right, crisp], { stroke: panel.look.rule, lineWidth: 1 });
    }),
  );

function lineStyle(style: LineStyle, look: Look): NonNullable<LineSeriesOption['lineStyle']> {
  switch (style) {
    case 'fit':
      return { color: look.accent, width: 1.5 };
    case 'outside':
      return { color: look.accent, width: 1.4, type: [5, 4] };
    case 'prediction':
      return { color: look.accent, width: 1, type: [1, 3.5], cap: 'round' };
    case 'estimate1':
      return { color: look.ink3, width: 1.2 };
    case 'estimate2':
      return { color: look.ink3, width: 1.2, type: [7, 4] };
    case 'estimate3':
      return { color: look.ink3, width: 1.2, type: [2, 3] };
    case 'zero':
      return { color: look.ink, width: 1 };
  }
}

const line = (mark: LineMark, panel: Panel): LineSeriesOption => ({
  ...common(panel, LAYER.line),
  type: 'line',
  symbol: 'none',
  clip: true,
  data: mark.points.map(([x, y]) => [scaled(panel.x, x), scaled(panel.y, y)]),
  lineStyle: lineStyle(mark.style, panel.look),
});

function band(mark: BandMark, panel: Panel): CustomSeriesOption {
  const { look } = panel;
  const style = {
    recommended: { fill: look.band },
    older: { fill: look.ink3, opacity: 0.16 },
    tint: { fill: look.band, opacity: 0.55 },
  }[mark.tone];
  return shapes(panel, LAYER.band, true, (at) => {
    const upper = mark.x.map((x, i) => at(x, mark.high[i] ?? NaN));
    const lower = mark.x.map((x, i) => at(x, mark.low[i] ?? NaN)).reverse();
    return [{ type: 'polygon', shape: { points: [...upper, ...lower] }, style }];
  });
}

const isBeyond = (point: FigurePoint, { y }: Panel) => point.y < y.min || point.y > y.max;

function points(mark: PointsMark, panel: Panel): Series[] {
  const within = mark.points.filter((point) => !isBeyond(point, panel));
  const beyond = mark.points.filter((point) => isBeyond(point, panel));
  const series: Series[] = [bars(mark, within, panel)];
  for (const open of [false, true]) {
    const some = within.filter((point) => (point.open ?? false) === open);
    if (some.length > 0) series.push(symbols(mark.series, some, open, panel));
  }
  if (beyond.length > 0) series.push(arrows(mark.series, beyond, panel));
  return series;
}

function bars(mark: PointsMark, within: readonly FigurePoint[], panel: Panel): CustomSeriesOption {
  const style = { stroke: panel.look.series(mark.series), lineWidth: 1.1, opacity: 0.75 };
  const radius = pointRadius(panel.width);
  return shapes(panel, LAYER.bar, true, (at) =>
    within.flatMap((point) => {
      if (point.low === undefined || point.high === undefined) return [];
      const low = at(point.x, Math.max(point.low, panel.y.min));
      const high = at(point.x, Math.min(point.high, panel.y.max));
      const hidden = Math.abs(low[1] - high[1]) / 2 <= radius + 2;
      return mark.bars === 'visible' && hidden ? [] : [segment(low, high, style)];
    }),
  );
}

function symbols(index: number, some: readonly FigurePoint[], open: boolean, panel: Panel): ScatterSeriesOption {
  const { path, box } = seriesMark(index);
  const radius = pointRadius(panel.width);
  const colour = panel.look.series(index);
  return {
    ...common(panel, LAYER.point),
    type: 'scatter',
    symbol: `path://${path}`,
    symbolSize: [box[0] * radius, box[1] * radius],
    data: some.map((point) => [scaled(panel.x, point.x), scaled(panel.y, point.y)]),
    // A rim of paper parts points that overlap.
    itemStyle: open
      ? { color: panel.look.paper, borderColor: colour, borderWidth: 1.3, opacity: 1 }
      : { color: colour, borderColor: panel.look.paper, borderWidth: 0.6, opacity: 1 },
  };
}

/** Points beyond the scale: an arrow in their colour at the edge, the value at its right. */
function arrows(index: number, beyond: readonly FigurePoint[], panel: Panel): CustomSeriesOption {
  const colour = panel.look.series(index);
  return shapes(panel, LAYER.point, false, (at) =>
    beyond.flatMap((point) => {
      const above = point.y > panel.y.max;
      const [x] = at(point.x, panel.y.min);
      const tip = above ? panel.box.top + 1 : panel.box.bottom - 1;
      const base = tip + (above ? 8 : -8);
      const fill = point.open ? panel.look.paper : colour;
      return [
        {
          type: 'polygon',
          shape: {
            points: [
              [x, tip],
              [x + 4.6, base],
              [x - 4.6, base],
            ],
          },
          style: { fill, stroke: colour, lineWidth: 1.3 },
        },
        {
          type: 'text',
          style: {
            x: x + 8,
            y: above ? tip + 1 : tip - 12,
            text: formatSigned(point.y, 1),
            fill: panel.look.ink2,
            fontSize: 12.5,
          },
        },
      ];
    }),
  );
}

const label = (mark: LabelMark, panel: Panel): CustomSeriesOption =>
  shapes(panel, LAYER.word, false, (at) => {
    const [x, y] = at(mark.x, mark.y);
    const style = {
      x: x + mark.dx,
      y: y + mark.dy,
      text: mark.text,
      align: mark.anchor,
      verticalAlign: 'middle',
      fontSize: 12.5,
      fontWeight: mark.tone === 'accent' ? 500 : 400,
      fill: mark.tone === 'accent' ? panel.look.accent : panel.look.ink2,
    };
    return [{ type: 'text', style }];
  });

const extent = (mark: ExtentMark, panel: Panel): CustomSeriesOption =>
  shapes(panel, LAYER.line, true, (at) => {
    const [start, y] = at(mark.low, mark.y);
    const [end] = at(mark.high, mark.y);
    if (!mark.open) return rampPieces(mark, panel, at, y, 3);
    return [segment([start, y], [end, y], { stroke: panel.look.ink3, lineWidth: 1, lineDash: [3, 3] })];
  });

/** The temperature rule on the axis: coloured only where the correlation holds. */
export const temperatureBand = (
  range: { readonly low: number; readonly high: number },
  panel: Panel,
): CustomSeriesOption => shapes(panel, LAYER.rule, false, (at) => rampPieces(range, panel, at, panel.box.bottom, 5));

const RULE_STEPS = 48;

/** A horizontal band in the colours of its temperatures. */
function rampPieces(
  range: { readonly low: number; readonly high: number },
  panel: Panel,
  at: (x: number, y: number) => Pixel,
  y: number,
  height: number,
): object[] {
  return Array.from({ length: RULE_STEPS }, (_, i) => {
    const from = range.low + ((range.high - range.low) * i) / RULE_STEPS;
    const to = range.low + ((range.high - range.low) * (i + 1)) / RULE_STEPS;
    const [start] = at(from, panel.y.min);
    const [end] = at(to, panel.y.min);
    return {
      type: 'rect',
      shape: { x: start, y: y - height / 2, width: end - start + 0.6, height },
      style: { fill: temperatureColour((from + to) / 2, panel.look.edition) },
    };
  });
}
