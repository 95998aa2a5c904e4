import { useSyncExternalStore } from 'react';
import { HttpProblem, record, request } from './http';

export type Role = 'MODELLER' | 'RESEARCHER' | 'EDITOR' | 'ADMINISTRATOR';

export interface SignedInPerson {
  readonly id: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

/** `unknown` until the first refresh has answered. */
export type Session =
  | { readonly status: 'unknown' }
  | { readonly status: 'signedOut' }
  | { readonly status: 'signedIn'; readonly person: SignedInPerson; readonly accessToken: string };

const REMEMBERED = 'diffolio.signed-in';
const listeners = new Set<() => void>();
let current: Session = { status: 'unknown' };
let refreshing: Promise<boolean> | null = null;

export const getSession = (): Session => current;
export const accessToken = (): string | null => (current.status === 'signedIn' ? current.accessToken : null);

export function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const useSession = (): Session => useSyncExternalStore(subscribe, getSession);

/** The person signed in, or null. */
export function usePerson(): SignedInPerson | null {
  const session = useSession();
  return session.status === 'signedIn' ? session.person : null;
}

export const hasRole = (person: SignedInPerson | null, ...roles: readonly Role[]): boolean =>
  person !== null && roles.some((role) => person.roles.includes(role));

/** Takes over the answer of a sign-in, an accepted invitation or a refresh. The token stays in memory only. */
export function openSession(answer: unknown): SignedInPerson {
  const { accessToken: token, person: personAnswer } = record(answer);
  const person = readPerson(personAnswer);
  if (typeof token !== 'string' || person === null)
    throw new HttpProblem(502, 'The service gave an unreadable answer.');
  become({ status: 'signedIn', person, accessToken: token });
  return person;
}

/** @throws {HttpProblem} 401 on a wrong pair, 429 after too many failed attempts */
export const signIn = (email: string, password: string): Promise<SignedInPerson> =>
  request('/api/auth/sign-in', { method: 'POST', json: { email, password } }, openSession);

export async function signOut(): Promise<void> {
  try {
    await request('/api/auth/sign-out', { method: 'POST', accessToken: accessToken() }, () => null);
  } finally {
    become({ status: 'signedOut' });
  }
}

/**
 * Gets a new access token for the refresh cookie; false when there is no session to go on with. One refresh at a time in
 * this browser: a token used twice would end every session of its family.
 */
export function refreshSession(): Promise<boolean> {
  refreshing ??= exclusively(refreshOnce).finally(() => {
    refreshing = null;
  });
  return refreshing;
}

/** Restores the session of an earlier page once; visitors who never signed in here cost no request. */
export async function restoreSession(): Promise<Session> {
  if (current.status === 'unknown') {
    if (isRemembered()) await refreshSession();
    else become({ status: 'signedOut' });
  }
  return current;
}

async function refreshOnce(): Promise<boolean> {
  try {
    await request('/api/auth/refresh', { method: 'POST' }, openSession);
    return true;
  } catch {
    become({ status: 'signedOut' });
    return false;
  }
}

function exclusively<T>(work: () => Promise<T>): Promise<T> {
  return 'locks' in navigator ? navigator.locks.request('diffolio.refresh', work) : work();
}

function become(next: Session): void {
  current = next;
  remember(next.status === 'signedIn');
  listeners.forEach((listener) => listener());
}

function isRemembered(): boolean {
  try {
    return localStorage.getItem(REMEMBERED) !== null;
  } catch {
    return true;
  }
}

function remember(signedIn: boolean): void {
  try {
    if (signedIn) localStorage.setItem(REMEMBERED, 'yes');
    else localStorage.removeItem(REMEMBERED);
  } catch {
    // Without storage every page asks the service once.
  }
}

const ROLES: readonly string[] = ['MODELLER', 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR'] satisfies Role[];

function readPerson(answer: unknown): SignedInPerson | null {
  const { id, name, roles } = record(answer);
  if (typeof id !== 'string' || typeof name !== 'string' || !Array.isArray(roles)) return null;
  return { id, name, roles: roles.filter((role): role is Role => ROLES.includes(role as string)) };
}
