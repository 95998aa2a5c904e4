import { type FitColumns } from './fit-columns.js';
import { type FitRecipe, type FitWarning } from './fit.types.js';

/** What the warnings are decided from. */
export interface WarningFacts {
  readonly columns: FitColumns;
  readonly recipe: FitRecipe;
  readonly parameterSymbols: readonly string[];
  readonly correlationMatrix: readonly (readonly number[])[];
  /** Cook's distance of each point, in canonical order */
  readonly cookDistances: Float64Array;
  readonly reducedChiSquare: number | null;
  readonly chiSquareProbability: number | null;
  readonly deviation: { readonly value: number; readonly origin: 'STATED' | 'ASSIGNED' } | null;
}

/** Temperatures closer than this, relatively, count as one (0.3 K at room temperature; a choice, no source). */
const ONE_TEMPERATURE = 1e-3;
const NARROW_RANGE = 50;
const INFLUENTIAL = 1;
const STRONG_CORRELATION = 0.999;
const IMPROBABLE = 0.05;

/** The doubts a fit deserves; none of them stops it. */
export function fitWarnings(facts: WarningFacts): FitWarning[] {
  return [
    ...ofTemperatures(facts.columns),
    ...ofSeries(facts),
    ...ofScatter(facts),
    ...ofInfluence(facts.cookDistances),
    ...ofCorrelations(facts),
  ];
}

function ofTemperatures({ temperature }: FitColumns): FitWarning[] {
  const sorted = temperature.slice().sort();
  const range = sorted[sorted.length - 1]! - sorted[0]!;
  const distinct = sorted.filter((value, i) => i === 0 || value - sorted[i - 1]! > ONE_TEMPERATURE * value).length;
  const warnings: FitWarning[] = [];
  if (distinct === 2) {
    warnings.push(
      warning(
        'TWO_TEMPERATURES',
        'The points have only two temperatures: whether the form holds between them cannot be seen',
      ),
    );
  }
  if (range < NARROW_RANGE) {
    const message = `The points span ${range.toFixed(1)} K, less than ${NARROW_RANGE} K: the exponent of T is weakly determined and should not be used beyond them`;
    warnings.push(warning('NARROW_TEMPERATURE_RANGE', message));
  }
  return warnings;
}

function ofSeries({ columns, recipe, deviation }: WarningFacts): FitWarning[] {
  const warnings: FitWarning[] = [];
  const series = columns.seriesCount;
  if (series === 1) {
    warnings.push(
      warning('ONE_SERIES', 'Only one series carries the fit: a bias of its method or laboratory cannot be seen'),
    );
  }
  if (deviation?.origin === 'ASSIGNED') {
    const reason =
      series < 3 ? `${series === 1 ? 'one series' : 'two series'} cannot show it` : 'it was given with the recipe';
    const message = `The between-series deviation of ${percent(deviation.value)} is assigned, not estimated: ${reason}. A difference of the exponent of T between laboratories is not included`;
    warnings.push(warning('ASSIGNED_DEVIATION', message, 'betweenSeriesDeviation'));
  }
  if (recipe.seriesEffect === 'POOLED' && series > 1) {
    const message =
      'Pooled: points of one series count as independent of each other. Where laboratories differ, the stated uncertainty is too small';
    warnings.push(warning('POOLED', message, 'seriesEffect'));
  }
  if (recipe.seriesEffect === 'RANDOM_INTERCEPT' && series > 1) {
    const message =
      'Random intercept only: where laboratories differ in the exponent of T, its uncertainty is too small';
    warnings.push(warning('RANDOM_INTERCEPT', message, 'seriesEffect'));
  }
  if (deviation?.origin === 'STATED' && deviation.value < 1e-6) {
    const message =
      'No between-series deviation shows in these data (τ = 0): intervals with few series are then wider than they need be';
    warnings.push(warning('CONSERVATIVE_INTERVALS', message));
  }
  return warnings;
}

function ofScatter({ recipe, reducedChiSquare, chiSquareProbability }: WarningFacts): FitWarning[] {
  if (
    recipe.seriesEffect !== 'POOLED' ||
    recipe.loss !== 'LEAST_SQUARES' ||
    reducedChiSquare === null ||
    chiSquareProbability === null
  )
    return [];
  if (reducedChiSquare <= 1 || chiSquareProbability >= IMPROBABLE) return [];
  const message = `The points scatter √χ²ᵣ = ${Math.sqrt(reducedChiSquare).toFixed(2)} times more than their uncertainties say; all standard uncertainties are multiplied by it`;
  return [warning('EXCESS_SCATTER', message)];
}

function ofInfluence(cookDistances: Float64Array): FitWarning[] {
  const count = cookDistances.filter((distance) => distance > INFLUENTIAL).length;
  if (count === 0) return [];
  const subject = count === 1 ? 'One point moves' : `${count} points each move`;
  return [
    warning(
      'INFLUENTIAL_POINT',
      `${subject} the correlation by more than its uncertainty (Cook’s distance above 1): look whether the result rests on it`,
    ),
  ];
}

function ofCorrelations({ correlationMatrix, parameterSymbols }: WarningFacts): FitWarning[] {
  const warnings: FitWarning[] = [];
  for (let i = 0; i < correlationMatrix.length; i++) {
    for (let j = 0; j < i; j++) {
      if (Math.abs(correlationMatrix[i]![j]!) <= STRONG_CORRELATION) continue;
      const pair = `${parameterSymbols[j]} and ${parameterSymbols[i]}`;
      const message = `${pair} are correlated by ${correlationMatrix[i]![j]!.toFixed(5)}: never use one without the other and their covariance`;
      warnings.push(warning('STRONG_CORRELATION', message));
    }
  }
  return warnings;
}

function warning(code: string, message: string, path: string | null = null): FitWarning {
  return { code, message, path };
}

function percent(relative: number): string {
  return `${(100 * relative).toPrecision(2)} %`;
}
