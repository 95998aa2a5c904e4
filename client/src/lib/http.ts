/** One field of a refused request, as in the `problems` of its answer. */
export interface FieldProblem {
  readonly path?: string;
  readonly message: string;
}

/** What the service refused, in the words of its problem document (RFC 9457). */
export class HttpProblem extends Error {
  constructor(
    readonly status: number,
    message: string,
    readonly retryAfterSeconds: number | null = null,
    readonly fields: readonly FieldProblem[] = [],
  ) {
    super(message);
    this.name = 'HttpProblem';
  }
}

interface RequestOptions {
  readonly method?: 'GET' | 'POST' | 'DELETE';
  readonly json?: unknown;
  readonly form?: FormData;
  readonly accessToken?: string | null;
  readonly signal?: AbortSignal;
}

/**
 * Sends a request beside GraphQL and reads its JSON answer with `read`.
 *
 * @throws {HttpProblem} when the service refuses, or (status 0) cannot be reached
 */
export async function request<T>(path: string, options: RequestOptions, read: (answer: unknown) => T): Promise<T> {
  const response = await send(path, options);
  if (!response.ok) throw await problemOf(response);
  const text = await response.text();
  return read(text === '' ? null : JSON.parse(text));
}

async function send(path: string, { method = 'GET', json, form, accessToken, signal }: RequestOptions) {
  const headers = new Headers({ Accept: 'application/json, application/problem+json' });
  if (json !== undefined) headers.set('Content-Type', 'application/json');
  if (accessToken) headers.set('Authorization', `Bearer ${accessToken}`);
  const body = form ?? (json === undefined ? null : JSON.stringify(json));
  try {
    return await fetch(path, { method, headers, body, credentials: 'same-origin', signal: signal ?? null });
  } catch (cause) {
    if (cause instanceof DOMException && cause.name === 'AbortError') throw cause;
    throw new HttpProblem(0, 'The service cannot be reached. What you typed is kept; try again.');
  }
}

/** The problem document of a refused request. */
export async function problemOf(response: Response): Promise<HttpProblem> {
  const problem = record(await response.json().catch(() => null));
  const message = text(problem['detail']) ?? text(problem['title']) ?? `The service answered ${response.status}.`;
  const retryAfter = Number(response.headers.get('Retry-After') ?? NaN);
  const fields = Array.isArray(problem['problems']) ? problem['problems'].flatMap(fieldProblem) : [];
  return new HttpProblem(response.status, message, Number.isFinite(retryAfter) ? retryAfter : null, fields);
}

function fieldProblem(entry: unknown): FieldProblem[] {
  const { path, message } = record(entry);
  const words = text(message);
  if (words === undefined) return [];
  const where = text(path);
  return [where === undefined ? { message: words } : { path: where, message: words }];
}

/** An object's fields, or none when `value` is not an object. */
export const record = (value: unknown): Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {};

const text = (value: unknown): string | undefined => (typeof value === 'string' ? value : undefined);
