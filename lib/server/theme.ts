import 'server-only'
import { cookies } from 'next/headers'
import { parseTheme, THEME_COOKIE, type Theme } from '@/lib/theme'

/** The theme this reader chose; null leaves it to the browser's settings. */
export async function chosenTheme(): Promise<Theme | null> {
  return parseTheme((await cookies()).get(THEME_COOKIE)?.value)
}
