import { useQuery } from '@apollo/client/react';
import { EvaluateSheetDocument, type UncertaintyKind } from '../../gql/graphql';
import { useDebounced } from '../../lib/use-debounced';

export interface EvaluationTarget {
  readonly code: string;
  readonly number: string;
}

/** All in SI, as the service computed them. */
export interface Evaluated {
  readonly diffusivity: number;
  readonly standardUncertainty: number;
  readonly expandedUncertainty: number;
  readonly coverageFactor: number;
  readonly outside: boolean;
}

interface EvaluationState {
  readonly value: Evaluated | null;
  /** The answer shown is of an earlier question. */
  readonly busy: boolean;
  readonly error: unknown;
}

const TYPING_MS = 250;

/** Asks the service for D at one state, once typing has stopped. Nothing is computed here. */
export function useEvaluation(
  target: EvaluationTarget,
  temperature: number | null,
  pressure: number | null,
  kind: UncertaintyKind,
  skip = false,
): EvaluationState {
  const state = useDebounced(`${temperature} ${pressure}`, TYPING_MS);
  const settled = state === `${temperature} ${pressure}`;
  const [askedTemperature, askedPressure] = state.split(' ').map(Number);
  const impossible = temperature === null || pressure === null;
  const { data, previousData, error } = useQuery(EvaluateSheetDocument, {
    variables: { ...target, temperature: [askedTemperature ?? NaN], pressure: [askedPressure ?? NaN], kind },
    skip: skip || state.includes('null'),
  });
  const answer = (data ?? previousData)?.dataSheet?.version?.correlation.evaluate;
  const value = impossible || !answer ? null : firstOf(answer);
  return { value, busy: !impossible && !error && (!settled || !data), error: settled ? error : undefined };
}

interface Columns {
  readonly diffusivities: readonly number[];
  readonly standardUncertainties: readonly number[];
  readonly expandedUncertainties: readonly number[];
  readonly coverageFactor: number;
  readonly outside: readonly number[];
}

function firstOf(columns: Columns): Evaluated | null {
  const [diffusivity] = columns.diffusivities;
  const [standardUncertainty] = columns.standardUncertainties;
  const [expandedUncertainty] = columns.expandedUncertainties;
  if (diffusivity === undefined || standardUncertainty === undefined || expandedUncertainty === undefined) return null;
  const { coverageFactor, outside } = columns;
  return { diffusivity, standardUncertainty, expandedUncertainty, coverageFactor, outside: outside.includes(0) };
}
