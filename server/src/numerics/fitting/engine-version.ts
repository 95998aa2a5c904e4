/**
 * Version of the calculations. It rises with every change that can move a digit of a result, so that a stored fit can
 * name the engine that made it.
 */
export const ENGINE_VERSION = '1.0.0';
