import { type FitCorrelationInput, type FitSeriesFragment, type KeptFitFragment } from '../../gql/graphql';
import { reasonText } from './reasons';
import { recipeInput, recipeOfFit, usualRecipe, type Recipe } from './recipe';

type Reasons = Readonly<Record<string, string>>;

/** What is being fitted: the recipe, and what carries no weight with its reason, `code: words`. */
export interface Choice {
  readonly recipe: Recipe;
  /** By the id of the series. */
  readonly seriesOut: Reasons;
  /** By the id of the point. */
  readonly pointsOut: Reasons;
}

export type ChoiceAction =
  | { readonly type: 'recipe'; readonly recipe: Recipe }
  | { readonly type: 'leaveOutSeries' | 'leaveOutPoint'; readonly id: string; readonly reason: string }
  | { readonly type: 'takeInSeries' | 'takeInPoint'; readonly id: string }
  | { readonly type: 'startAgain'; readonly choice: Choice };

export function choiceReducer(choice: Choice, action: ChoiceAction): Choice {
  switch (action.type) {
    case 'recipe':
      return { ...choice, recipe: action.recipe };
    case 'leaveOutSeries':
      return { ...choice, seriesOut: withReason(choice.seriesOut, action) };
    case 'leaveOutPoint':
      return { ...choice, pointsOut: withReason(choice.pointsOut, action) };
    case 'takeInSeries':
      return { ...choice, seriesOut: without(choice.seriesOut, action.id) };
    case 'takeInPoint':
      return { ...choice, pointsOut: without(choice.pointsOut, action.id) };
    case 'startAgain':
      return action.choice;
  }
}

/** Nothing is left out without a reason: an empty one changes nothing. */
function withReason(reasons: Reasons, { id, reason }: { readonly id: string; readonly reason: string }): Reasons {
  return reason.trim() === '' ? reasons : { ...reasons, [id]: reason.trim() };
}

const without = (reasons: Reasons, id: string): Reasons =>
  Object.fromEntries(Object.entries(reasons).filter(([key]) => key !== id));

const accepted = (series: readonly FitSeriesFragment[]) => series.filter(({ status }) => status === 'ACCEPTED');

/** Where no fit is kept yet: every accepted series, of those that repeat the same data only the one repeated. */
export function firstChoice(series: readonly FitSeriesFragment[]): Choice {
  const ids = new Set(accepted(series).map(({ id }) => id));
  const repeats = accepted(series).flatMap(({ id, sameDataAs }) =>
    sameDataAs && ids.has(sameDataAs.id)
      ? [[id, reasonText('duplicate', `repeats the data of ${sameDataAs.title}`)] as const]
      : [],
  );
  return { recipe: usualRecipe, seriesOut: Object.fromEntries(repeats), pointsOut: {} };
}

/** The choice a kept fit was made from. Series accepted since are in. */
export function choiceOfFit(fit: KeptFitFragment): Choice {
  return {
    recipe: recipeOfFit(fit),
    seriesOut: Object.fromEntries(fit.leftOutSeries.map(({ series, reason }) => [series.id, reason])),
    pointsOut: Object.fromEntries(fit.excludedPoints.map(({ point, reason }) => [point.id, reason])),
  };
}

/** The choice as the service takes it; null while the recipe cannot be read or no series is in. */
export function fitInput(
  choice: Choice,
  pairId: string,
  series: readonly FitSeriesFragment[],
): FitCorrelationInput | null {
  const recipe = recipeInput(choice.recipe);
  const used = accepted(series).filter(({ id }) => choice.seriesOut[id] === undefined);
  if (recipe === null || used.length === 0) return null;
  const pointsOut = used.flatMap(({ points }) =>
    points.flatMap(({ id }) => {
      const reason = choice.pointsOut[id];
      return reason === undefined ? [] : [{ pointId: id, reason }];
    }),
  );
  const seriesOut = accepted(series).flatMap(({ id }) => {
    const reason = choice.seriesOut[id];
    return reason === undefined ? [] : [{ seriesId: id, reason }];
  });
  return {
    ...recipe,
    pairId,
    seriesIds: used.map(({ id }) => id),
    excludedPoints: pointsOut,
    leftOutSeries: seriesOut,
  };
}

/** Two choices that lead to the same fit. */
export const isSameChoice = (a: Choice, b: Choice): boolean => canonical(a) === canonical(b);

const canonical = ({ recipe, seriesOut, pointsOut }: Choice): string =>
  JSON.stringify([Object.entries(recipe).sort(), Object.entries(seriesOut).sort(), Object.entries(pointsOut).sort()]);
