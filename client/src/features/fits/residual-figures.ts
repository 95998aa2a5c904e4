import { formatShort } from '../../lib/format-quantity';
import { typeset } from '../../lib/typeset';
import { fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { type AxisSpec, type FigureSpec, type Mark } from '../../ui/figure/spec';
import { readerTicks } from '../../ui/figure/ticks';
import { deviationRange, logRange, type Range } from './figure-ranges';
import { type PairPoint, type PairSeries } from './pair-series';
import { aboutZero, temperatureAxis } from './workspace-figure';

export type Against = 'temperature' | 'pressure' | 'series';

interface Placed {
  readonly point: PairPoint;
  readonly residual: number;
}

const carried = (series: PairSeries): Placed[] =>
  series.points.flatMap((point) =>
    point.open || point.residual === null ? [] : [{ point, residual: point.residual }],
  );

/** Residuals of the points that carried weight, in u, against T, against P or by series; the tint is ±2 u. */
export function residualFigure(
  against: Against,
  all: readonly PairSeries[],
  validity: { readonly low: number; readonly high: number },
  units: ReaderUnits,
): FigureSpec {
  const used = all.filter(({ carriesWeight }) => carriesWeight);
  const points = used.flatMap(carried);
  const { x, range } = axisOf(against, used, points, units);
  const marks: Mark[] = [
    { kind: 'band', tone: 'tint', x: [range.min, range.max], low: [-2, -2], high: [2, 2] },
    {
      kind: 'line',
      style: 'fit',
      points: [
        [range.min, 0],
        [range.max, 0],
      ],
    },
    ...used.map((series, place): Mark => ({
      kind: 'points',
      series: series.mark,
      bars: 'all',
      points: carried(series).map(({ point, residual }, i, own) => ({
        id: point.id,
        x: abscissa(against, point, place, i, own.length),
        y: residual,
      })),
    })),
  ];
  const half = deviationRange(
    points.map(({ residual }) => residual),
    2.6,
  );
  return {
    x,
    panels: [
      {
        height: () => (against === 'temperature' ? 190 : 170),
        y: aboutZero(half, fitStrings.picture.residualAxis),
        marks,
      },
    ],
    ...(against === 'temperature' ? { temperatureRule: validity } : {}),
  };
}

function abscissa(against: Against, point: PairPoint, place: number, index: number, count: number): number {
  if (against === 'temperature') return point.temperature;
  if (against === 'pressure') return point.pressure;
  // Side by side within the room of its series, so that points of one series do not hide each other.
  return place + (count > 1 ? index / (count - 1) - 0.5 : 0) * 0.44;
}

function axisOf(
  against: Against,
  used: readonly PairSeries[],
  points: readonly Placed[],
  units: ReaderUnits,
): { readonly x: (width: number) => AxisSpec; readonly range: Range } {
  if (against === 'temperature') {
    const range = logRange(
      points.map(({ point }) => point.temperature),
      0.05,
    );
    return { x: temperatureAxis(range, units), range };
  }
  if (against === 'pressure') {
    const range = logRange(
      points.map(({ point }) => point.pressure),
      0.06,
    );
    return { x: pressureAxis(range, units), range };
  }
  const range = { min: -0.6, max: used.length + 0.3 };
  const axis: AxisSpec = {
    ...range,
    ticks: used.map((_, i) => i),
    format: (place) => used[place]?.letter ?? '',
    title: typeset(fitStrings.fitPage.seriesAxis),
  };
  return { x: () => axis, range };
}

const pressureAxis =
  (range: Range, units: ReaderUnits) =>
  (width: number): AxisSpec => {
    const wide = range.max / range.min > 5;
    const end = 1 - 64 / width;
    const shareOf = (tick: number) =>
      wide
        ? Math.log(tick / range.min) / Math.log(range.max / range.min)
        : (tick - range.min) / (range.max - range.min);
    return {
      ...range,
      logarithmic: wide,
      ticks: readerTicks(
        'pressure',
        { ...range, logarithmic: wide },
        units.pressure,
        Math.max(3, Math.floor(width / 100)),
      ).filter((tick) => shareOf(tick) < end),
      format: (pascal) => formatShort(fromSi('pressure', pascal, units.pressure), 5),
      title: typeset(fitStrings.fitPage.pressureAxis, { unit: unitLabel('pressure', units.pressure) }),
    };
  };

/** How many points lie beyond 2 u, and how many would be expected of a normal law (4.55 %). */
export function beyondTwo(all: readonly PairSeries[]): {
  readonly count: number;
  readonly all: number;
  readonly expected: number;
} {
  const residuals = all
    .filter(({ carriesWeight }) => carriesWeight)
    .flatMap((series) => carried(series).map(({ residual }) => residual));
  return {
    count: residuals.filter((r) => Math.abs(r) > 2).length,
    all: residuals.length,
    expected: 0.0455 * residuals.length,
  };
}
