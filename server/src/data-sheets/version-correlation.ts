import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { type StatedPressureRange } from './data-sheet-version.entity.js';

/** The correlation a version recommends: the fit's, within the range in P that its editor states. */
export function correlationOfVersion(
  fitted: EvaluableCorrelation,
  stated: StatedPressureRange | null,
): EvaluableCorrelation {
  const { form, parameters, covariance, degreesOfFreedom, referenceTemperature, referencePressure, betweenSeries } =
    fitted;
  const validity = stated
    ? {
        ...fitted.validity,
        pressureMinimum: stated.minimum,
        pressureMaximum: stated.maximum,
        pressureBasis: 'STATED' as const,
      }
    : fitted.validity;
  return {
    form,
    parameters,
    covariance,
    degreesOfFreedom,
    referenceTemperature,
    referencePressure,
    validity,
    betweenSeries,
  };
}
