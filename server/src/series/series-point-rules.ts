import { type Problem, type Warning } from '../common/problem.js';

/** One point as it comes in, SI. */
export interface IncomingPoint {
  temperature: number;
  pressure: number;
  diffusivity: number;
  diffusivityUncertainty?: number | null;
  temperatureUncertainty?: number | null;
  pressureUncertainty?: number | null;
  moleFraction?: number | null;
  replicates?: number | null;
}

const STANDARD_PRESSURE_PA = 101_325;

/**
 * D at 101.325 kPa outside this span suggests a slip of unit. Binary gas diffusivities between 200 K and 2,000 K lie
 * within it with more than a decade to spare (common practice, no source).
 */
const LIKELY_REDUCED_DIFFUSIVITY = { lowest: 2e-7, highest: 5e-3 };

/** A hint that a temperature is in °C (common practice, no source). */
const UNLIKELY_TEMPERATURE_K = 100;

const bad = (message: string, path: string): Problem => ({ code: 'BAD_INPUT', message, path });

/** What must be mended in the points before they are kept; empty when nothing. */
export function pointProblems(points: readonly IncomingPoint[]): Problem[] {
  if (points.length === 0) return [bad('A series has at least one point.', 'points')];
  const problems: Problem[] = [];
  points.forEach((point, i) => {
    for (const [field, name] of [
      ['temperature', 'T'],
      ['pressure', 'P'],
      ['diffusivity', 'D'],
    ] as const) {
      if (!(point[field] > 0) || !Number.isFinite(point[field]))
        problems.push(bad(`${name} is above zero.`, `points.${i}.${field}`));
    }
    for (const field of ['diffusivityUncertainty', 'temperatureUncertainty', 'pressureUncertainty'] as const) {
      const u = point[field];
      if (u !== null && u !== undefined && !(u > 0 && Number.isFinite(u))) {
        problems.push(
          bad('A standard uncertainty is above zero; leave it out where it is not known.', `points.${i}.${field}`),
        );
      }
    }
    const { moleFraction, replicates } = point;
    if (moleFraction !== null && moleFraction !== undefined && !(moleFraction >= 0 && moleFraction <= 1)) {
      problems.push(bad('A mole fraction lies between 0 and 1.', `points.${i}.moleFraction`));
    }
    if (replicates !== null && replicates !== undefined && replicates < 1) {
      problems.push(bad('The number of replicates is at least 1.', `points.${i}.replicates`));
    }
  });
  return problems;
}

function duplicateWarnings(points: readonly IncomingPoint[]): Warning[] {
  const warnings: Warning[] = [];
  for (const [index, first] of repeats(points)) {
    const message = `Point ${index + 1} repeats point ${first + 1}: same T, P and D.`;
    warnings.push({ code: 'DUPLICATE_POINT', message, path: `points.${index}` });
  }
  return warnings;
}

/** Places of the points that were there before, in order, each with that of the first. Sorting is cheaper than keys of text. */
function repeats(points: readonly IncomingPoint[]): [index: number, first: number][] {
  const difference = (a: IncomingPoint, b: IncomingPoint): number =>
    a.temperature - b.temperature || a.diffusivity - b.diffusivity || a.pressure - b.pressure;
  const order = [...points.keys()].sort((i, j) => difference(points[i]!, points[j]!) || i - j);
  const found: [number, number][] = [];
  let first = order[0] ?? 0;
  for (const index of order.slice(1)) {
    if (difference(points[first]!, points[index]!) === 0) found.push([index, first]);
    else first = index;
  }
  return found.sort(([i], [j]) => i - j);
}

function slipWarnings(points: readonly IncomingPoint[]): Warning[] {
  const warnings: Warning[] = [];
  points.forEach((point, i) => {
    const reduced = (point.diffusivity * point.pressure) / STANDARD_PRESSURE_PA;
    if (reduced < LIKELY_REDUCED_DIFFUSIVITY.lowest || reduced > LIKELY_REDUCED_DIFFUSIVITY.highest) {
      const message = `D of point ${i + 1}, brought to 101.325 kPa, is ${reduced.toPrecision(3)} m²/s. No gas pair is near that; is the unit right?`;
      warnings.push({ code: 'UNLIKELY_DIFFUSIVITY', message, path: `points.${i}.diffusivity` });
    }
    if (point.temperature < UNLIKELY_TEMPERATURE_K) {
      const message = `T of point ${i + 1} is ${point.temperature} K. Was it in °C?`;
      warnings.push({ code: 'UNLIKELY_TEMPERATURE', message, path: `points.${i}.temperature` });
    }
    const u = point.diffusivityUncertainty;
    if (u !== null && u !== undefined && u > point.diffusivity / 2) {
      warnings.push({
        code: 'LARGE_UNCERTAINTY',
        message: `u(D) of point ${i + 1} is more than half of D.`,
        path: `points.${i}.diffusivityUncertainty`,
      });
    }
  });
  return warnings;
}

/** D·P rises with T in every gas pair; one warning for the series names where it falls. */
function fallingWarning(points: readonly IncomingPoint[]): Warning[] {
  const order = points
    .map((point, index) => ({ index, T: point.temperature, DP: point.diffusivity * point.pressure }))
    .sort((a, b) => a.T - b.T);
  for (let i = 1; i < order.length; i += 1) {
    const [cooler, warmer] = [order[i - 1], order[i]];
    // Neighbours in T scatter; only a fall against a clear step in T is told.
    if (cooler && warmer && warmer.T > cooler.T * 1.02 && warmer.DP < cooler.DP) {
      const message = `D·P falls from point ${cooler.index + 1} to point ${warmer.index + 1} although T rises.`;
      return [{ code: 'FALLING_WITH_TEMPERATURE', message, path: `points.${warmer.index}.diffusivity` }];
    }
  }
  return [];
}

/** Doubts that stop nothing. */
export function pointWarnings(points: readonly IncomingPoint[]): Warning[] {
  return [...duplicateWarnings(points), ...slipWarnings(points), ...fallingWarning(points)];
}
