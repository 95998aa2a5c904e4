import { formatShort, formatSigned, withUnit } from '../../lib/format-quantity';
import { fill } from '../../lib/fill';
import { type TextRun, typeset } from '../../lib/typeset';
import { fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import {
  type AxisSpec,
  type FigurePoint,
  type FigureSpec,
  type LineMark,
  type LineStyle,
  type Mark,
  type PanelSpec,
} from '../../ui/figure/spec';
import { readerTicks, roundTicks } from '../../ui/figure/ticks';
import { deviationRange, logRange, type Range } from './figure-ranges';
import { type PairPoint, type PairSeries } from './pair-series';

const words = fitStrings.picture;
const ESTIMATES = ['estimate1', 'estimate2', 'estimate3'] as const;

export const estimateStyle = (index: number): LineStyle & `estimate${number}` => ESTIMATES[index % ESTIMATES.length]!;

/** The fit along the temperature axis at P0, SI; both half-widths expanded. */
export interface Curve {
  readonly temperatures: readonly number[];
  readonly diffusivities: readonly number[];
  readonly expandedUncertainties: readonly number[];
  readonly newLaboratory: readonly number[] | null;
  /** K: where the correlation holds. */
  readonly low: number;
  readonly high: number;
}

export interface EstimateLine {
  readonly temperatures: readonly number[];
  readonly diffusivities: readonly number[];
}

export type LowerView = 'deviations' | 'residuals';

export interface Picture {
  readonly series: readonly PairSeries[];
  readonly curve: Curve | null;
  readonly estimates: readonly EstimateLine[];
  readonly temperatures: Range;
  /** Pa */
  readonly referencePressure: number;
  readonly view: LowerView;
}

/** Three panels on one temperature axis: D brought to P0, deviations or residuals, and coverage. */
export function workspaceFigure(picture: Picture, units: ReaderUnits): FigureSpec {
  const { curve, view } = picture;
  const lower = curve === null ? [] : [view === 'deviations' ? deviationPanel(picture, curve) : residualPanel(picture)];
  return {
    x: temperatureAxis(picture.temperatures, units),
    panels: [diffusivityPanel(picture, units), ...lower, coveragePanel(picture.series)],
    ...(curve === null ? {} : { temperatureRule: { low: curve.low, high: curve.high } }),
  };
}

export const temperatureAxis =
  (range: Range, units: ReaderUnits) =>
  (width: number): AxisSpec => {
    const most = Math.max(3, Math.floor((width - 120) / 72));
    // The right end is the axis title's.
    const end = range.min + (range.max - range.min) * (1 - 56 / width);
    return {
      ...range,
      logarithmic: true,
      ticks: readerTicks('temperature', range, units.temperature, most).filter((tick) => tick < end),
      format: (kelvin) => formatShort(fromSi('temperature', kelvin, units.temperature), 5),
      title: typeset(words.temperatureAxis, { unit: unitLabel('temperature', units.temperature) }),
    };
  };

/** On the axis m²/s is scaled by 10⁻⁶, so that its figures can be read. */
const AXIS_POWER = { m2_s: 1e6, cm2_s: 1, mm2_s: 1 } as const;

export function diffusivityUnit(units: ReaderUnits): string {
  return units.diffusivity === 'm2_s'
    ? '10^{−6} m^{2}/s'
    : unitLabel('diffusivity', units.diffusivity).replace('²', '^{2}');
}

export const pressureWords = (pressure: number, units: ReaderUnits): string =>
  withUnit(formatShort(fromSi('pressure', pressure, units.pressure)), unitLabel('pressure', units.pressure));

function diffusivityPanel(
  { series, curve, estimates, temperatures, referencePressure }: Picture,
  units: ReaderUnits,
): PanelSpec {
  const points = series.flatMap((one) => one.points);
  const range = logRange([...points.flatMap(barOf), ...(curve?.diffusivities ?? [])], 0.05);
  const y: AxisSpec = {
    ...range,
    logarithmic: true,
    ticks: readerTicks('diffusivity', { ...range, logarithmic: true }, units.diffusivity, 6),
    format: (value) => formatShort(fromSi('diffusivity', value, units.diffusivity) * AXIS_POWER[units.diffusivity], 4),
    title: diffusivityTitle(referencePressure, units),
  };
  const marks: Mark[] = [
    ...(curve === null ? [] : [band(curve, (D, U) => [D - U, D + U])]),
    ...estimates.map((estimate, i): LineMark => ({
      kind: 'line',
      style: estimateStyle(i),
      points: zip(estimate.temperatures, estimate.diffusivities),
    })),
    ...(curve === null ? [] : fitLines(curve)),
    ...series.map((one): Mark => ({
      kind: 'points',
      series: one.mark,
      bars: 'visible',
      points: one.points.map((point) => place(point, point.reduced, barOf(point))),
    })),
    ...leftOutNames(series, temperatures),
  ];
  return { height: (width) => (width < 480 ? 290 : width < 700 ? 340 : 384), y, marks };
}

function diffusivityTitle(pressure: number, units: ReaderUnits): TextRun[] {
  return typeset(
    fill(words.diffusivityAxis, { unit: diffusivityUnit(units), pressure: pressureWords(pressure, units) }),
  );
}

const barOf = ({ reduced, relativeUncertainty: u }: PairPoint): readonly [number, number] => [
  reduced * Math.exp(-u),
  reduced * Math.exp(u),
];

function place(point: PairPoint, y: number, bar: readonly [number, number] | null): FigurePoint {
  const ends = bar === null || point.relativeUncertainty === 0 ? {} : { low: bar[0], high: bar[1] };
  return { id: point.id, x: point.temperature, y, open: point.open, ...ends };
}

const isInside = (curve: Curve, T: number): boolean => T >= curve.low * (1 - 1e-9) && T <= curve.high * (1 + 1e-9);

/** A tint where the correlation holds. */
function band(curve: Curve, ends: (D: number, U: number) => readonly [number, number]): Mark {
  const inside = curve.temperatures.flatMap((T, i) => (isInside(curve, T) ? [i] : []));
  const both = inside.map((i) => ends(curve.diffusivities[i]!, curve.expandedUncertainties[i]!));
  return {
    kind: 'band',
    tone: 'recommended',
    x: inside.map((i) => curve.temperatures[i]!),
    low: both.map(([low]) => low),
    high: both.map(([, high]) => high),
  };
}

/** The fit, broken outside its range. */
function fitLines(curve: Curve): LineMark[] {
  const all = zip(curve.temperatures, curve.diffusivities);
  const first = all.findIndex(([T]) => isInside(curve, T));
  const last = all.findLastIndex(([T]) => isInside(curve, T));
  const parts: LineMark[] = [
    { kind: 'line', style: 'fit', points: all.slice(first, last + 1) },
    { kind: 'line', style: 'outside', points: all.slice(0, first + 1) },
    { kind: 'line', style: 'outside', points: all.slice(last) },
  ];
  return parts.filter((part) => part.points.length > 1);
}

/** Series that are left out are named at their last point. */
function leftOutNames(series: readonly PairSeries[], { min, max }: Range): Mark[] {
  return series.flatMap((one): Mark[] => {
    const last = one.points.reduce<PairPoint | null>(
      (a, b) => (a === null || b.temperature > a.temperature ? b : a),
      null,
    );
    if (one.carriesWeight || last === null) return [];
    const right = last.temperature > min + 0.8 * (max - min);
    const text = `${one.letter}, ${one.status === 'ACCEPTED' ? words.out : words.waiting}`;
    return [
      {
        kind: 'label',
        text,
        tone: 'note',
        anchor: right ? 'right' : 'left',
        x: last.temperature,
        y: last.reduced,
        dx: right ? -10 : 9,
        // Above or below the line, where the series itself is.
        dy: (last.deviation ?? 0) < 0 ? 13 : -8,
        wideOnly: true,
      },
    ];
  });
}

function deviationPanel({ series, temperatures }: Picture, curve: Curve): PanelSpec {
  const percent = (point: PairPoint): readonly [number, number] => {
    const [value, u] = [100 * (point.deviation ?? 0), 100 * point.relativeUncertainty];
    return [value - u, value + u];
  };
  const carried = series.flatMap((one) => one.points.filter((point) => !point.open && point.deviation !== null));
  const leftOut = series.flatMap((one) =>
    one.points.flatMap((point) => (point.open && point.deviation !== null ? [100 * point.deviation] : [])),
  );
  const relative = (half: readonly number[]) => half.map((value, i) => (100 * value) / curve.diffusivities[i]!);
  const inside = (values: readonly number[]) => values.filter((_, i) => isInside(curve, curve.temperatures[i]!));
  const range = deviationRange(
    [...carried.flatMap(percent), ...inside(relative(curve.expandedUncertainties))],
    1,
    leftOut,
  );
  const predicted = curve.newLaboratory === null ? [] : inside(relative(curve.newLaboratory));
  const x = inside(curve.temperatures);
  const marks: Mark[] = [
    band(curve, (D, U) => [(-100 * U) / D, (100 * U) / D]),
    ...(predicted.length === 0
      ? []
      : [1, -1].map((sign): LineMark => ({
          kind: 'line',
          style: 'prediction',
          points: zip(
            x,
            predicted.map((value) => sign * value),
          ),
        }))),
    {
      kind: 'line',
      style: 'fit',
      points: [
        [temperatures.min, 0],
        [temperatures.max, 0],
      ],
    },
    ...series.map((one): Mark => ({
      kind: 'points',
      series: one.mark,
      bars: 'all',
      points: one.points.flatMap((point) =>
        point.deviation === null ? [] : [place(point, 100 * point.deviation, percent(point))],
      ),
    })),
  ];
  return { height: lowerHeight, y: aboutZero(range, words.deviationAxis), marks };
}

const lowerHeight = (width: number) => (width < 480 ? 220 : 236);

export function aboutZero(range: Range, title: string, values: Readonly<Record<string, string>> = {}): AxisSpec {
  return {
    ...range,
    ticks: roundTicks(range.min, range.max, 5),
    format: (value) => (value === 0 ? '0' : (value > 0 ? '+' : '') + formatShort(value, 4)),
    title: typeset(fill(title, values)),
  };
}

function residualPanel({ series, temperatures }: Picture): PanelSpec {
  const carried = series.flatMap((one) =>
    one.points.flatMap((point) => (point.open || point.residual === null ? [] : [point.residual])),
  );
  const leftOut = series.flatMap((one) =>
    one.points.flatMap((point) => (point.open && point.residual !== null ? [point.residual] : [])),
  );
  const marks: Mark[] = [
    { kind: 'band', tone: 'tint', x: [temperatures.min, temperatures.max], low: [-2, -2], high: [2, 2] },
    {
      kind: 'line',
      style: 'fit',
      points: [
        [temperatures.min, 0],
        [temperatures.max, 0],
      ],
    },
    ...series.map((one): Mark => ({
      kind: 'points',
      series: one.mark,
      bars: 'all',
      points: one.points.flatMap((point) => (point.residual === null ? [] : [place(point, point.residual, null)])),
    })),
  ];
  return { height: lowerHeight, y: aboutZero(deviationRange(carried, 2.6, leftOut), words.residualAxis), marks };
}

const ROW = 19;

/** One line a series: how far it reaches, and its points. */
function coveragePanel(series: readonly PairSeries[]): PanelSpec {
  const rows = series.map((_, i) => -i);
  const y: AxisSpec = {
    min: -series.length + 0.2,
    max: 0.8,
    ticks: rows,
    format: (row) => series[-row]?.letter ?? '',
    title: typeset(words.coverageAxis),
    bare: true,
  };
  const marks = series.flatMap((one, i): Mark[] => [
    { kind: 'extent', y: -i, low: one.temperatureMinimum, high: one.temperatureMaximum, open: !one.carriesWeight },
    { kind: 'points', series: one.mark, bars: 'all', points: one.points.map((point) => place(point, -i, null)) },
  ]);
  return { height: () => 30 + 28 + ROW * series.length, y, marks };
}

const zip = (xs: readonly number[], ys: readonly number[]): (readonly [number, number])[] =>
  xs.map((x, i) => [x, ys[i]!] as const);

/** What the picture shows, as a table in the reader's units. */
export function workspaceTable({ series }: Pick<Picture, 'series'>, units: ReaderUnits) {
  const head = Object.entries(words.columns).map(([name, column]) => {
    const quantity = name === 'temperature' || name === 'pressure' ? name : 'diffusivity';
    return fill(column, { unit: unitLabel(quantity, units[quantity]) });
  });
  const rounded = (value: number | null, digits: number) => (value === null ? null : Number(value.toPrecision(digits)));
  const rows = series.flatMap((one) =>
    one.points.map((point) => [
      one.letter,
      point.number,
      fromSi('temperature', point.temperature, units.temperature),
      fromSi('pressure', point.pressure, units.pressure),
      rounded(fromSi('diffusivity', point.diffusivity, units.diffusivity), 8),
      rounded(fromSi('diffusivity', point.reduced, units.diffusivity), 6),
      rounded(100 * point.relativeUncertainty, 3),
      point.deviation === null
        ? null
        : Number(
            formatSigned(100 * point.deviation, 2)
              .replace('−', '-')
              .replaceAll('\u2009', ''),
          ),
      rounded(point.residual, 3),
      point.open ? words.no : words.yes,
    ]),
  );
  return { head, rows };
}
