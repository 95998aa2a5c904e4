import { type RestatedShape } from './form.js';

/** For forms whose shape does not depend on the reference state: exponents stay what they are. */
export function sameShape(shape: ArrayLike<number>): RestatedShape {
  const kept = Float64Array.from(shape);
  const jacobian = Array.from(kept, (_, i) => Array.from(kept, (__, j) => (i === j ? 1 : 0)));
  return { shape: kept, jacobian };
}
