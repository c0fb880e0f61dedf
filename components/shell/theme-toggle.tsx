'use client';
import { useSyncExternalStore } from 'react';
import { buttonStyle } from '@/components/ui/button-style';
import { Icon } from '@/components/ui/icon';
import { parseTheme, themeCookie, type Theme } from './theme';

const year = 31_536_000;
const dark = '(prefers-color-scheme: dark)';

function current(): Theme {
  return parseTheme(document.documentElement.dataset.theme) ?? (window.matchMedia(dark).matches ? 'night' : 'day');
}

function subscribe(onChange: () => void): () => void {
  const query = window.matchMedia(dark);
  const observer = new MutationObserver(onChange);
  query.addEventListener('change', onChange);
  observer.observe(document.documentElement, { attributeFilter: ['data-theme'] });
  return () => { query.removeEventListener('change', onChange); observer.disconnect(); };
}

/** Day bench or night bench; kept in a cookie, so that the server already answers in it. */
export function ThemeToggle() {
  const theme = useSyncExternalStore(subscribe, current, () => 'day' as Theme);
  const other: Theme = theme === 'day' ? 'night' : 'day';
  const change = () => {
    document.documentElement.dataset.theme = other;
    document.cookie = `${themeCookie}=${other}; Path=/; Max-Age=${year}; SameSite=Lax`;
  };
  return (
    <button type="button" data-theme-toggle="" aria-label="Night bench" title="Night bench" aria-pressed={theme === 'night'} onClick={change} className={buttonStyle('flat', 'regular', { square: true })}>
      <Icon name="moon" className="night:hidden" />
      <Icon name="sun" className="hidden night:block" />
    </button>
  );
}
