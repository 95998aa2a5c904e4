import { linearStart } from './linear-start.js';
import { sameShape } from './same-shape.js';
import { DIFFUSIVITY_AT_REFERENCE, type CorrelationForm } from './form.js';

/**
 * D = D0 (T/T0)^n (P0/P)^m: to test m = 1, which dilute-gas theory demands (sources as for the power law).
 */
export const powerLawFreePressure: CorrelationForm = {
  name: 'POWER_LAW_FREE_PRESSURE',
  expression: 'D = D0 (T/T0)^n (P0/P)^m',
  parameters: [
    DIFFUSIVITY_AT_REFERENCE,
    { symbol: 'n', unit: '1', minimum: -Infinity, maximum: Infinity },
    { symbol: 'm', unit: '1', minimum: -Infinity, maximum: Infinity },
  ],
  isLinear: true,
  fitsPressure: true,
  lnRatio: (shape, x, p) => shape[0]! * x - shape[1]! * p,
  lnRatioGradient: (_shape, x, p, _reference, into) => {
    into[0] = x;
    into[1] = -p;
  },
  temperatureExponent: (shape) => shape[0]!,
  pressureExponent: (shape) => -shape[1]!,
  start: (data, reference) => linearStart(powerLawFreePressure, data, reference),
  restate: sameShape,
  print: ([d0, n, m], { temperature, pressure }) => `${d0} * (T / ${temperature})^${n} * (${pressure} / P)^${m}`,
};
