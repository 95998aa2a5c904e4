import { type CorrelationForm, type ReducedData, type ReferenceState } from '../correlations/form.js';
import { lnResidual } from '../correlations/design.js';
import { weightedMean, type FitColumns } from './fit-columns.js';
import { type FitRecipe } from './fit.types.js';

/** A fit about to be made: its points in reduced coordinates about the centre of the data. */
export interface FitTask {
  readonly form: CorrelationForm;
  readonly recipe: FitRecipe;
  readonly columns: FitColumns;
  /** Reference state of the computation: the weighted means of ln T and ln P, where D0 and n are least correlated */
  readonly centre: ReferenceState;
  readonly data: ReducedData;
}

export function fitTask(form: CorrelationForm, recipe: FitRecipe, columns: FitColumns): FitTask {
  const weights = centreWeights(recipe, columns);
  const lnT = weightedMean(columns.lnTemperature, weights);
  const lnP = weightedMean(columns.lnPressure, weights);
  const data = {
    x: lessened(columns.lnTemperature, lnT),
    p: lessened(columns.lnPressure, lnP),
    lnDiffusivity: columns.lnDiffusivity,
  };
  return { form, recipe, columns, centre: { temperature: Math.exp(lnT), pressure: Math.exp(lnP) }, data };
}

function centreWeights({ weighting }: FitRecipe, { count, relativeU }: FitColumns): Float64Array {
  const weights = new Float64Array(count).fill(1);
  if (weighting === 'EQUAL') return weights;
  for (let i = 0; i < count; i++) weights[i] = relativeU.diffusivity[i]! ** -2;
  return weights;
}

function lessened(column: Float64Array, by: number): Float64Array {
  const result = column.slice();
  for (let i = 0; i < result.length; i++) result[i]! -= by;
  return result;
}

/** ln D − ln f at every point; `beta` is ln D0 at the centre, then the shape. */
export function lnDeviations(task: FitTask, beta: Float64Array): Float64Array {
  const deviations = lnResidual(task.form, beta.subarray(1), task.data, task.centre);
  for (let i = 0; i < deviations.length; i++) deviations[i]! -= beta[0]!;
  return deviations;
}

/**
 * Residuals of the objective relative to f: ln D − ln f, or (D − f)/f. Either way their derivative by ln D0 and the
 * shape is −∂ ln f, so that one weighted linear algebra serves both objectives.
 */
export function relativeResiduals(task: FitTask, deviations: Float64Array): Float64Array {
  return task.recipe.objective === 'LN_DIFFUSIVITY' ? deviations : deviations.map(Math.expm1);
}

/**
 * Variances of the relative residuals, before any common scale.
 *
 * STATED takes (u(D)/D)²; EFFECTIVE_VARIANCE adds what u(T) and u(P) do to f, by the fitted exponents (J. Orear,
 * *Am. J. Phys.* 50 (1982) 912); EQUAL is one unit of the objective: 1 in ln D, 1 m²/s in D.
 */
export function relativeVariances(task: FitTask, beta: Float64Array, deviations: Float64Array): Float64Array {
  const { form, recipe, columns, centre, data } = task;
  const shape = beta.subarray(1);
  const isEqual = recipe.weighting === 'EQUAL';
  const { diffusivity: uD, temperature: uT, pressure: uP } = columns.relativeU;
  const variances = new Float64Array(columns.count);
  for (let i = 0; i < variances.length; i++) variances[i] = isEqual ? 1 : uD[i]! * uD[i]!;
  if (recipe.objective === 'DIFFUSIVITY') {
    // What is stated in m²/s is brought to the fitted value: u(D)/f = (u(D)/D) (D/f).
    for (let i = 0; i < variances.length; i++) {
      const ratio = Math.exp(deviations[i]!) / (isEqual ? columns.diffusivity[i]! : 1);
      variances[i]! *= ratio * ratio;
    }
  }
  if (!variancesFollowFit(task)) return variances;
  const exponentOfP = form.pressureExponent(shape);
  for (let i = 0; i < variances.length; i++) {
    const exponentOfT = form.temperatureExponent(shape, data.x[i]!, centre);
    variances[i]! += (exponentOfT * uT[i]!) ** 2 + (exponentOfP * uP[i]!) ** 2;
  }
  return variances;
}

/** Do the variances move with the parameters, beyond what the objective's own solver follows? */
export function variancesFollowFit({ recipe, columns }: FitTask): boolean {
  const { temperature, pressure } = columns.relativeU;
  const isStated = (column: Float64Array) => column.some((u) => u > 0);
  return recipe.weighting === 'EFFECTIVE_VARIANCE' && (isStated(temperature) || isStated(pressure));
}
