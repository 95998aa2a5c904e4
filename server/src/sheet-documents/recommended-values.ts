import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { newLaboratoryHalfWidths, recommendedAt } from './correlation-values.js';
import { multiplesOf, roundStep } from './axis-ticks.js';
import { formatExtent, formatQuantity } from './format-quantity.js';
import type { RecommendedValues } from './sheet-content.types.js';
import { sheetStrings } from './sheet-strings.js';
import { plain, typeset } from './typeset.js';

/** Rows between the ends of the range, at most. */
const MOST_ROWS = 18;

/**
 * Temperatures of the table: both ends of the validity range, rounded temperatures between them, and T0 where it lies inside.
 *
 * @returns ascending, K
 */
function recommendedTemperatures(correlation: EvaluableCorrelation): number[] {
  const { temperatureMinimum: minimum, temperatureMaximum: maximum } = correlation.validity;
  const step = roundStep(maximum - minimum, MOST_ROWS);
  const temperatures = new Set([minimum, maximum]);
  // A row that all but repeats an end says nothing.
  for (const T of multiplesOf(step, minimum, maximum)) {
    if (Math.min(T - minimum, maximum - T) > step / 20) temperatures.add(T);
  }
  const reference = correlation.referenceTemperature;
  if (reference >= minimum && reference <= maximum) temperatures.add(reference);
  return [...temperatures].sort((a, b) => a - b);
}

/** The table of recommended values at the reference pressure. */
export function recommendedValues(correlation: EvaluableCorrelation): RecommendedValues {
  const temperatures = recommendedTemperatures(correlation);
  const pressure = correlation.referencePressure;
  const { diffusivities, standardUncertainties, expandedUncertainties } = recommendedAt(correlation, temperatures, [
    pressure,
  ]);
  const referenceRow = temperatures.indexOf(correlation.referenceTemperature);
  return {
    pressure,
    temperatures,
    diffusivities,
    standardUncertainties,
    expandedUncertainties,
    newLaboratoryHalfWidths: newLaboratoryHalfWidths(correlation, temperatures),
    referenceRow: referenceRow < 0 ? null : referenceRow,
    note: typeset(sheetStrings.recommendedNote, {
      pressure: formatQuantity('pressure', pressure),
      range: formatExtent('pressure', correlation.validity.pressureMinimum, correlation.validity.pressureMaximum),
      exponent: correlation.form === 'POWER_LAW_FREE_PRESSURE' ? [{ text: 'm', style: 'SUPERSCRIPT' }] : plain(''),
    }),
  };
}
