import { type RefObject, useLayoutEffect, useState } from 'react';
import { type Room } from './useDrawing';

const STEP = 40;

/**
 * Measures an element, in steps, so that dragging a window edge does not lay the circuit out again at
 * every pixel.
 *
 * @param ref element to measure.
 * @returns its size in px, null until it has one.
 */
export function useRoom(ref: RefObject<HTMLElement | null>): Room | null {
  const [room, setRoom] = useState<Room | null>(null);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => {
      const width = Math.round(element.clientWidth / STEP) * STEP;
      const height = Math.round(element.clientHeight / STEP) * STEP;
      if (width === 0 || height === 0) return;
      setRoom((old) => (old?.width === width && old.height === height ? old : { width, height }));
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref]);
  return room;
}
