'use client';
import { useCallback, useSyncExternalStore } from 'react';

const key = 'holdoff.resistor-form';
const changed = 'holdoff:resistor-form';

function subscribe(listener: () => void): () => void {
  window.addEventListener(changed, listener);
  window.addEventListener('storage', listener);
  return () => {
    window.removeEventListener(changed, listener);
    window.removeEventListener('storage', listener);
  };
}

function stored(): boolean {
  try {
    return localStorage.getItem(key) === 'zigzag';
  } catch {
    return false;
  }
}

/** Whether this browser shows resistors as zigzags, and how to change that. */
export function useResistorForm(): readonly [boolean, (zigzag: boolean) => void] {
  const zigzag = useSyncExternalStore(subscribe, stored, () => false);
  const set = useCallback((next: boolean) => {
    try {
      localStorage.setItem(key, next ? 'zigzag' : 'rectangle');
    } catch {
      return;
    }
    window.dispatchEvent(new Event(changed));
  }, []);
  return [zigzag, set];
}
