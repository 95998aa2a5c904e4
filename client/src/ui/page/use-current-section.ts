import { useCallback, useState } from 'react';

/** A section counts as being read once its head has come this near the top, in CSS px. */
const READING_LINE = 140;

/**
 * The number and title of the section now being read, as its `data-section` names it.
 *
 * @returns the words, and the ref to hang on the element around the sections
 */
export function useCurrentSection(): readonly [string, (leaf: HTMLElement | null) => (() => void) | undefined] {
  const [current, setCurrent] = useState('');
  const ref = useCallback((leaf: HTMLElement | null) => {
    if (leaf === null) return undefined;
    const look = () => {
      const sections = [...leaf.querySelectorAll<HTMLElement>('[data-section]')];
      const passed = sections.filter((section) => section.getBoundingClientRect().top <= READING_LINE);
      setCurrent((passed.at(-1) ?? sections[0])?.dataset['section'] ?? '');
    };
    const watcher = new MutationObserver(look);
    watcher.observe(leaf, { childList: true, subtree: true });
    addEventListener('scroll', look, { passive: true });
    look();
    return () => {
      watcher.disconnect();
      removeEventListener('scroll', look);
    };
  }, []);
  return [current, ref];
}
