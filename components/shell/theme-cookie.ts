import { cookies } from 'next/headers';
import { parseTheme, themeCookie, type Theme } from './theme';

/** The bench light a reader chose, or null: then the system setting decides. */
export async function readTheme(): Promise<Theme | null> {
  return parseTheme((await cookies()).get(themeCookie)?.value);
}
