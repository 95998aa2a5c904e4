import { type CorrelationForm } from '../correlations/form.js';
import { availableForms, findForm } from '../correlations/forms.js';
import { type EngineProblem } from './engine-error.js';
import { type FitPoint, type FitRecipe, type FitSeries } from './fit.types.js';

/** Temperatures or pressures closer than this, relatively, are one: no exponent can be told from rounding. */
const SAME = 1e-6;

/** What keeps a recipe or its points from being fitted at all; empty when nothing does. */
export function problemsOfInput(series: readonly FitSeries[], recipe: FitRecipe): EngineProblem[] {
  const problems = problemsOfRecipe(recipe);
  if (series.length === 0) problems.push(badInput('A fit needs at least one series', 'series'));
  series.forEach((one, s) => {
    const path = `series.${s}`;
    if (one.points.length === 0) problems.push(badInput('The series has no points', `${path}.points`));
    if (!isUncertainty(one.commonRelativeUncertainty)) {
      problems.push(badInput('The common uncertainty must be a number ≥ 0', `${path}.commonRelativeUncertainty`));
    }
    one.points.forEach((point, i) => problems.push(...problemsOfPoint(point, `${path}.points.${i}`, recipe)));
  });
  return problems;
}

/** What the points, though sound one by one, cannot determine; empty when every parameter can be found. */
export function problemsOfDetermination(points: readonly FitPoint[], form: CorrelationForm): EngineProblem[] {
  const problems: EngineProblem[] = [];
  const count = form.parameters.length;
  if (isConstant(points.map((point) => point.temperature))) {
    problems.push(notDeterminable('All points have one temperature: the exponent n of T cannot be determined'));
  }
  if (form.fitsPressure && isConstant(points.map((point) => point.pressure))) {
    problems.push(notDeterminable('All points have one pressure: the exponent m of P cannot be determined'));
  }
  if (points.length <= count) {
    problems.push(
      notDeterminable(
        `${points.length} points cannot determine ${count} parameters with an uncertainty: ${count + 1} are needed`,
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

function problemsOfPoint(point: FitPoint, path: string, recipe: FitRecipe): EngineProblem[] {
  const problems: EngineProblem[] = [];
  for (const quantity of ['temperature', 'pressure', 'diffusivity'] as const) {
    if (!isPositive(point[quantity]))
      problems.push(badInput(`The ${quantity} must be a number above zero`, `${path}.${quantity}`));
  }
  for (const quantity of ['diffusivityUncertainty', 'temperatureUncertainty', 'pressureUncertainty'] as const) {
    if (!isUncertainty(point[quantity]))
      problems.push(badInput('An uncertainty must be a number ≥ 0', `${path}.${quantity}`));
  }
  const isWeighted = recipe.weighting !== 'EQUAL';
  if (isWeighted && (point.diffusivityUncertainty === null || point.diffusivityUncertainty === 0)) {
    const message = 'The point has no uncertainty of D to be weighted by: state or assign one, or choose equal weights';
    problems.push(badInput(message, `${path}.diffusivityUncertainty`));
  }
  return problems;
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

function isConstant(values: readonly number[]): boolean {
  const lowest = values.reduce((a, b) => Math.min(a, b), Infinity);
  const highest = values.reduce((a, b) => Math.max(a, b), 0);
  return highest - lowest <= SAME * highest;
}
