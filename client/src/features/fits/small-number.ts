import { formatShort } from '../../lib/format-quantity';

/** Below this a deviation between series is what is left of the arithmetic. */
const NOTHING = 1e-6;

/** A deviation between series with two digits; 0 where there is none. */
export const deviationText = (value: number): string => (value < NOTHING ? '0' : formatShort(value, 2));
