/** What is known about the pair and the method when a table is judged. */
export interface Expectation {
  /** Estimate of D in m²/s at T in K and P in Pa; null where none can be had. */
  estimate: ((temperature: number, pressure: number) => number | null) | null;
  /** name of the method of estimation, for the messages */
  estimateLabel: string | null;
  /** usual relative standard uncertainty of D by the method of measurement */
  usualRelativeUncertainty: number;
}

/**
 * Where the pair has no estimate, D of some pair: 0.2 cm²/s at 298.15 K and 101.325 kPa, the middle of what gases do, with
 * T^1.75/P (Fuller, Schettler & Giddings, Ind. Eng. Chem. 58 (5) (1966) 18). It judges shape and order of size alone.
 */
export const anyPair = (temperature: number, pressure: number): number =>
  2e-5 * (temperature / 298.15) ** 1.75 * (101_325 / pressure);
