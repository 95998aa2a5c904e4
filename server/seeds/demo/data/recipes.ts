import { type FitRecipe } from '../../../src/numerics/fitting/fit.types.js';

/** How the invented group usually fits. */
export const USUAL_RECIPE: FitRecipe = {
  form: 'POWER_LAW',
  objective: 'LN_DIFFUSIVITY',
  weighting: 'EFFECTIVE_VARIANCE',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE',
  betweenSeriesDeviation: null,
  referenceTemperature: 298.15,
  referencePressure: 101_325,
};
