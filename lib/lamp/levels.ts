/** Both ends of the lamp's slider, lux on the page: lights off in bed, and full sun (Method 1, section 0). */
export const DARKEST_LUX = 0.1
export const BRIGHTEST_LUX = 80_000

/** The light the home page opens with: a small lamp at arm's length. */
export const OPENING_LUX = 80

/** Lights people know, darkest first; their lux are those of the method's reading spots. */
export const LEVELS = [
  { lux: 0.1, name: 'Lights off' },
  { lux: 5, name: 'Dim lamp far away' },
  { lux: 80, name: 'Bedside lamp' },
  { lux: 250, name: 'Reading lamp' },
  { lux: 400, name: 'Desk' },
  { lux: 1000, name: 'Beside a window' },
  { lux: 8000, name: 'Outdoors, shade' },
  { lux: 80_000, name: 'Full sun' },
] as const

const STEPS_A_DECADE = 20
const LOWEST = Math.log10(DARKEST_LUX)

/** Steps of the slider: twenty to a factor of ten, so that one step is about an eighth more light. */
export const LAST_STEP = Math.round((Math.log10(BRIGHTEST_LUX) - LOWEST) * STEPS_A_DECADE)

/** The light at a step of the slider, from 0 to LAST_STEP, to two figures; a step nearest to a level has the level's. */
export function luxAt(step: number): number {
  const level = LEVELS.find(({ lux }) => stepOf(lux) === step)
  return level?.lux ?? held(Number((10 ** (LOWEST + step / STEPS_A_DECADE)).toPrecision(2)))
}

/** The step nearest to a light. */
export function stepOf(lux: number): number {
  return Math.min(LAST_STEP, Math.round((Math.log10(held(lux)) - LOWEST) * STEPS_A_DECADE))
}

/** The level whose name comes nearest, by ratio: 100 lux is a bedside lamp, not a reading lamp. */
export function nearestLevel(lux: number): (typeof LEVELS)[number] {
  const away = (level: { lux: number }) => Math.abs(Math.log(held(lux) / level.lux))
  return LEVELS.reduce((best, level) => (away(level) < away(best) ? level : best))
}

/** A light from an address or a number field; null where it is no number. Outside the slider it takes the nearer end. */
export function parseLux(text: string | undefined): number | null {
  const plain = text?.trim().replaceAll(',', '')
  if (!plain || !/^\d{1,9}(\.\d{1,9})?$/.test(plain)) return null
  return held(Number(plain))
}

/** The light an address asks for, by lux or by the slider's step; a bedside lamp where it asks for none we understand. */
export function lightFrom({ lux, step }: { lux?: unknown; step?: unknown }): number {
  const asked = typeof lux === 'string' ? parseLux(lux) : null
  if (asked !== null) return asked
  return typeof step === 'string' && /^\d{1,3}$/.test(step) ? luxAt(Math.min(Number(step), LAST_STEP)) : OPENING_LUX
}

function held(lux: number): number {
  return Math.min(BRIGHTEST_LUX, Math.max(DARKEST_LUX, lux))
}
