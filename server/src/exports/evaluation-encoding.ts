import type { EvaluationRequest } from '../fits/correlation-evaluation.js';
import type { Evaluation } from '../fits/correlation.types.js';

export type EvaluationFormat = 'JSON' | 'CSV' | 'NDJSON';
export const EVALUATION_MEDIA_TYPES: Readonly<Record<EvaluationFormat, string>> = {
  JSON: 'application/json',
  CSV: 'text/csv',
  NDJSON: 'application/x-ndjson',
};

/** Which version gave the values, and how it stands. */
export interface EvaluatedVersion {
  readonly sheet: string;
  readonly number: string;
  readonly status: string;
  readonly contentHash: string | null;
}

const CSV_HEAD =
  'temperature_k,pressure_pa,diffusivity_m2_s,standard_uncertainty_m2_s,expanded_uncertainty_m2_s,is_outside_range';

/** Values with every digit: JSON of columns, CSV, or JSON lines with a state on each. */
export function encodeEvaluation(
  format: EvaluationFormat,
  version: EvaluatedVersion,
  request: EvaluationRequest,
  evaluation: Evaluation,
): string {
  switch (format) {
    case 'JSON':
      return JSON.stringify({
        ...version,
        diffusivities: Array.from(evaluation.diffusivities),
        standardUncertainties: Array.from(evaluation.standardUncertainties),
        expandedUncertainties: Array.from(evaluation.expandedUncertainties),
        coverageFactor: evaluation.coverageFactor,
        outside: evaluation.outside,
      });
    case 'CSV':
      return lines(request, evaluation, csvRow, `${CSV_HEAD}\r\n`, '\r\n');
    case 'NDJSON':
      return lines(request, evaluation, jsonRow, '', '\n');
  }
}

interface State {
  readonly temperature: number;
  readonly pressure: number;
  readonly diffusivity: number;
  readonly standardUncertainty: number;
  readonly expandedUncertainty: number;
  readonly isOutsideRange: boolean;
}

const csvRow = (state: State): string =>
  `${state.temperature},${state.pressure},${state.diffusivity},${state.standardUncertainty},${state.expandedUncertainty},${state.isOutsideRange}`;

const jsonRow = (state: State): string => JSON.stringify(state);

function lines(
  { temperatures, pressures }: EvaluationRequest,
  evaluation: Evaluation,
  row: (state: State) => string,
  head: string,
  end: string,
): string {
  const outside = new Set(evaluation.outside);
  const rows = Array.from(temperatures, (temperature, i) =>
    row({
      temperature,
      pressure: pressures[pressures.length === 1 ? 0 : i] ?? Number.NaN,
      diffusivity: evaluation.diffusivities[i] ?? Number.NaN,
      standardUncertainty: evaluation.standardUncertainties[i] ?? Number.NaN,
      expandedUncertainty: evaluation.expandedUncertainties[i] ?? Number.NaN,
      isOutsideRange: outside.has(i),
    }),
  );
  return `${head}${rows.join(end)}${end}`;
}
