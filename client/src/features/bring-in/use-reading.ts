import { keepPreviousData, useQuery, useQueryClient } from '@tanstack/react-query';
import { useDebounced } from '../../lib/use-debounced';
import { type ReadAnswer } from './answer';
import { type Draft } from './draft';
import { readBody, readTable } from './requests';

const TYPING_MS = 350;

/** What is understood of the table as it stands, kept current while one types and corrects. */
export interface Reading {
  readonly answer: ReadAnswer | null;
  readonly error: unknown;
  /** No answer yet. */
  readonly isReading: boolean;
  /** The answer shown is of a moment ago. */
  readonly isStale: boolean;
  readonly again: () => void;
  readonly cancel: () => void;
}

export function useReading(draft: Draft): Reading {
  const body = readBody(draft);
  const asked = body === null ? null : JSON.stringify(body);
  const settled = useDebounced(asked, TYPING_MS);
  const queries = useQueryClient();
  const key = ['bring-in', 'read', settled];
  const { data, error, isPending, isPlaceholderData, isFetching, refetch } = useQuery({
    queryKey: key,
    queryFn: ({ signal }) => readTable(JSON.parse(settled ?? '') as object, signal),
    enabled: settled !== null,
    placeholderData: keepPreviousData,
    staleTime: Infinity,
    gcTime: 60_000,
    retry: false,
  });
  const isThere = asked !== null && settled !== null;
  return {
    answer: isThere ? (data ?? null) : null,
    error: isThere ? error : null,
    isReading: isThere && isPending && isFetching,
    isStale: isPlaceholderData || asked !== settled,
    again: () => void refetch(),
    cancel: () => void queries.cancelQueries({ queryKey: key }),
  };
}
