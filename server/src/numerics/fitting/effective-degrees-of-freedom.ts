import { type CorrelationForm, type ReferenceState } from '../correlations/form.js';
import { quadraticForm } from '../linear-algebra/matrices.js';
import { type Estimate } from './estimate.js';
import { type Validity } from './fit.types.js';

/** Beyond this, Student's t is the normal distribution to all digits printed. */
const NORMAL = 1e6;

/**
 * ν for expanded uncertainties: Welch–Satterthwaite (GUM G.4.1) over the estimated part of u², with its degrees of
 * freedom, and the known part, with infinitely many; the least value at the corners of the validity range, since one ν
 * serves the whole correlation. Null: known and normal.
 */
export function effectiveDegreesOfFreedom(
  form: CorrelationForm,
  estimate: Estimate,
  centre: ReferenceState,
  validity: Validity,
): number | null {
  const { beta, covariance, knownCovariance, degreesOfFreedom } = estimate;
  if (knownCovariance.every((row) => row.every((value) => value === 0))) return degreesOfFreedom;
  const shape = beta.subarray(1);
  const gradient = new Float64Array(beta.length).fill(1);
  const ratios = cornersOf(form, validity).map(({ temperature, pressure }) => {
    const x = Math.log(temperature / centre.temperature);
    const p = Math.log(pressure / centre.pressure);
    form.lnRatioGradient(shape, x, p, centre, gradient.subarray(1));
    const total = quadraticForm(covariance, gradient);
    return (total / (total - quadraticForm(knownCovariance, gradient))) ** 2;
  });
  const effective = degreesOfFreedom * ratios.reduce((least, ratio) => Math.min(least, ratio), Infinity);
  return effective < NORMAL ? effective : null;
}

/** The corners in T and, where it matters, in P. */
function cornersOf(form: CorrelationForm, range: Validity): ReferenceState[] {
  const pressures = form.fitsPressure ? [range.pressureMinimum, range.pressureMaximum] : [range.pressureMinimum];
  return [range.temperatureMinimum, range.temperatureMaximum].flatMap((temperature) =>
    pressures.map((pressure) => ({ temperature, pressure })),
  );
}
