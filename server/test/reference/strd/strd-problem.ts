import { type LeastSquaresProblem } from '../../../src/numerics/least-squares/problem.js';
import { variables } from './dual.js';
import { strdModels } from './models.js';

/** A problem of the suite with its certified answer. */
export interface StrdProblem {
  readonly name: string;
  readonly starts: readonly [readonly number[], readonly number[]];
  readonly certified: readonly { readonly value: number; readonly deviation: number }[];
  readonly residualSumOfSquares: number;
  readonly y: readonly number[];
  /** A row of predictors for each y */
  readonly x: readonly (readonly number[])[];
}

export function leastSquaresProblem({ name, y, x, certified }: StrdProblem): LeastSquaresProblem {
  const model = strdModels[name]!;
  const rows = y.length;
  return {
    observed: Float64Array.from(y, model.transform ?? ((value) => value)),
    deviations: null,
    parameterCount: certified.length,
    linear: model.linear,
    model: (parameters, into) => {
      const b = variables(parameters);
      x.forEach((row, i) => (into[i] = model.predict(b, row).value));
    },
    jacobian: (parameters, into) => {
      const b = variables(parameters);
      x.forEach((row, i) => model.predict(b, row).derivatives.forEach((d, k) => (into[k * rows + i] = d)));
    },
  };
}

/**
 * Reads a file of the suite as NIST publishes it: starts and certified values stand in lines such as
 * `b1 = 500 250 2.3894212918E+02 2.7070075241E+00`, the data under the second line that begins with `Data:`.
 */
export function readStrdFile(text: string): StrdProblem {
  const lines = text.split(/\r?\n/);
  const numbers = (line: string) => line.trim().split(/\s+/).map(Number);
  const parameters = lines.filter((line) => /^\s*b\d+\s*=/.test(line)).map((line) => numbers(line.split('=')[1]!));
  const lastHeading = lines.findLastIndex((line) => line.startsWith('Data:'));
  const rows = lines
    .slice(lastHeading + 1)
    .filter((line) => line.trim() !== '')
    .map(numbers);
  const sum = lines.find((line) => line.startsWith('Residual Sum of Squares:'))!;
  return {
    name: /Dataset Name:\s*(\w+)/.exec(text)![1]!,
    starts: [parameters.map(([first]) => first!), parameters.map(([, second]) => second!)],
    certified: parameters.map(([, , value, deviation]) => ({ value: value!, deviation: deviation! })),
    residualSumOfSquares: Number(sum.split(':')[1]),
    y: rows.map(([y]) => y!),
    x: rows.map(([, ...x]) => x),
  };
}

/** Digits on which a value agrees with the certified one (the suite's log relative error), at most 15. */
export function agreeingDigits(actual: number, certified: number): number {
  const relative = Math.abs(actual - certified) / Math.abs(certified);
  return Math.min(15, -Math.log10(Math.max(relative, 1e-15)));
}
