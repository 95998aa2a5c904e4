/** The forms of the contract. Those in the list of `forms.ts` can be fitted and evaluated. */
export type CorrelationFormName =
  'POWER_LAW' | 'POWER_LAW_FREE_PRESSURE' | 'SUTHERLAND' | 'LOG_QUADRATIC' | 'THREE_TERM' | 'KINETIC_THEORY';

/** The state at which D0 is the value of D. */
export interface ReferenceState {
  /** T0, K */
  readonly temperature: number;
  /** P0, Pa */
  readonly pressure: number;
}

export interface FormParameter {
  /** As printed and in the API: D0, n, m */
  readonly symbol: string;
  /** UCUM code; `1` for a pure number */
  readonly unit: string;
  /** The parameter lies above `minimum` and below `maximum`; outside, the form has no meaning. */
  readonly minimum: number;
  readonly maximum: number;
}

/** What a starting value is found from: columns of equal length, in the reduced coordinates of `CorrelationForm`. */
export interface ReducedData {
  readonly x: Float64Array;
  readonly p: Float64Array;
  /** ln D, D in m²/s */
  readonly lnDiffusivity: Float64Array;
}

/**
 * A correlation D(T, P) = D0 · h(x, p; shape) with h = 1 at the reference state, x = ln(T/T0) and p = ln(P/P0).
 *
 * `parameters` lists D0 first; the others, in order, are the `shape`. All functions are pure and do not check their input.
 */
export interface CorrelationForm {
  readonly name: CorrelationFormName;
  /** The formula in symbols */
  readonly expression: string;
  readonly parameters: readonly FormParameter[];
  /** Does ln h depend linearly on the shape? Then ln D is fitted by one QR factorisation, without a start. */
  readonly isLinear: boolean;
  /** Is the exponent of P fitted, or is D ∝ 1/P assumed? */
  readonly fitsPressure: boolean;
  /** ln h */
  lnRatio(shape: ArrayLike<number>, x: number, p: number, reference: ReferenceState): number;
  /** ∂ ln h/∂ shape, written into `into` from index 0 */
  lnRatioGradient(
    shape: ArrayLike<number>,
    x: number,
    p: number,
    reference: ReferenceState,
    into: Float64Array | number[],
  ): void;
  /** ∂ ln D/∂ ln T */
  temperatureExponent(shape: ArrayLike<number>, x: number, reference: ReferenceState): number;
  /** ∂ ln D/∂ ln P */
  pressureExponent(shape: ArrayLike<number>): number;
  /** Starting values of the shape, in closed form, for objectives that are not linear in it. */
  start(data: ReducedData, reference: ReferenceState): Float64Array;
  /** The shape that gives the same function at another reference state. */
  restate(shape: ArrayLike<number>, from: ReferenceState, to: ReferenceState): RestatedShape;
  /** The formula in T (K) and P (Pa) with the numbers in place */
  print(parameters: readonly number[], reference: ReferenceState): string;
}

export interface RestatedShape {
  readonly shape: Float64Array;
  /** ∂ new shape/∂ old shape, a row for each new one */
  readonly jacobian: readonly (readonly number[])[];
}

/** The parameter every form begins with. */
export const DIFFUSIVITY_AT_REFERENCE: FormParameter = { symbol: 'D0', unit: 'm2/s', minimum: 0, maximum: Infinity };
