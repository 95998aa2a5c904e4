import { useApolloClient } from '@apollo/client/react';
import { useMutation, useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { useDebounced } from '../../lib/use-debounced';
import { type ImportProgress } from './answer';
import { cancelImport, importProgress, keepTable } from './requests';

const ASKED_EVERY_MS = 700;
/** Short imports are over before anybody asks how far they are. */
const SHORT_MS = 1500;
const isOver = ({ phase }: ImportProgress): boolean => ['DONE', 'REFUSED', 'CANCELLED'].includes(phase);

/** An import: begun, followed, cancelled, and found again after a reload. */
export interface Keeping {
  readonly isRunning: boolean;
  readonly progress: ImportProgress | null;
  readonly keep: (body: object, onRefused: (error: unknown) => void) => void;
  readonly cancel: () => void;
}

/**
 * @param importId of an import that was begun, or null
 * @param onKept the series that is there now
 */
export function useKeeping(importId: string | null, onKept: (seriesId: string) => void): Keeping {
  const apollo = useApolloClient();
  const keeping = useMutation({
    mutationFn: keepTable,
    onSuccess: async (seriesId) => {
      // Lists that were read before do not hold the new series.
      await apollo.clearStore();
      onKept(seriesId);
    },
  });
  const [foundId] = useState(importId);
  const isLong = useDebounced(keeping.isPending, SHORT_MS) && keeping.isPending;
  const followedId = keeping.isIdle ? foundId : isLong ? importId : null;
  const followed = useQuery({
    queryKey: ['bring-in', 'import', followedId],
    queryFn: () => importProgress(followedId ?? ''),
    enabled: followedId !== null,
    refetchInterval: ({ state }) => (state.data && isOver(state.data) ? false : ASKED_EVERY_MS),
    staleTime: 0,
  });
  const progress = followedId === null ? null : (followed.data ?? null);
  const keptBefore = keeping.isIdle ? progress?.kept?.seriesId : undefined;
  useEffect(() => {
    if (keptBefore !== undefined) onKept(keptBefore);
  }, [keptBefore, onKept]);
  return {
    isRunning: keeping.isPending || (progress !== null && !isOver(progress)),
    progress,
    keep: (body, onRefused) => keeping.mutate(body, { onError: onRefused }),
    cancel: () => {
      if (importId !== null) void cancelImport(importId);
    },
  };
}
