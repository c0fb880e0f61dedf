'use client';
import { useCallback, useEffect, useRef, useState } from 'react';

interface Heights {
  readonly now: ReadonlyMap<string, number>;
  /** Last height of each while it was not folded. */
  readonly full: ReadonlyMap<string, number>;
}

const none: Heights = { now: new Map(), full: new Map() };

interface HeightsControl extends Heights {
  /** Ref for the element of one key; one that is folded says so in `data-folded`. */
  readonly refOf: (key: string) => (element: HTMLElement | null) => (() => void) | undefined;
  /** Forgets full heights, so that they are measured again. */
  readonly forget: () => void;
}

/** Heights of keyed elements, measured together. */
export function useHeights(): HeightsControl {
  const [heights, setHeights] = useState<Heights>(none);
  const observer = useRef<ResizeObserver | null>(null);
  const keys = useRef(new WeakMap<Element, string>());

  const observe = useCallback((element: HTMLElement, key: string) => {
    observer.current ??= new ResizeObserver((entries) => {
      setHeights((before) => {
        const now = new Map(before.now);
        const full = new Map(before.full);
        for (const entry of entries) {
          const of = keys.current.get(entry.target);
          if (of === undefined) continue;
          const height = Math.ceil(entry.borderBoxSize[0]?.blockSize ?? entry.contentRect.height);
          now.set(of, height);
          if (!entry.target.hasAttribute('data-folded')) full.set(of, height);
        }
        return { now, full };
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
  const forget = useCallback(() => setHeights((before) => ({ ...before, full: new Map() })), []);
  return { ...heights, refOf, forget };
}
