import { formatNumber } from '@/lib/format/number'
import { clamp } from '@/lib/method/light'

/** Lux at which the patch is all lamp, white, and all daylight (house); a picture of the light, no measurement. */
const DARK = 0.1
const LAMP = 70
const WHITE = 400
const DAY = 8000

/** A small patch that goes from the dark through lamplight to daylight. Decoration: the light stands in words beside it. */
export function LightPatch({ lux }: { lux: number }) {
  const between = (from: number, to: number) =>
    `${formatNumber(100 * clamp(Math.log(Math.max(DARK, lux) / from) / Math.log(to / from)))}%`
  const lamp = `color-mix(in oklab, color-mix(in oklab, var(--color-brass-lit) 70%, white) ${between(DARK, LAMP)}, var(--color-deepest))`
  const room = `color-mix(in oklab, white ${between(LAMP, WHITE)}, ${lamp})`
  const background = `color-mix(in oklab, color-mix(in oklab, var(--color-noon) 28%, white) ${between(WHITE, DAY)}, ${room})`
  return (
    <span
      aria-hidden="true"
      className="mt-0.5 mr-3 block h-11 w-8 rounded-sheet border border-edge sm:mr-4.5 sm:w-13.5 paper:hidden"
      style={{ background }}
    />
  )
}
