import { useEffect, useState, type RefObject } from 'react';

/** True once the element has come within a screen's height of the reader: figures further down are not drawn yet. */
export function useNearScreen(element: RefObject<Element | null>): boolean {
  const [near, setNear] = useState(typeof IntersectionObserver === 'undefined');
  useEffect(() => {
    if (near || element.current === null) return undefined;
    const observer = new IntersectionObserver(
      (entries) => entries.some((entry) => entry.isIntersecting) && setNear(true),
      {
        rootMargin: '100% 0px',
      },
    );
    observer.observe(element.current);
    return () => observer.disconnect();
  }, [near, element]);
  return near;
}
