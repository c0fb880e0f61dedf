'use client';
import { useCallback, useEffect, useState } from 'react';

const named = /^#((?:finding|note)-[\w:.|@~-]+)$/u;

function fromAddress(): string | null {
  const found = named.exec(decodeURIComponent(window.location.hash));
  return found?.[1] ?? null;
}

/** The selected entry, kept in the address: every finding and note has a deep link. */
export function useSelectedEntry(): readonly [string | null, (key: string | null) => void] {
  const [selected, setSelected] = useState<string | null>(null);
  useEffect(() => {
    const read = () => setSelected(fromAddress());
    read();
    window.addEventListener('hashchange', read);
    return () => window.removeEventListener('hashchange', read);
  }, []);
  const select = useCallback((key: string | null) => {
    setSelected(key);
    window.history.replaceState(null, '', `${window.location.pathname}${window.location.search}${key === null ? '' : `#${key}`}`);
  }, []);
  return [selected, select];
}
