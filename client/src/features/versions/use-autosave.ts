import { useEffect, useState } from 'react';
import { type FieldValues, type UseFormReturn } from 'react-hook-form';
import { Saver, type SaveOutcome, type SaveState } from './saver';

const WRITING_MS = 1500;

interface Autosave<V> {
  /** Stores the values; never throws. The one of the first rendering is used throughout. */
  readonly save: (values: V, seen: number) => Promise<SaveOutcome>;
  /** The count of changes of what the form began with. */
  readonly seen: number;
}

/**
 * Saves a form whenever writing pauses, and what is left when the page is left.
 *
 * @returns the state, and a way to save at once that answers whether everything is stored
 */
export function useAutosave<V extends FieldValues>(form: UseFormReturn<V>, { save, seen }: Autosave<V>) {
  const [state, setState] = useState<SaveState>({ kind: 'saved', at: null });
  const [saver] = useState(
    () =>
      new Saver<V>(
        { read: async () => ((await form.trigger()) ? form.getValues() : null), save, tell: setState },
        seen,
      ),
  );
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const unsubscribe = form.subscribe({
      formState: { values: true },
      callback: () => {
        saver.touch();
        clearTimeout(timer);
        timer = setTimeout(() => void saver.saveNow(), WRITING_MS);
      },
    });
    const warn = (event: BeforeUnloadEvent) => saver.isDirty && event.preventDefault();
    addEventListener('beforeunload', warn);
    return () => {
      unsubscribe();
      clearTimeout(timer);
      removeEventListener('beforeunload', warn);
      void saver.saveNow();
    };
  }, [form, saver]);
  return { state, saveNow: () => saver.saveNow() };
}
