import { asPerson, requestAsPerson } from '../../lib/request-as-person';
import { HttpProblem, problemOf, record } from '../../lib/http';
import { accessToken } from '../../lib/session';
import { type ImportProgress, progressSchema, type ReadAnswer, readAnswerSchema } from './answer';
import { type Draft, readingOf, tableOf, type UploadedFile } from './draft';

/** The service takes a body of 1 MiB; a longer paste goes up as a file. */
export const LONGEST_TEXT = 300_000;
export const MOST_BYTES = 20 * 1024 * 1024;

/** What is asked about a table; null while there is none. */
export function readBody(draft: Draft): object | null {
  const table = tableOf(draft);
  if (table === null) return null;
  const { mapping, decisions, header } = draft;
  const ref = ({ id }: { id: string }) => (id === '' ? null : { id });
  return {
    ...table,
    ...readingOf(draft),
    mapping,
    decisions,
    a: ref(header.first),
    b: ref(header.second),
    method: header.method,
  };
}

/** What is kept: the table as it was decided, under its header. */
export function keepBody(draft: Draft, importId: string, commonPercent: number | null): object | null {
  const table = tableOf(draft);
  if (table === null) return null;
  const { mapping, decisions, header } = draft;
  return {
    importId,
    ...table,
    ...readingOf(draft),
    mapping,
    decisions,
    a: { id: header.first.id },
    b: { id: header.second.id },
    title: header.title.trim(),
    source: header.source.trim(),
    method: header.method.trim(),
    apparatus: header.apparatus.trim() || null,
    dataOrigin: header.dataOrigin,
    commonRelativeUncertainty: commonPercent === null ? null : commonPercent / 100,
    sameDataAsId: header.sameDataAsId || null,
  };
}

/** @throws {HttpProblem} 422 when it is no table */
export const readTable = (body: object, signal: AbortSignal): Promise<ReadAnswer> =>
  requestAsPerson('/api/bring-in/read', { method: 'POST', json: body, signal }, (answer) =>
    readAnswerSchema.parse(answer),
  );

/** @throws {HttpProblem} 422 when something has to be mended or decided; nothing is stored then */
export const keepTable = (body: object): Promise<string> =>
  requestAsPerson('/api/bring-in/keep', { method: 'POST', json: body }, (answer) => textIn(answer, 'seriesId'));

/** How far an import is; null when the service knows none of this id. */
export async function importProgress(id: string): Promise<ImportProgress | null> {
  try {
    return await requestAsPerson(importPath(id), {}, (answer) => progressSchema.parse(answer));
  } catch (error) {
    if (error instanceof HttpProblem && error.status === 404) return null;
    throw error;
  }
}

export const cancelImport = (id: string): Promise<ImportProgress> =>
  requestAsPerson(importPath(id), { method: 'DELETE' }, (answer) => progressSchema.parse(answer));

const importPath = (id: string): string => `/api/bring-in/imports/${encodeURIComponent(id)}`;

interface Following {
  /** 0 to 1 */
  readonly onProgress: (share: number) => void;
  readonly signal: AbortSignal;
}

/** Sends a file up. `fetch` does not tell how much of a body has gone, so the older interface does it. */
export const uploadFile = (file: File, following: Following): Promise<UploadedFile> =>
  asPerson(async () => {
    const response = await sendUp(file, following);
    if (!response.ok) throw await problemOf(response);
    const answer: unknown = await response.json();
    const { size } = record(answer);
    return {
      id: textIn(answer, 'id'),
      name: textIn(answer, 'name'),
      sha256: textIn(answer, 'sha256'),
      size: Number(size),
    };
  });

function sendUp(file: File, { onProgress, signal }: Following): Promise<Response> {
  return new Promise((resolve, reject) => {
    const sending = new XMLHttpRequest();
    sending.open('POST', '/api/files');
    sending.setRequestHeader('Authorization', `Bearer ${accessToken() ?? ''}`);
    sending.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0);
    sending.onload = () => resolve(new Response(sending.responseText, { status: sending.status }));
    sending.onerror = () =>
      reject(new HttpProblem(0, 'The file did not reach the service. Nothing was stored; try again.'));
    sending.onabort = () => reject(new DOMException('cancelled', 'AbortError'));
    signal.addEventListener('abort', () => sending.abort());
    const form = new FormData();
    form.append('file', file, file.name);
    sending.send(form);
  });
}

function textIn(answer: unknown, field: string): string {
  const value = record(answer)[field];
  if (typeof value !== 'string') throw new HttpProblem(502, 'The service gave an unreadable answer.');
  return value;
}
