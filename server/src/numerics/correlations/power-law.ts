import { linearStart } from './linear-start.js';
import { sameShape } from './same-shape.js';
import { DIFFUSIVITY_AT_REFERENCE, type CorrelationForm } from './form.js';

/**
 * D = D0 (T/T0)^n (P0/P): the default. Hard spheres give n = 3/2, real pairs 1.6 to 2.0.
 *
 * Source: T. R. Marrero, E. A. Mason, *J. Phys. Chem. Ref. Data* 1 (1972) 3, equation 4.3-2 with S = 0, written at a
 * reference state; D P constant at low density: R. B. Bird, W. E. Stewart, E. N. Lightfoot, *Transport Phenomena*,
 * 2nd ed., Wiley 2002, §17.3.
 */
export const powerLaw: CorrelationForm = {
  name: 'POWER_LAW',
  expression: 'D = D0 (T/T0)^n (P0/P)',
  parameters: [DIFFUSIVITY_AT_REFERENCE, { symbol: 'n', unit: '1', minimum: -Infinity, maximum: Infinity }],
  isLinear: true,
  fitsPressure: false,
  lnRatio: (shape, x, p) => shape[0]! * x - p,
  lnRatioGradient: (_shape, x, _p, _reference, into) => {
    into[0] = x;
  },
  temperatureExponent: (shape) => shape[0]!,
  pressureExponent: () => -1,
  start: (data, reference) => linearStart(powerLaw, data, reference),
  restate: sameShape,
  print: ([d0, n], { temperature, pressure }) => `${d0} * (T / ${temperature})^${n} * (${pressure} / P)`,
};
