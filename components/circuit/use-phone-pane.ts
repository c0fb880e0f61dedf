'use client';
import { useEffect, useState } from 'react';
import type { PhonePane } from './phone-switch';

/** Which pane a phone shows: the drawing, or the margin when the address names a finding or a note. */
export function usePhonePane(): readonly [PhonePane, (pane: PhonePane) => void] {
  const [pane, setPane] = useState<PhonePane>('drawing');
  useEffect(() => {
    const read = () => { if (/^#(?:finding|note)-/u.test(window.location.hash)) setPane('margin'); };
    read();
    window.addEventListener('hashchange', read);
    return () => window.removeEventListener('hashchange', read);
  }, []);
  return [pane, setPane];
}
