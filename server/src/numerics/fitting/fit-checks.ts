import { type CorrelationForm } from '../correlations/form.js';
import { availableForms, findForm } from '../correlations/forms.js';
import { type EngineProblem } from './engine-error.js';
import { type FitPoint, type FitRecipe, type FitSeries } from './fit.types.js';

/** Temperatures or pressures closer than this, relatively, are one: no exponent can be told from rounding. */
const SAME = 1e-6;

/** What keeps a recipe or its points from being fitted at all; empty when nothing does. */
export function problemsOfInput(series: readonly FitSeries[], recipe: FitRecipe): EngineProblem[] {
  const problems = problemsOfRecipe(recipe);
  const isWeighted = recipe.weighting !== 'EQUAL';
  if (series.length === 0) problems.push(badInput('A fit needs at least one series', 'series'));
  series.forEach((one, s) => {
    const path = `series.${s}`;
    if (one.points.length === 0) problems.push(badInput('The series has no points', `${path}.points`));
    if (!isUncertainty(one.commonRelativeUncertainty)) {
      problems.push(badInput('The common uncertainty must be a number ≥ 0', `${path}.commonRelativeUncertainty`));
    }
    one.points.forEach((point, i) => {
      checkPoint(point, isWeighted, (message, quantity) =>
        problems.push(badInput(message, `${path}.points.${i}.${quantity}`)),
      );
    });
  });
  return problems;
}

/** What the points, though sound one by one, cannot determine; empty when every parameter can be found. */
export function problemsOfDetermination(series: readonly FitSeries[], form: CorrelationForm): EngineProblem[] {
  const problems: EngineProblem[] = [];
  const count = form.parameters.length;
  const pointCount = series.reduce((sum, { points }) => sum + points.length, 0);
  if (isConstant(series, (point) => point.temperature)) {
    problems.push(notDeterminable('All points have one temperature: the exponent n of T cannot be determined'));
  }
  if (form.fitsPressure && isConstant(series, (point) => point.pressure)) {
    problems.push(notDeterminable('All points have one pressure: the exponent m of P cannot be determined'));
  }
  if (pointCount <= count) {
    problems.push(
      notDeterminable(
        `${pointCount} points cannot determine ${count} parameters with an uncertainty: ${count + 1} are needed`,
      ),
    );
  }
  return problems;
}

export function notDeterminable(message: string): EngineProblem {
  return { code: 'NOT_DETERMINABLE', message, path: null };
}

function problemsOfRecipe(recipe: FitRecipe): EngineProblem[] {
  const problems: EngineProblem[] = [];
  if (!findForm(recipe.form)) {
    const message = `The form ${recipe.form} is not available yet; these are: ${availableForms.join(', ')}`;
    problems.push({ code: 'NOT_AVAILABLE', message, path: 'form' });
  }
  if (recipe.loss !== 'LEAST_SQUARES' && recipe.seriesEffect !== 'POOLED') {
    problems.push(badInput('A robust loss is defined for pooled points only: choose POOLED or LEAST_SQUARES', 'loss'));
  }
  if (!isUncertainty(recipe.betweenSeriesDeviation)) {
    problems.push(badInput('The between-series deviation must be a number ≥ 0', 'betweenSeriesDeviation'));
  }
  if (!isPositive(recipe.referenceTemperature)) {
    problems.push(badInput('The reference temperature must be above 0 K', 'referenceTemperature'));
  }
  if (!isPositive(recipe.referencePressure)) {
    problems.push(badInput('The reference pressure must be above 0 Pa', 'referencePressure'));
  }
  return problems;
}

const MEASURED = ['temperature', 'pressure', 'diffusivity'] as const;
const UNCERTAINTIES = ['diffusivityUncertainty', 'temperatureUncertainty', 'pressureUncertainty'] as const;

/** Says of each quantity of a point that cannot stand why it cannot. */
function checkPoint(
  point: FitPoint,
  isWeighted: boolean,
  say: (message: string, quantity: keyof FitPoint) => void,
): void {
  for (const quantity of MEASURED) {
    if (!isPositive(point[quantity])) say(`The ${quantity} must be a number above zero`, quantity);
  }
  for (const quantity of UNCERTAINTIES) {
    if (!isUncertainty(point[quantity])) say('An uncertainty must be a number ≥ 0', quantity);
  }
  if (isWeighted && !(point.diffusivityUncertainty ?? 0)) {
    say(
      'The point has no uncertainty of D to be weighted by: state or assign one, or choose equal weights',
      'diffusivityUncertainty',
    );
  }
}

function badInput(message: string, path: string): EngineProblem {
  return { code: 'BAD_INPUT', message, path };
}

function isPositive(value: number): boolean {
  return Number.isFinite(value) && value > 0;
}

function isUncertainty(value: number | null): boolean {
  return value === null || (Number.isFinite(value) && value >= 0);
}

function isConstant(series: readonly FitSeries[], quantity: (point: FitPoint) => number): boolean {
  let lowest = Infinity;
  let highest = 0;
  for (const { points } of series) {
    for (const point of points) {
      lowest = Math.min(lowest, quantity(point));
      highest = Math.max(highest, quantity(point));
    }
  }
  return highest - lowest <= SAME * highest;
}
