export type Theme = 'day' | 'night';
export const themeCookie = 'holdoff-theme';

export function parseTheme(value: string | undefined): Theme | null {
  return value === 'day' || value === 'night' ? value : null;
}
