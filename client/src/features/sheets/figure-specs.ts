import { type FiguresDataFragment } from '../../gql/graphql';
import { fill } from '../../lib/fill';
import { formatNumber, formatShort, formatSigned, withUnit } from '../../lib/format-quantity';
import { type TextRun, typeset } from '../../lib/typeset';
import { fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { sheetStrings } from '../../strings/sheets';
import { type AxisSpec, type FigureSpec, type LineMark, type Mark, type PointsMark } from '../../ui/figure/spec';
import { readerTicks } from '../../ui/figure/ticks';
import { mostPlaces } from '../../ui/numbers/aligned';

type Figures = FiguresDataFragment;
const words = sheetStrings.figures;
const ESTIMATE_STYLES = ['estimate1', 'estimate2', 'estimate3'] as const;

export const estimateStyle = (index: number) => ESTIMATE_STYLES[index % ESTIMATE_STYLES.length]!;
export const pointId = (seriesKey: string, index: number): string => `${seriesKey} ${index}`;

/** D against T, both axes logarithmic: band, fit (broken outside the range), points with the bars they do not hide. */
export function diffusivityFigure(figures: Figures, units: ReaderUnits, fitName: string): FigureSpec {
  const { curve } = figures;
  const inside = slice(curve.firstInside, curve.lastInside + 1);
  const bandOf = (sign: 1 | -1) =>
    inside(curve.diffusivities.map((D, i) => D * Math.exp(sign * curve.relativeExpandedUncertainties[i]!)));
  const marks: Mark[] = [
    { kind: 'band', tone: 'recommended', x: inside(curve.temperatures), low: bandOf(-1), high: bandOf(1) },
    ...fitLines(curve, curve.diffusivities),
    ...figures.series.map((series): PointsMark => {
      const points = series.temperatures.map((x, i) => {
        const y = series.reducedDiffusivities[i]!;
        const u = series.relativeUncertainties[i]!;
        const bar = u > 0 ? { low: y * Math.exp(-u), high: y * Math.exp(u) } : {};
        return { id: pointId(series.key, i), x, y, open: isOpen(series, i), ...bar };
      });
      return { kind: 'points', series: series.mark, bars: 'visible', points };
    }),
    ...leftOutNames(figures),
    fitLabel(curve, fitName),
  ];
  const y = diffusivityAxis(figures, units);
  return {
    x: temperatureAxis(figures, units),
    panels: [{ height: (width) => (width < 480 ? 320 : width < 600 ? 360 : width < 700 ? 390 : 430), y, marks }],
    temperatureRule: validity(curve),
  };
}

/** Deviation from the fit in percent, with the estimates behind the points. */
export function deviationFigure(figures: Figures, units: ReaderUnits): FigureSpec {
  const { curve } = figures;
  const inside = slice(curve.firstInside, curve.lastInside + 1);
  const percent = (relative: readonly number[], sign: 1 | -1) =>
    inside(relative.map((value) => 100 * Math.expm1(sign * value)));
  const x = inside(curve.temperatures);
  const prediction = curve.relativeNewLaboratory;
  const marks: Mark[] = [
    {
      kind: 'band',
      tone: 'recommended',
      x,
      low: percent(curve.relativeExpandedUncertainties, -1),
      high: percent(curve.relativeExpandedUncertainties, 1),
    },
    ...(prediction
      ? ([1, -1] as const).map((sign): LineMark => ({
          kind: 'line',
          style: 'prediction',
          points: zip(x, percent(prediction, sign)),
        }))
      : []),
    ...figures.estimates.map((estimate, i): LineMark => ({
      kind: 'line',
      style: estimateStyle(i),
      points: zip(estimate.temperatures, estimate.deviations),
    })),
    {
      kind: 'line',
      style: 'fit',
      points: [
        [figures.temperatureAxis.minimum, 0],
        [figures.temperatureAxis.maximum, 0],
      ],
    },
    ...figures.series.map((series): PointsMark => {
      const points = series.temperatures.map((temperature, i) => {
        const deviation = series.deviations[i]!;
        const u = 100 * series.relativeUncertainties[i]!;
        return {
          id: pointId(series.key, i),
          x: temperature,
          y: deviation,
          open: isOpen(series, i),
          ...(u > 0 ? { low: deviation - u, high: deviation + u } : {}),
        };
      });
      return { kind: 'points', series: series.mark, bars: 'all', points };
    }),
  ];
  const { minimum, maximum, ticks } = figures.deviationAxis;
  const y: AxisSpec = {
    min: minimum,
    max: maximum,
    ticks,
    format: (value) => (value === 0 ? '0' : `${value > 0 ? '+' : ''}${formatShort(value)}`),
    title: typeset(words.deviationAxis),
  };
  return {
    x: temperatureAxis(figures, units),
    panels: [{ height: (width) => (width < 480 ? 250 : width < 600 ? 260 : 284), y, marks }],
    temperatureRule: validity(curve),
  };
}

const isOpen = (series: Figures['series'][number], index: number): boolean =>
  !series.used || series.leftOut.includes(index);

function fitLines(curve: Figures['curve'], values: readonly number[]): LineMark[] {
  const { temperatures, firstInside, lastInside } = curve;
  const part = (style: LineMark['style'], from: number, to: number): LineMark => ({
    kind: 'line',
    style,
    points: zip(temperatures.slice(from, to), values.slice(from, to)),
  });
  return [
    part('fit', firstInside, lastInside + 1),
    part('outside', 0, firstInside + 1),
    part('outside', lastInside, temperatures.length),
  ].filter((line) => line.points.length > 1);
}

function fitLabel(curve: Figures['curve'], text: string): Mark {
  const middle = Math.round((curve.firstInside + curve.lastInside) / 2);
  return {
    kind: 'label',
    text,
    tone: 'accent',
    anchor: 'left',
    x: curve.temperatures[middle]!,
    y: curve.diffusivities[middle]!,
    dx: 14,
    dy: 26,
    wideOnly: true,
  };
}

/** Series that are left out are named at their last point. */
function leftOutNames(figures: Figures): Mark[] {
  const { minimum, maximum } = figures.temperatureAxis;
  return figures.series.flatMap((series): Mark[] => {
    const last = series.temperatures.length - 1;
    if (series.used || last < 0) return [];
    const x = series.temperatures[last]!;
    const right = x > minimum + 0.8 * (maximum - minimum);
    return [
      {
        kind: 'label',
        text: `${series.key}, ${words.out}`,
        tone: 'note',
        anchor: right ? 'right' : 'left',
        x,
        y: series.reducedDiffusivities[last]!,
        dx: right ? -10 : 9,
        dy: -8,
        wideOnly: true,
      },
    ];
  });
}

const validity = (curve: Figures['curve']) => ({
  low: curve.temperatures[curve.firstInside]!,
  high: curve.temperatures[curve.lastInside]!,
});

const temperatureAxis =
  (figures: Figures, units: ReaderUnits) =>
  (width: number): AxisSpec => {
    const range = { min: figures.temperatureAxis.minimum, max: figures.temperatureAxis.maximum };
    const most = Math.max(3, Math.floor((width - 120) / 72));
    // The right end is the axis title's.
    const ticks = readerTicks('temperature', range, units.temperature, most).filter(
      (tick) => tick < range.min + (range.max - range.min) * (1 - 56 / width),
    );
    return {
      ...range,
      logarithmic: true,
      ticks,
      format: (kelvin) => formatShort(fromSi('temperature', kelvin, units.temperature), 5),
      title: typeset(words.temperatureAxis, { unit: unitLabel('temperature', units.temperature) }),
    };
  };

function diffusivityAxis(figures: Figures, units: ReaderUnits): AxisSpec {
  const range = { min: figures.diffusivityAxis.minimum, max: figures.diffusivityAxis.maximum, logarithmic: true };
  const ticks = readerTicks('diffusivity', range, units.diffusivity, 6);
  // All figures of the axis to the places of the one that has most.
  const places = mostPlaces(ticks.map((tick) => formatShort(onAxis(tick, units), 4)));
  return {
    ...range,
    ticks,
    format: (value) => formatNumber(onAxis(value, units), places),
    title: diffusivityTitle(figures.pressure, units),
  };
}

/** On the axis m²/s is scaled by 10⁻⁶, so that its figures can be read. */
const AXIS_POWER = { m2_s: 1e6, cm2_s: 1, mm2_s: 1 } as const;

const onAxis = (value: number, units: ReaderUnits): number =>
  fromSi('diffusivity', value, units.diffusivity) * AXIS_POWER[units.diffusivity];

function diffusivityTitle(pressure: number, units: ReaderUnits): TextRun[] {
  const unit =
    units.diffusivity === 'm2_s' ? '10^{−6} m^{2}/s' : unitLabel('diffusivity', units.diffusivity).replace('²', '^{2}');
  return typeset(fill(words.diffusivityAxis, { unit, pressure: pressureWords(pressure, units) }));
}

export const pressureWords = (pressure: number, units: ReaderUnits): string =>
  withUnit(formatShort(fromSi('pressure', pressure, units.pressure)), unitLabel('pressure', units.pressure));

/** What figures 1 and 2 show, as a table in the reader's units. */
export function figureTable(figures: Figures, units: ReaderUnits) {
  const temperature = unitLabel('temperature', units.temperature);
  const diffusivity = unitLabel('diffusivity', units.diffusivity);
  const head = Object.values(words.columns).map((column) =>
    fill(column, { unit: column.startsWith('T') ? temperature : diffusivity }),
  );
  const rows = figures.series.flatMap((series) =>
    series.temperatures.map((T, i) => [
      series.key,
      fromSi('temperature', T, units.temperature),
      Number(fromSi('diffusivity', series.reducedDiffusivities[i]!, units.diffusivity).toPrecision(6)),
      Number((100 * series.relativeUncertainties[i]!).toPrecision(3)),
      Number(formatSigned(series.deviations[i]!, 2).replace('−', '-').replaceAll('\u2009', '')),
      isOpen(series, i) ? 'no' : 'yes',
    ]),
  );
  return { head, rows };
}

const slice =
  (from: number, to: number) =>
  (values: readonly number[]): number[] =>
    values.slice(from, to);

const zip = (xs: readonly number[], ys: readonly number[]): (readonly [number, number])[] =>
  xs.map((x, i) => [x, ys[i]!] as const);
