import { fill } from '../../lib/fill';
import { formatShort, withUnit } from '../../lib/format-quantity';
import { typeset } from '../../lib/typeset';
import { fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { seriesStrings } from '../../strings/series';
import { type FigureSpec, type LineStyle, type Mark } from '../../ui/figure/spec';
import { readerTicks } from '../../ui/figure/ticks';

const words = seriesStrings.picture;

/** Pa: where all points are brought to, so that they lie in one picture. */
export const REFERENCE_PRESSURE = 101_325;

export const LINES = ['estimate1', 'estimate2', 'estimate3'] as const satisfies readonly LineStyle[];

export interface FigurePointData {
  readonly id: string;
  readonly temperature: number;
  readonly pressure: number;
  readonly diffusivity: number;
  readonly diffusivityUncertainty?: number | null;
}

export interface EstimateData {
  readonly label: string;
  readonly diffusivities: readonly number[];
}

const AXIS_POWER = { m2_s: 1e6, cm2_s: 1, mm2_s: 1 } as const;
const CURVE_POINTS = 61;

export const reducedOf = ({ diffusivity, pressure }: FigurePointData): number =>
  (diffusivity * pressure) / REFERENCE_PRESSURE;

/** Temperatures of the T axis, from a little below the coldest point to a little above the warmest. */
export function curveTemperatures(points: readonly FigurePointData[]): number[] {
  const temperatures = points.map(({ temperature }) => temperature);
  const [low, high] = [0.97 * Math.min(...temperatures), 1.03 * Math.max(...temperatures)];
  return Array.from({ length: CURVE_POINTS }, (_, i) => low * (high / low) ** (i / (CURVE_POINTS - 1)));
}

/** D brought to P0 against T, both logarithmic, with the estimates behind. */
export function seriesFigure(
  points: readonly FigurePointData[],
  mark: number,
  temperatures: readonly number[],
  estimates: readonly EstimateData[],
  units: ReaderUnits,
): FigureSpec {
  const placed = points.map((point) => {
    const y = reducedOf(point);
    const u = (point.diffusivityUncertainty ?? 0) / point.diffusivity;
    return {
      id: point.id,
      x: point.temperature,
      y,
      ...(u > 0 ? { low: y * Math.exp(-u), high: y * Math.exp(u) } : {}),
    };
  });
  const values = [
    ...placed.flatMap(({ y, low, high }) => [low ?? y, high ?? y]),
    ...estimates.flatMap(({ diffusivities }) => diffusivities),
  ];
  const room = Math.max((Math.max(...values) / Math.min(...values)) ** 0.05, 1.02);
  const range = { min: Math.min(...values) / room, max: Math.max(...values) * room, logarithmic: true };
  const marks: Mark[] = [
    ...estimates.map(({ diffusivities }, i): Mark => ({
      kind: 'line',
      style: LINES[i % LINES.length]!,
      points: temperatures.map((T, k) => [T, diffusivities[k]!] as const),
    })),
    { kind: 'points', series: mark, bars: 'visible', points: placed },
  ];
  const unit =
    units.diffusivity === 'm2_s' ? '10^{−6} m^{2}/s' : unitLabel('diffusivity', units.diffusivity).replace('²', '^{2}');
  return {
    x: temperatureAxis(temperatures[0]!, temperatures.at(-1)!, units),
    panels: [
      {
        height: (width) => (width < 480 ? 290 : 360),
        y: {
          ...range,
          ticks: readerTicks('diffusivity', range, units.diffusivity, 6),
          format: (value) =>
            formatShort(fromSi('diffusivity', value, units.diffusivity) * AXIS_POWER[units.diffusivity], 4),
          title: typeset(fill(words.axis, { unit, pressure: referenceWords(units) })),
        },
        marks,
      },
    ],
  };
}

const temperatureAxis = (min: number, max: number, units: ReaderUnits) => (width: number) => ({
  min,
  max,
  logarithmic: true,
  // The right end is the axis title's.
  ticks: readerTicks(
    'temperature',
    { min, max },
    units.temperature,
    Math.max(3, Math.floor((width - 120) / 72)),
  ).filter((tick) => tick < min + (max - min) * (1 - 56 / width)),
  format: (kelvin: number) => formatShort(fromSi('temperature', kelvin, units.temperature), 5),
  title: typeset(words.temperatureAxis, { unit: unitLabel('temperature', units.temperature) }),
});

export const referenceWords = (units: ReaderUnits): string =>
  withUnit(formatShort(fromSi('pressure', REFERENCE_PRESSURE, units.pressure)), unitLabel('pressure', units.pressure));

/** How far a point lies from an estimate, relative; straight between two temperatures in ln D, ln T. */
export function deviationFrom(
  point: FigurePointData,
  temperatures: readonly number[],
  { diffusivities }: EstimateData,
): number | null {
  const next = temperatures.findIndex((T) => T >= point.temperature);
  const [T0, T1, D0, D1] = [temperatures[next - 1], temperatures[next], diffusivities[next - 1], diffusivities[next]];
  if (T0 === undefined || T1 === undefined || D0 === undefined || D1 === undefined) return null;
  const share = Math.log(point.temperature / T0) / Math.log(T1 / T0);
  return reducedOf(point) / (D0 * (D1 / D0) ** share) - 1;
}
