import { type CorrelationForm } from '../correlations/form.js';
import { type FitColumns } from './fit-columns.js';
import { type Validity } from './fit.types.js';

/**
 * Where D ∝ 1/P is assumed, it is taken to hold from 1 kPa (a choice, no source) to 400 kPa (D P of water in nitrogen
 * is constant to about 4 atm: C. V. Paganelli, F. K. Kurata, *Respir. Physiol.* 30 (1977) 15), widened to hold the points.
 */
const ASSUMED_PRESSURES = { minimum: 1e3, maximum: 4e5 };

/** The range of the points that carried weight. */
export function validityOf(form: CorrelationForm, columns: FitColumns, weights: Float64Array): Validity {
  const temperatures = extent(columns.temperature, weights);
  const pressures = extent(columns.pressure, weights);
  return {
    temperatureMinimum: temperatures.minimum,
    temperatureMaximum: temperatures.maximum,
    pressureMinimum: form.fitsPressure ? pressures.minimum : Math.min(pressures.minimum, ASSUMED_PRESSURES.minimum),
    pressureMaximum: form.fitsPressure ? pressures.maximum : Math.max(pressures.maximum, ASSUMED_PRESSURES.maximum),
    pressureBasis: form.fitsPressure ? 'MEASURED' : 'STATED',
  };
}

function extent(column: Float64Array, weights: Float64Array): { minimum: number; maximum: number } {
  let minimum = Infinity;
  let maximum = 0;
  for (let i = 0; i < column.length; i++) {
    if (weights[i] === 0) continue;
    minimum = Math.min(minimum, column[i]!);
    maximum = Math.max(maximum, column[i]!);
  }
  return { minimum, maximum };
}
