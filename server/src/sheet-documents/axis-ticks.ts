import type { FigureAxis } from './sheet-figures.types.js';

/** Rounded steps, as in ISO 3 (preferred numbers), coarse to fine within a decade. */
const MANTISSAS = [
  [1, 2, 5],
  [1, 1.5, 2, 3, 5, 7],
  [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8],
] as const;

/** The rounded step, 1, 2 or 5 times a power of ten, that divides `extent` into at most `most` parts. */
export function roundStep(extent: number, most: number): number {
  if (!(extent > 0)) return 1;
  const decade = 10 ** Math.floor(Math.log10(extent / most));
  return decade * ([1, 2, 5, 10].find((factor) => factor * decade * most >= extent * (1 - 1e-12)) ?? 10);
}

/** Multiples of `step` from `minimum` to `maximum`, both included where they are multiples. */
export function multiplesOf(step: number, minimum: number, maximum: number): number[] {
  const first = Math.ceil(minimum / step - 1e-9);
  const last = Math.floor(maximum / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => Number(((first + i) * step).toPrecision(12)));
}

/** An axis of a positive quantity drawn logarithmically, with four figures at least where the extent allows. */
export function logarithmicAxis(minimum: number, maximum: number): FigureAxis {
  for (const mantissas of MANTISSAS) {
    const ticks = decadesOf(mantissas, minimum, maximum);
    if (ticks.length >= 4) return { minimum, maximum, ticks };
  }
  return { minimum, maximum, ticks: multiplesOf(roundStep(maximum - minimum, 6), minimum, maximum) };
}

function decadesOf(mantissas: readonly number[], minimum: number, maximum: number): number[] {
  const first = Math.floor(Math.log10(minimum));
  const last = Math.ceil(Math.log10(maximum));
  const decades = Array.from({ length: last - first + 1 }, (_, i) => first + i);
  return decades
    .flatMap((decade) => mantissas.map((mantissa) => Number((mantissa * 10 ** decade).toPrecision(12))))
    .filter((tick) => tick >= minimum && tick <= maximum);
}

/** A temperature axis: limits as given, figures at rounded steps. */
export const temperatureAxis = (minimum: number, maximum: number): FigureAxis => ({
  minimum,
  maximum,
  ticks: multiplesOf(roundStep(maximum - minimum, 10), minimum, maximum),
});

/** An axis from `lower` to `upper` about zero, or a little beyond, with figures at rounded steps. */
export function deviationAxis(lower: number, upper: number): FigureAxis {
  const step = roundStep(upper - lower, 8);
  const first = Math.min(-step, step * Math.floor(lower / step + 1e-9));
  const last = Math.max(step, step * Math.ceil(upper / step - 1e-9));
  // A quarter of a step of air lets the outermost figures stand clear of the edge.
  return { minimum: first - step / 4, maximum: last + step / 4, ticks: multiplesOf(step, first, last) };
}
