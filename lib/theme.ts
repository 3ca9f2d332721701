/** The looks a reader can choose; without a choice the browser's own settings decide. */
export const THEMES = ['day', 'night', 'paper'] as const
export type Theme = (typeof THEMES)[number]

/** The cookie that holds the choice. */
export const THEME_COOKIE = 'theme'

/** A theme by its name; null for anything else, which means: automatic. */
export function parseTheme(value: unknown): Theme | null {
  return THEMES.find((theme) => theme === value) ?? null
}
