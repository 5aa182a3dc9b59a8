import { useLayoutEffect, useState, type RefObject } from 'react';

export type ElementSize = { readonly width: number; readonly height: number };

/** Inner size of an element in pixels, followed as it changes; zero before it is laid out. */
export function useSize(element: RefObject<HTMLElement | null>): ElementSize {
  const [size, setSize] = useState<ElementSize>({ width: 0, height: 0 });
  useLayoutEffect(() => {
    const watched = element.current;
    if (watched === null) return;
    const measure = () => setSize({ width: watched.clientWidth, height: watched.clientHeight });
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(watched);
    return () => observer.disconnect();
  }, [element]);
  return size;
}
