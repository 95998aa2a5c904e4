import { HttpProblem, request } from './http';
import { accessToken, refreshSession } from './session';

type Options = Omit<Parameters<typeof request>[1], 'accessToken'>;

/**
 * Sends a request of the person signed in. An access token lives for minutes: when it has run out it is refreshed and the
 * request sent once more.
 *
 * @throws {HttpProblem} as `request` does
 */
export const requestAsPerson = <T>(path: string, options: Options, read: (answer: unknown) => T): Promise<T> =>
  asPerson(() => request(path, { ...options, accessToken: accessToken() }, read));

/** Does what needs an access token, a second time when the first was refused for want of a fresh one. */
export async function asPerson<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof HttpProblem) || error.status !== 401 || !(await refreshSession())) throw error;
    return work();
  }
}
