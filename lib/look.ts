/** The looks a reader can choose; without a choice the browser's own settings decide. */
export const THEMES = ['day', 'night', 'paper'] as const
export type Theme = (typeof THEMES)[number]

/** Units a reader can choose for sizes and weights: millimetres and grams, or inches and ounces. */
export const UNITS = ['metric', 'inch'] as const
export type Units = (typeof UNITS)[number]

/** How the site is shown to one reader. A null theme is left to the browser's settings. */
export type Look = { theme: Theme | null; units: Units }

/** The cookie that holds the choice, by its name: `night-inch`. */
export const LOOK_COOKIE = 'look'

export const DEFAULT_LOOK: Look = { theme: null, units: 'metric' }

/**
 * The name of a look, as the cookie and the first, inner part of every page's path hold it: `auto-metric`. Each page is
 * kept once for each name, so that a stored page can be in the reader's own look without a script.
 */
export function lookName({ theme, units }: Look): string {
  return `${theme ?? 'auto'}-${units}`
}

/** Every look there is. */
export const LOOKS: readonly Look[] = [null, ...THEMES].flatMap((theme) => UNITS.map((units) => ({ theme, units })))

/** A look by its name; null for anything else. */
export function parseLook(name: unknown): Look | null {
  return LOOKS.find((look) => lookName(look) === name) ?? null
}

/** A theme by its name; null for anything else, which means: automatic. */
export function parseTheme(value: unknown): Theme | null {
  return THEMES.find((theme) => theme === value) ?? null
}

/** A path as readers see it: rendered on the server, a page's own path begins with the name of a look. */
export function publicPath(path: string): string {
  const [, first, ...rest] = path.split('/')
  return parseLook(first) ? `/${rest.join('/')}` : path
}
