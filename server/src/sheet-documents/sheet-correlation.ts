import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { expressionOf } from '../numerics/fitting/expression-of.js';
import {
  PRINTED_UNITS,
  formatConcise,
  formatNumber,
  formatQuantity,
  formatShort,
  formatUncertainty,
  inPrintedUnit,
  withUnit,
} from './format-quantity.js';
import type { SheetCoefficient, SheetCorrelation, SheetParameter } from './sheet-content.types.js';
import type { FitFacts } from './sheet-facts.js';
import { sheetStrings } from './sheet-strings.js';
import { plain, typeset } from './typeset.js';
import type { EquationPiece, TextRun } from './typeset.types.js';

/** How the symbols of the forms are set. */
const LABELS: Readonly<Record<string, string>> = {
  D0: '*D*_{0}',
  T0: '*T*_{0}',
  P0: '*P*_{0}',
  sigma: '*σ*_{12}',
  epsilon: '*ε*_{12}/k',
  tau: '*τ*',
  tau_n: '*τ*_{n}',
};
const labelOf = (symbol: string): TextRun[] => typeset(LABELS[symbol] ?? `*${symbol}*`);

/** The correlation as the sheet shows it: equation, parameters, coefficients. */
export function sheetCorrelation(
  correlation: EvaluableCorrelation,
  fit: FitFacts,
  coverageFactor: number,
): SheetCorrelation {
  return {
    form: correlation.form,
    formName: sheetStrings.forms[correlation.form],
    equation: equationOf(correlation.form),
    spoken: spokenOf(correlation.form),
    expression: expressionOf(correlation),
    parameters: [
      ...correlation.parameters.map(fittedParameter),
      exactParameter('T0', 'temperature', correlation.referenceTemperature, 'K'),
      exactParameter('P0', 'pressure', correlation.referencePressure, 'Pa'),
      ...scatterParameters(correlation, fit),
    ],
    coefficients: coefficientsOf(correlation),
    degreesOfFreedom: correlation.degreesOfFreedom,
    coverageFactor,
  };
}

const piece = (runs: TextRun[]): EquationPiece => ({
  runs,
  numerator: null,
  denominator: null,
  bracketed: false,
  exponent: null,
});

const fraction = (
  numerator: string,
  denominator: string,
  bracketed: boolean,
  exponent: string | null,
): EquationPiece => ({
  runs: [],
  numerator: typeset(numerator),
  denominator: typeset(denominator),
  bracketed,
  exponent: exponent === null ? null : typeset(exponent),
});

/** D = D0 (T/T0)^n (P0/P)^m, m where it is fitted. */
function equationOf(form: EvaluableCorrelation['form']): EquationPiece[] {
  const freePressure = form === 'POWER_LAW_FREE_PRESSURE';
  return [
    piece(typeset('*D* = *D*_{0}')),
    fraction('*T*', '*T*_{0}', true, '*n*'),
    fraction('*P*_{0}', '*P*', freePressure, freePressure ? '*m*' : null),
  ];
}

const spokenOf = (form: EvaluableCorrelation['form']): string =>
  sheetStrings.spokenPowerLaw.replace(
    '{pressurePower}',
    form === 'POWER_LAW_FREE_PRESSURE' ? sheetStrings.spokenPressurePower : '',
  );

function fittedParameter(parameter: EvaluableCorrelation['parameters'][number]): SheetParameter {
  const { symbol, value, standardUncertainty, unit } = parameter;
  const isDiffusivity = unit === 'm2/s';
  const shown = isDiffusivity ? inPrintedUnit('diffusivity', value) : value;
  const shownUncertainty =
    isDiffusivity && standardUncertainty !== null
      ? inPrintedUnit('diffusivity', standardUncertainty)
      : standardUncertainty;
  const digits = shownUncertainty === null ? formatShort(shown) : formatConcise(shown, shownUncertainty);
  return {
    symbol,
    label: labelOf(symbol),
    value,
    standardUncertainty,
    unit,
    printed: withUnit(digits, isDiffusivity ? PRINTED_UNITS.diffusivity.symbol : unit),
    note: standardUncertainty === null ? sheetStrings.fixed : null,
  };
}

const exactParameter = (
  symbol: string,
  quantity: 'temperature' | 'pressure',
  value: number,
  unit: string,
): SheetParameter => ({
  symbol,
  label: labelOf(symbol),
  value,
  standardUncertainty: null,
  unit,
  printed: formatQuantity(quantity, value),
  note: sheetStrings.exact,
});

/** τ, the scatter of ln D between series, and τ_n, that of the exponent. */
function scatterParameters(correlation: EvaluableCorrelation, fit: FitFacts): SheetParameter[] {
  const { betweenSeriesDeviation: tau, betweenSeriesOrigin: origin } = fit.statistics;
  const rows: SheetParameter[] = [];
  const row = (symbol: string, value: number, printed: string, note: string): SheetParameter => ({
    symbol,
    label: labelOf(symbol),
    value,
    standardUncertainty: null,
    unit: '1',
    printed,
    note,
  });
  if (tau !== null) {
    const note = origin === 'ASSIGNED' ? sheetStrings.betweenSeriesAssigned : sheetStrings.betweenSeries;
    rows.push(row('tau', tau, withUnit(formatUncertainty(100 * tau), '%'), note));
  }
  const exponentTau = Math.sqrt(correlation.betweenSeries?.slope ?? 0);
  if (exponentTau > 0) rows.push(row('tau_n', exponentTau, formatUncertainty(exponentTau), sheetStrings.ofTheExponent));
  return rows;
}

/** r = cov(a, b)/(u(a) u(b)) of each pair of fitted parameters. */
function coefficientsOf(correlation: EvaluableCorrelation): SheetCoefficient[] {
  const { parameters } = correlation;
  const rows: SheetCoefficient[] = [];
  parameters.forEach((first, i) => {
    parameters.slice(i + 1).forEach((second, offset) => {
      const j = i + 1 + offset;
      const variances = (correlation.covariance[i]?.[i] ?? 0) * (correlation.covariance[j]?.[j] ?? 0);
      if (!(variances > 0)) return;
      const value = (correlation.covariance[i]?.[j] ?? 0) / Math.sqrt(variances);
      const label = [
        ...typeset('*r*('),
        ...labelOf(first.symbol),
        ...plain(', '),
        ...labelOf(second.symbol),
        ...plain(')'),
      ];
      rows.push({ label, value, printed: formatNumber(value, 3) });
    });
  });
  return rows;
}
