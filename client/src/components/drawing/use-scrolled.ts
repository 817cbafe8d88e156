import { useEffect, useState } from 'react';
import type { RefObject } from 'react';

/** How far an element is scrolled to the right, px. */
export function useScrolled(ref: RefObject<HTMLElement | null>): number {
  const [scrolled, setScrolled] = useState(0);
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const read = () => setScrolled(element.scrollLeft);
    element.addEventListener('scroll', read, { passive: true });
    return () => element.removeEventListener('scroll', read);
  }, [ref]);
  return scrolled;
}
