import { useState } from 'react';
import { z } from 'zod';
import { remembered, useRemembered } from '../../lib/remembered';
import { choiceReducer, type Choice, type ChoiceAction } from './choice';
import { recipeSchema } from './recipe';

const reasons = z.record(z.string(), z.string());
const loose = Object.fromEntries(
  ['betweenSeries', 'referenceTemperature', 'referencePressure'].map((key) => [key, z.string()]),
);
const storedSchema = z.object({
  // What was being typed is kept as it was, readable or not.
  recipe: z.object({ ...recipeSchema.shape, ...loose }),
  seriesOut: reasons,
  pointsOut: reasons,
});

const read = (stored: unknown): Choice | undefined => {
  const parsed = storedSchema.safeParse(stored);
  return parsed.success ? parsed.data : undefined;
};

/**
 * The choice now being made for a pair; it survives a reload of the page.
 *
 * @param start where choosing begins: the newest kept fit, or every accepted series
 */
export function useChoice(pairId: string, start: Choice) {
  const [store] = useState(() => remembered<Choice | null>(`diffolio.choice.${pairId}`, () => null, read));
  const choice = useRemembered(store) ?? start;
  return {
    choice,
    dispatch: (action: ChoiceAction) => store.set(choiceReducer(store.get() ?? start, action)),
    /** Back to where choosing began. */
    forget: () => store.set(null),
  };
}
