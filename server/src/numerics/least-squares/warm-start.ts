import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { columnNorms } from '../linear-algebra/qr.js';
import { type ProjectedProblem, type Projection } from './variable-projection.js';

export interface WarmStartOptions {
  readonly iterations: number;
  readonly damping: number;
}

/**
 * Brings the nonlinear parameters near the minimum with `ml-levenberg-marquardt`.
 *
 * That package damps by λ·I, never rejects a step, stops on an absolute sum of squares and mishandles weights; it is
 * therefore given whitened residuals scaled to unit norm, parameters scaled by the columns of the analytic Jacobian,
 * no weights, no bounds and no tolerance, and what it returns is only believed when it is better than the start.
 *
 * @returns the nonlinear parameters; those of the start where nothing better was found
 */
export function warmStart(projected: ProjectedProblem, start: number[], options: WarmStartOptions): number[] {
  const first = projected.at(start);
  if (!first || start.length === 0) return start;
  const norm = projected.problem.norm || 1;
  const scales = columnNorms(first.jacobian, first.residuals.length, start.length).map((length) => length / norm);
  if (!scales.every((scale) => scale > 0)) return start;

  const unscale = (values: ArrayLike<number>) => Array.from(values, (value, k) => value / scales[k]!);
  const at = remembering((values) => projected.at(unscale(values)));
  const rows = first.residuals.length;
  const observed = projected.problem.observed;
  try {
    const { parameterValues } = levenbergMarquardt(
      { x: Array.from({ length: rows }, (_, i) => i), y: observed.map((value) => value / norm) },
      (values) => {
        const here = at(values);
        return (i) => (here ? (observed[i]! - here.residuals[i]!) / norm : NaN);
      },
      {
        initialValues: start.map((value, k) => value * scales[k]!),
        minValues: start.map(() => -Infinity),
        maxValues: start.map(() => Infinity),
        jacobianFunction: (values) => {
          const here = at(values);
          return (i) => start.map((_, k) => (here ? here.jacobian[k * rows + i]! / norm / scales[k]! : NaN));
        },
        maxIterations: options.iterations,
        damping: options.damping,
        errorTolerance: 0,
      },
    );
    const found = unscale(parameterValues);
    const last = projected.at(found);
    return last && last.sumOfSquares <= first.sumOfSquares ? found : start;
  } catch {
    // The package throws where a Jacobian is not finite; the start is then as good as anything it has seen.
    return start;
  }
}

/** The package asks for model and Jacobian at one point in turn; the projection behind both is made once. */
function remembering(make: (values: number[]) => Projection | null): (values: number[]) => Projection | null {
  let key: number[] | null = null;
  let value: Projection | null = null;
  return (values) => {
    if (!key || values.some((each, k) => each !== key![k])) {
      key = values.slice();
      value = make(values);
    }
    return value;
  };
}
