import { type RefObject, useLayoutEffect, useState } from 'react';

/**
 * Measures how wide an element is.
 *
 * @param ref element that may appear later.
 * @returns px, 640 until it is measured.
 */
export function useWidth(ref: RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(640);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => element.clientWidth > 0 && setWidth(element.clientWidth);
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  });
  return width;
}
