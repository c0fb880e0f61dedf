import { themeCookie } from './theme';

/** What the toggle of the bench's light does, for a page that runs nothing else. */
export const themeScript = `(() => {
  const root = document.documentElement, toggle = document.querySelector('[data-theme-toggle]'), dark = matchMedia('(prefers-color-scheme: dark)');
  const night = () => (root.dataset.theme ?? (dark.matches ? 'night' : 'day')) === 'night';
  const show = () => toggle?.setAttribute('aria-pressed', String(night()));
  toggle?.addEventListener('click', () => {
    root.dataset.theme = night() ? 'day' : 'night';
    document.cookie = '${themeCookie}=' + root.dataset.theme + '; Path=/; Max-Age=31536000; SameSite=Lax';
    show();
  });
  show();
})();`;
