'use client';
import { useEffect, useRef, useState, type RefObject } from 'react';

/** Width of an element in CSS pixels, kept up to date; `initial` until the first measurement. */
export function useWidth<E extends Element>(initial: number): readonly [RefObject<E | null>, number] {
  const ref = useRef<E>(null);
  const [width, setWidth] = useState(initial);
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setWidth(Math.max(200, Math.round(entry.contentRect.width)));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
