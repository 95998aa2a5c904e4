/** Ends of an axis. */
export interface Range {
  readonly min: number;
  readonly max: number;
}

/** All values with a little room at both ends, on a logarithmic axis. Nothing to show: one decade around 1. */
export function logRange(values: readonly number[], room: number): Range {
  const positive = values.filter((value) => value > 0 && Number.isFinite(value));
  if (positive.length === 0) return { min: 0.3, max: 3 };
  const [low, high] = [Math.min(...positive), Math.max(...positive)];
  const step = Math.max(Math.log(high / low) * room, 0.01);
  return { min: low * Math.exp(-step), max: high * Math.exp(step) };
}

/** What is left out may widen the range this much; beyond it lies outside the drawing. */
const MOST_WIDER = 2.2;

/**
 * A range about zero that shows all that carries weight, and what is left out as long as it is not far away.
 *
 * @param least the smallest half-width worth drawing
 */
export function deviationRange(carried: readonly number[], least: number, leftOut: readonly number[] = []): Range {
  const half = Math.max(least, ...carried.map((value) => Math.abs(value)));
  const wider = Math.max(
    half,
    ...leftOut.map((value) => Math.abs(value)).filter((value) => value <= MOST_WIDER * half),
  );
  return { min: -1.1 * wider, max: 1.1 * wider };
}

/** `count` temperatures at equal steps of ln T. */
export function temperaturesAlong({ min, max }: Range, count: number): number[] {
  return Array.from({ length: count }, (_, i) => min * (max / min) ** (i / (count - 1)));
}
