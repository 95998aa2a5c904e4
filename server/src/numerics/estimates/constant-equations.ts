import { type ConstantEquation, type EquationForm } from './constant-kinds.js';

type Coefficients = Readonly<Record<string, number>>;

/**
 * Value of a temperature-dependent constant.
 *
 * @param constant     with every coefficient of its form
 * @param temperatureK T > 0; whether it lies in the equation's range is the caller's to judge
 * @returns the value in `constant.unit`
 * @throws {RangeError} when a coefficient is missing, T is not positive, or T is not below the critical
 *                      temperature of a form that ends there
 */
export function evaluateConstant(constant: ConstantEquation, temperatureK: number): number {
  if (!(temperatureK > 0)) throw new RangeError(`temperature ${temperatureK} K is not positive`);
  return EQUATIONS[constant.form](constant.coefficients, temperatureK);
}

/** Whether T lies in the range the equation's source gives. */
export function coversTemperature(constant: ConstantEquation, temperatureK: number): boolean {
  const { temperatureMinimumK = 0, temperatureMaximumK = Infinity } = constant;
  return temperatureK >= temperatureMinimumK && temperatureK <= temperatureMaximumK;
}

const EQUATIONS: Record<EquationForm, (coefficients: Coefficients, T: number) => number> = {
  ANTOINE: antoine,
  WAGNER: wagner,
  FIVE_TERM: fiveTerm,
  RACKETT: rackett,
  TAU_POWERS: tauPowers,
};

/** log₁₀(p/Pa) = A − B/(T/K + C). Poling, Prausnitz, O'Connell 2001, Appendix A, with A for Pa instead of bar. */
function antoine(c: Coefficients, T: number): number {
  return 10 ** (read(c, 'A') - read(c, 'B') / (T + read(c, 'C')));
}

/** ln(p/p_c) = (A τ + B τ^1.5 + C τ³ + D τ⁶)/(1 − τ), τ = 1 − T/T_c. McGarry, Ind. Eng. Chem. Process Des. Dev. 1983, 22, 313. */
function wagner(c: Coefficients, T: number): number {
  const tau = reducedDistance(c, T);
  const terms = read(c, 'A') * tau + read(c, 'B') * tau ** 1.5 + read(c, 'C') * tau ** 3 + read(c, 'D') * tau ** 6;
  return read(c, 'criticalPressure') * Math.exp(terms / (1 - tau));
}

/** p/Pa = exp(C₁ + C₂/T + C₃ ln T + C₄ T^C₅). Perry's Chemical Engineers' Handbook, 8th ed., Table 2-8. */
function fiveTerm(c: Coefficients, T: number): number {
  const powerTerm = read(c, 'C4') * T ** read(c, 'C5');
  return Math.exp(read(c, 'C1') + read(c, 'C2') / T + read(c, 'C3') * Math.log(T) + powerTerm);
}

/** c/(mol/m³) = C₁/C₂^(1 + (1 − T/C₃)^C₄), T below C₃. Perry's Chemical Engineers' Handbook, 8th ed., Table 2-32. */
function rackett(c: Coefficients, T: number): number {
  const critical = read(c, 'C3');
  if (T >= critical) throw new RangeError(`temperature ${T} K is not below the critical temperature ${critical} K`);
  return read(c, 'C1') / read(c, 'C2') ** (1 + (1 - T / critical) ** read(c, 'C4'));
}

/** ρ/(kg/m³) = ρ_c + A τ^0.35 + B τ^(2/3) + C τ + D τ^(4/3), τ = 1 − T/T_c. VDI Heat Atlas, 2nd ed., D3.1. */
function tauPowers(c: Coefficients, T: number): number {
  const tau = reducedDistance(c, T);
  const lower = read(c, 'A') * tau ** 0.35 + read(c, 'B') * tau ** (2 / 3);
  return read(c, 'criticalDensity') + lower + read(c, 'C') * tau + read(c, 'D') * tau ** (4 / 3);
}

/** τ = 1 − T/T_c; the forms in τ hold below T_c alone. */
function reducedDistance(c: Coefficients, T: number): number {
  const critical = read(c, 'criticalTemperature');
  if (T >= critical) throw new RangeError(`temperature ${T} K is not below the critical temperature ${critical} K`);
  return 1 - T / critical;
}

function read(coefficients: Coefficients, name: string): number {
  const coefficient = coefficients[name];
  if (coefficient === undefined) throw new RangeError(`the equation lacks its coefficient ${name}`);
  return coefficient;
}
