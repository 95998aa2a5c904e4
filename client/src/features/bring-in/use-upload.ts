import { useMutation } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { HttpProblem } from '../../lib/http';
import { bringInStrings } from '../../strings/bring-in';
import { type UploadedFile } from './draft';
import { MOST_BYTES, uploadFile } from './requests';

/** A file on its way up. */
export interface Upload {
  readonly send: (file: File) => void;
  readonly cancel: () => void;
  readonly name: string;
  readonly size: number;
  /** 0 to 1; null while nothing is sent. */
  readonly share: number | null;
  readonly failure: string | null;
}

/** Sends files up with their progress; the last one counts. */
export function useUpload(onDone: (file: UploadedFile) => void): Upload {
  const [share, setShare] = useState(0);
  const aborting = useRef<AbortController | null>(null);
  const sending = useMutation({
    mutationFn: (file: File) => {
      if (file.size > MOST_BYTES) throw new HttpProblem(413, bringInStrings.table.tooLarge);
      aborting.current?.abort();
      aborting.current = new AbortController();
      setShare(0);
      return uploadFile(file, { onProgress: setShare, signal: aborting.current.signal });
    },
    onSuccess: onDone,
  });
  const { variables, error } = sending;
  return {
    send: sending.mutate,
    cancel: () => aborting.current?.abort(),
    name: variables?.name ?? '',
    size: variables?.size ?? 0,
    share: sending.isPending ? share : null,
    failure: error instanceof HttpProblem ? error.message : null,
  };
}
