import { skipToken, useQuery } from '@apollo/client/react';
import { useMemo, useState } from 'react';
import {
  type FitCorrelationInput,
  PreviewFitDocument,
  type PreviewFitQuery,
  type PreviewFitQueryVariables,
} from '../../gql/graphql';
import { useDebounced } from '../../lib/use-debounced';

export type Analysis = NonNullable<PreviewFitQuery['previewFit']['analysis']>;

export interface Preview {
  /** Of this choice, or of the last one that could be fitted. */
  readonly analysis: Analysis | null;
  /** K, along which its curve was computed */
  readonly temperatures: readonly number[];
  /** The analysis is of the choice as it stands. */
  readonly isCurrent: boolean;
  readonly busy: boolean;
  readonly problems: PreviewFitQuery['previewFit']['problems'];
  readonly error: unknown;
  readonly retry: () => void;
}

const CHOOSING_MS = 250;

/** Computes the fit of a choice once choosing has paused; the last good result stays until there is a better one. */
export function usePreview(input: FitCorrelationInput | null, temperatures: readonly number[]): Preview {
  const wanted = useMemo(
    () => (input === null ? null : JSON.stringify(variablesOf(input, temperatures))),
    [input, temperatures],
  );
  const asked = useDebounced(wanted, CHOOSING_MS);
  const variables = useMemo(() => (asked === null ? null : (JSON.parse(asked) as PreviewFitQueryVariables)), [asked]);
  const { data, error, loading, refetch } = useQuery(
    PreviewFitDocument,
    variables === null ? skipToken : { variables },
  );
  const fresh = data?.previewFit.analysis ?? null;
  const [last, setLast] = useState<{ analysis: Analysis; temperatures: readonly number[] } | null>(null);
  if (fresh !== null && variables !== null && fresh !== last?.analysis) {
    setLast({ analysis: fresh, temperatures: variables.temperatures });
  }
  const settled = wanted === asked;
  return {
    analysis: fresh ?? last?.analysis ?? null,
    temperatures: fresh !== null && variables !== null ? variables.temperatures : (last?.temperatures ?? []),
    isCurrent: settled && fresh !== null,
    busy: wanted !== null && (!settled || loading),
    problems: settled ? (data?.previewFit.problems ?? []) : [],
    error: settled ? error : undefined,
    retry: () => void refetch(),
  };
}

const variablesOf = (input: FitCorrelationInput, temperatures: readonly number[]): PreviewFitQueryVariables => ({
  input,
  temperatures: [...temperatures],
  pressure: [input.referencePressure ?? 101_325],
  // Pooled points know no deviation between laboratories: there is no interval for a new one.
  withPrediction: input.seriesEffect !== 'POOLED',
});
