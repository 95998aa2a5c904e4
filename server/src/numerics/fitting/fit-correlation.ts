import { findForm } from '../correlations/forms.js';
import { type CorrelationForm } from '../correlations/form.js';
import { NoConvergence } from '../least-squares/solve.js';
import { EngineError, type EngineProblem } from './engine-error.js';
import { fitColumns } from './fit-columns.js';
import { notDeterminable, problemsOfDetermination, problemsOfInput } from './fit-checks.js';
import { fitTask } from './fit-task.js';
import { type FitOutcome, type FitRecipe, type FitSeries, type FittedCorrelation } from './fit.types.js';
import { fitMixed } from './mixed-fit.js';
import { fitPooled } from './pooled-fit.js';
import { reportFit } from './report-fit.js';

/**
 * Fits a correlation to series of one gas pair.
 *
 * What the caller can mend comes back as problems; nothing is thrown for data. The result depends on the numbers only:
 * the order of series and points, and the keys, change no bit. Every number of a result is finite.
 *
 * The derivation stands in the README of this folder.
 */
export function fitCorrelation(series: readonly FitSeries[], recipe: FitRecipe): FitOutcome {
  const problems = problemsOfInput(series, recipe);
  const form = findForm(recipe.form);
  if (problems.length > 0 || !form) return { ok: false, problems };
  const undetermined = problemsOfDetermination(series, form);
  if (undetermined.length > 0) return { ok: false, problems: undetermined };
  try {
    return fitSound(series, recipe, form);
  } catch (error) {
    return { ok: false, problems: [problemOf(error)] };
  }
}

function fitSound(series: readonly FitSeries[], recipe: FitRecipe, form: CorrelationForm): FitOutcome {
  const task = fitTask(form, recipe, fitColumns(series));
  const estimate = recipe.seriesEffect === 'POOLED' ? fitPooled(task) : fitMixed(task);
  const fit = reportFit(task, estimate, series);
  if (isFinite(fit)) return { ok: true, fit };
  return {
    ok: false,
    problems: [notDeterminable('No finite result: the points are too few for this recipe, or too far apart in size')],
  };
}

/** D0 may also have run down to zero at a far reference state, where nothing can be said in logarithms. */
function isFinite({ parameters, covariance, correlationMatrix }: FittedCorrelation): boolean {
  const numbers = [...parameters.map(({ value }) => value), ...covariance.flat(), ...correlationMatrix.flat()];
  return parameters[0]!.value > 0 && numbers.every(Number.isFinite);
}

/** Only what the data cause is a problem; anything else is a fault and goes on up. */
function problemOf(error: unknown): EngineProblem {
  if (error instanceof EngineError) return error.asProblem();
  if (error instanceof NoConvergence) return notDeterminable(error.message);
  throw error;
}
