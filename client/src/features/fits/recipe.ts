import { z } from 'zod';
import { type FitCorrelationInput, type KeptFitFragment } from '../../gql/graphql';
import { formatShort } from '../../lib/format-quantity';
import { parseNumber } from '../../lib/parse-number';
import { fitStrings } from '../../strings/fits';

const words = fitStrings.recipe;

/** Forms that are offered. The service knows more names than it can fit yet. */
export const forms = ['POWER_LAW', 'POWER_LAW_FREE_PRESSURE'] as const;
export const objectives = ['LN_DIFFUSIVITY', 'DIFFUSIVITY'] as const;
export const weightings = ['EFFECTIVE_VARIANCE', 'STATED', 'EQUAL'] as const;
export const losses = ['LEAST_SQUARES', 'HUBER', 'BISQUARE'] as const;
export const seriesEffects = ['RANDOM_INTERCEPT_AND_SLOPE', 'RANDOM_INTERCEPT', 'POOLED'] as const;

const positive = (message: string) => z.string().refine((text) => (parseNumber(text) ?? 0) > 0, message);

/** What is typed and chosen in the recipe; T in K, P in kPa, the assigned deviation in percent or empty. */
export const recipeSchema = z.object({
  form: z.enum(forms),
  objective: z.enum(objectives),
  weighting: z.enum(weightings),
  loss: z.enum(losses),
  seriesEffect: z.enum(seriesEffects),
  betweenSeries: z
    .string()
    .refine((text) => text.trim() === '' || (parseNumber(text) ?? -1) >= 0, words.badBetweenSeries),
  referenceTemperature: positive(words.badTemperature),
  referencePressure: positive(words.badPressure),
});
export type Recipe = z.infer<typeof recipeSchema>;

export const usualRecipe: Recipe = {
  form: 'POWER_LAW',
  objective: 'LN_DIFFUSIVITY',
  weighting: 'EFFECTIVE_VARIANCE',
  loss: 'LEAST_SQUARES',
  seriesEffect: 'RANDOM_INTERCEPT_AND_SLOPE',
  betweenSeries: '',
  referenceTemperature: '298.15',
  referencePressure: '101.325',
};

type RecipeInput = Omit<FitCorrelationInput, 'pairId' | 'seriesIds' | 'excludedPoints' | 'leftOutSeries'>;

/** The recipe as the service takes it, SI; null while a field cannot be read. */
export function recipeInput(recipe: Recipe): RecipeInput | null {
  if (!recipeSchema.safeParse(recipe).success) return null;
  const { betweenSeries, referenceTemperature, referencePressure, ...choices } = recipe;
  const deviation = parseNumber(betweenSeries);
  return {
    ...choices,
    betweenSeriesDeviation: deviation === null ? null : deviation / 100,
    referenceTemperature: parseNumber(referenceTemperature),
    referencePressure: 1000 * (parseNumber(referencePressure) ?? NaN),
  };
}

const plain = (value: number): string => formatShort(value, 12).replaceAll('\u2009', '');

/** The recipe of a kept fit. */
export function recipeOfFit(fit: KeptFitFragment): Recipe {
  const { correlation, statistics } = fit;
  const assigned = statistics.betweenSeriesOrigin === 'ASSIGNED' ? statistics.betweenSeriesDeviation : null;
  return {
    form: forms.find((form) => form === correlation.form) ?? 'POWER_LAW',
    objective: fit.objective,
    weighting: fit.weighting,
    loss: fit.loss,
    seriesEffect: fit.seriesEffect,
    betweenSeries: assigned == null ? '' : plain(100 * assigned),
    referenceTemperature: plain(correlation.referenceTemperature),
    referencePressure: plain(correlation.referencePressure / 1000),
  };
}
