'use client';
import { useCallback, useEffect, useRef, useState } from 'react';

/** Heights of keyed elements, measured together. The returned function makes a ref for one key. */
export function useHeights(): readonly [ReadonlyMap<string, number>, (key: string) => (element: HTMLElement | null) => (() => void) | undefined] {
  const [heights, setHeights] = useState<ReadonlyMap<string, number>>(new Map());
  const observer = useRef<ResizeObserver | null>(null);
  const keys = useRef(new WeakMap<Element, string>());

  const observe = useCallback((element: HTMLElement, key: string) => {
    observer.current ??= new ResizeObserver((entries) => {
      setHeights((before) => {
        const after = new Map(before);
        for (const entry of entries) {
          const of = keys.current.get(entry.target);
          if (of !== undefined) after.set(of, Math.ceil(entry.borderBoxSize[0]?.blockSize ?? entry.contentRect.height));
        }
        return after;
      });
    });
    keys.current.set(element, key);
    observer.current.observe(element);
  }, []);
  useEffect(() => () => observer.current?.disconnect(), []);

  const refs = useRef(new Map<string, (element: HTMLElement | null) => (() => void) | undefined>());
  const refOf = useCallback((key: string) => {
    const known = refs.current.get(key);
    if (known) return known;
    const made = (element: HTMLElement | null) => {
      if (!element) return undefined;
      observe(element, key);
      return () => observer.current?.unobserve(element);
    };
    refs.current.set(key, made);
    return made;
  }, [observe]);
  return [heights, refOf];
}
