import { fill } from '../../lib/fill';
import { fromSi, type ReaderUnits, unitLabel } from '../../lib/units';
import { fitStrings } from '../../strings/fits';
import { type FigureSpec, type LineStyle, type Mark } from '../../ui/figure/spec';
import { type Compared } from './compare-rows';
import { deviationRange, type Range } from './figure-ranges';
import { aboutZero, temperatureAxis } from './workspace-figure';

const words = fitStrings.compare;
export const LINES = ['outside', 'prediction', 'estimate1'] as const satisfies readonly LineStyle[];

export const fitName = ({ fit }: Compared): string => fill(fitStrings.fit, { number: fit.number });

/** Relative difference of each fit to the first, in percent, over U of the first. */
export function compareFigure(
  [first, ...others]: readonly [Compared, ...Compared[]],
  common: { readonly low: number; readonly high: number } | null,
  units: ReaderUnits,
): FigureSpec {
  const x = first.temperatures;
  const axis: Range = { min: x[0]!, max: x.at(-1)! };
  const half = x.map((_, i) => (100 * first.expandedUncertainties[i]!) / first.diffusivities[i]!);
  const differences = others.map((other) =>
    x.map((_, i) => 100 * (other.diffusivities[i]! / first.diffusivities[i]! - 1)),
  );
  const marks: Mark[] = [
    { kind: 'band', tone: 'recommended', x, low: half.map((value) => -value), high: half },
    {
      kind: 'line',
      style: 'fit',
      points: [
        [axis.min, 0],
        [axis.max, 0],
      ],
    },
    ...differences.map((values, i): Mark => ({
      kind: 'line',
      style: LINES[i % LINES.length]!,
      points: x.map((T, k) => [T, values[k]!] as const),
    })),
    label(fitName(first), x[Math.floor(x.length * 0.12)]!, 0, -11),
    ...others.map((other, i) => {
      const k = Math.floor(x.length * (0.72 - 0.16 * i));
      return label(fitName(other), x[k]!, differences[i]![k]!, 14);
    }),
  ];
  return {
    x: temperatureAxis(axis, units),
    panels: [
      {
        height: () => 250,
        y: aboutZero(deviationRange([...half, ...differences.flat()], 0.1), words.axis, { first: fitName(first) }),
        marks,
      },
    ],
    ...(common === null ? {} : { temperatureRule: common }),
  };
}

const label = (text: string, x: number, y: number, dy: number): Mark => ({
  kind: 'label',
  text,
  x,
  y,
  dx: 0,
  dy,
  tone: 'accent',
  anchor: 'left',
});

export function compareTable([first, ...others]: readonly [Compared, ...Compared[]], units: ReaderUnits) {
  const unit = unitLabel('temperature', units.temperature);
  return {
    head: [`T / ${unit}`, `U(${fitName(first)}) / %`, ...others.map((other) => `${fitName(other)} / %`)],
    rows: first.temperatures.map((T, i) => [
      fromSi('temperature', T, units.temperature),
      Number(((100 * first.expandedUncertainties[i]!) / first.diffusivities[i]!).toPrecision(3)),
      ...others.map((other) => Number((100 * (other.diffusivities[i]! / first.diffusivities[i]! - 1)).toFixed(3))),
    ]),
  };
}
