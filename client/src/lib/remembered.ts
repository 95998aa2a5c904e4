import { useSyncExternalStore } from 'react';

/** A value kept in this browser, shared by all that read it. */
export interface Remembered<T> {
  readonly get: () => T;
  readonly set: (value: T) => void;
  readonly subscribe: (listener: () => void) => () => void;
}

/**
 * A value that survives a reload. What was stored by an older page and no longer passes `read` counts as absent;
 * where storage is refused the value lives as long as the page.
 */
export function remembered<T>(key: string, initial: () => T, read: (stored: unknown) => T | undefined): Remembered<T> {
  const listeners = new Set<() => void>();
  let value: T | undefined;
  return {
    get: () => (value ??= stored(key, read) ?? initial()),
    set: (next) => {
      value = next;
      store(key, next);
      listeners.forEach((listener) => listener());
    },
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

/** Reads a remembered value and renders again when it changes. */
export const useRemembered = <T>(value: Remembered<T>): T => useSyncExternalStore(value.subscribe, value.get);

function stored<T>(key: string, read: (stored: unknown) => T | undefined): T | undefined {
  try {
    const text = localStorage.getItem(key);
    return text === null ? undefined : read(JSON.parse(text));
  } catch {
    return undefined;
  }
}

function store(key: string, value: unknown): void {
  try {
    localStorage.setItem(key, JSON.stringify(value));
  } catch {
    // A browser may refuse storage; then the choice holds until the page is closed.
  }
}
