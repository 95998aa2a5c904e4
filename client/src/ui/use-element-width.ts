import { useCallback, useState } from 'react';

/**
 * The inner width of an element in CSS px, kept current; `fallback` until it is known.
 *
 * @returns the width, and the ref to hang on the element
 */
export function useElementWidth(
  fallback: number,
): readonly [number, (element: Element | null) => (() => void) | undefined] {
  const [width, setWidth] = useState(fallback);
  const ref = useCallback((element: Element | null) => {
    if (element === null || typeof ResizeObserver === 'undefined') return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidth(Math.round(entry.contentRect.width));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [width, ref];
}
