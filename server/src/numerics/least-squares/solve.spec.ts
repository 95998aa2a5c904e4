import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { strdProblems } from '../../../test/reference/strd/problems.js';
import {
  agreeingDigits,
  leastSquaresProblem,
  readStrdFile,
  type StrdProblem,
} from '../../../test/reference/strd/strd-problem.js';
import { NoConvergence, solveLeastSquares } from './solve.js';
import { type LeastSquaresProblem } from './problem.js';

/** Where the published files lie, 27 files `<name>.dat`; the problems in our own fixtures are checked without them. */
const PUBLISHED = process.env['DIFFOLIO_STRD_DIR'];

/** Fewest agreeing digits over the parameters, and over their standard deviations. */
function digits(problem: StrdProblem, start: readonly number[]): { parameters: number; deviations: number } {
  const solution = solveLeastSquares(leastSquaresProblem(problem), start);
  const variance = solution.sumOfSquares / solution.degreesOfFreedom;
  const least = (values: number[]) => Math.min(...values);
  return {
    parameters: least(problem.certified.map(({ value }, k) => agreeingDigits(solution.parameters[k]!, value))),
    deviations: least(
      problem.certified.map(({ deviation }, k) =>
        agreeingDigits(Math.sqrt(variance * solution.unscaledCovariance[k]![k]!), deviation),
      ),
    ),
  };
}

describe('solveLeastSquares on the NIST Statistical Reference Datasets (nonlinear regression)', () => {
  const runs = strdProblems.flatMap((problem) =>
    problem.starts.map((start, k) => ({ name: problem.name, start: ['far', 'near'][k], values: start, problem })),
  );

  it.each(runs)('certifies $name from the $start start', ({ problem, values }) => {
    const { parameters, deviations } = digits(problem, values);

    expect(parameters).toBeGreaterThan(9);
    expect(deviations).toBeGreaterThan(8);
  });
});

const describePublished = PUBLISHED && existsSync(PUBLISHED) ? describe : describe.skip;
describePublished(
  'solveLeastSquares on all 27 published files (DIFFOLIO_STRD_DIR; https://www.itl.nist.gov/div898/strd/nls/nls_main.shtml)',
  () => {
    const problems = PUBLISHED && existsSync(PUBLISHED) ? readPublished(PUBLISHED) : [];

    it('reaches 9 digits of every parameter on all 54 runs', () => {
      const short = problems.flatMap((problem) =>
        problem.starts.filter((start) => digits(problem, start).parameters < 9).map(() => problem.name),
      );

      expect(problems).toHaveLength(27);
      expect(short).toEqual([]);
    });

    it('reaches 8 digits of every standard deviation on all but Lanczos1, whose residuals are rounding noise', () => {
      const short = problems.flatMap((problem) =>
        problem.starts.filter((start) => digits(problem, start).deviations < 8).map(() => problem.name),
      );

      expect(short).toEqual(['Lanczos1', 'Lanczos1']);
    });
  },
);

function readPublished(folder: string): StrdProblem[] {
  const files = readdirSync(folder).filter((file) => file.endsWith('.dat'));
  return files.sort().map((file) => readStrdFile(readFileSync(join(folder, file), 'utf8')));
}

describe('solveLeastSquares', () => {
  const line: LeastSquaresProblem = {
    observed: new Float64Array([1.1, 1.9, 3.2]),
    deviations: new Float64Array([0.1, 0.2, 0.1]),
    parameterCount: 2,
    linear: [0, 1],
    model: ([a, b], into) => [1, 2, 3].forEach((x, i) => (into[i] = a! + b! * x)),
    jacobian: (_, into) => into.set([1, 1, 1, 1, 2, 3]),
  };

  it('finds a straight line with weights by projection alone', () => {
    const { parameters, unscaledCovariance } = solveLeastSquares(line, [0, 0]);

    // Normal equations by hand: Σw = 225, Σwx = 450, Σwx² = 1100, Σwy = 477.5, Σwxy = 1165.
    expect(parameters[1]).toBeCloseTo((225 * 1165 - 450 * 477.5) / (225 * 1100 - 450 ** 2), 12);
    expect(unscaledCovariance[1]![1]).toBeCloseTo(225 / (225 * 1100 - 450 ** 2), 12);
  });

  it('says so when the Jacobian never determines a parameter', () => {
    const blind = {
      ...line,
      linear: [],
      jacobian: (_: Float64Array, into: Float64Array) => into.set([1, 1, 1, 0, 0, 0]),
    };

    expect(() => solveLeastSquares(blind, [1, 1])).toThrow(NoConvergence);
  });

  it('returns the same bits every time, restarts included', () => {
    const hard = strdProblems.find(({ name }) => name === 'MGH17')!;
    const first = solveLeastSquares(leastSquaresProblem(hard), hard.starts[0]);

    expect(solveLeastSquares(leastSquaresProblem(hard), hard.starts[0])).toEqual(first);
  });
});
