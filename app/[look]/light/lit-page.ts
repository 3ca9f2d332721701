import { coloursUnder } from '@/lib/light/colours'
import type { LampName } from '@/lib/light/lamps'
import type { LitDevice } from '@/lib/light/ranking'
import type { DeviceSpectra } from '@/lib/light/spectra'
import { besidePaper } from '@/lib/method/derived-figures'
import { besidePaperUncertainty } from '@/lib/method/figure-doubts'
import type { Edition, EditionDevice, Lab } from '@/lib/method/types'

/** A page as it travels to the browser: what its place rests on, how it is drawn, and what no light changes. */
export type LitPage = LitDevice & {
  drawn: { page: Lab; ink: Lab }
  /** True where the daylight colour is kept under another lamp, no spectrum being known. */
  assumed: boolean
  /** Times the control paper's light that it needs to be as bright, its front light off; and the doubt of that. */
  timesTheLight: { value: number; doubt: number }
}

/** Only what the room needs travels to the browser. */
export function litPage(
  device: EditionDevice,
  { control, uncertainty }: Edition,
  lamp: LampName,
  spectra: DeviceSpectra | undefined,
): LitPage {
  const { slug, name, page, ink, sessions, frontLight } = device
  const { colour, ...drawn } = coloursUnder(lamp, { page, ink }, spectra)
  return {
    slug,
    name,
    page,
    ink,
    sessions,
    frontLight,
    drawn: { page: rounded(drawn.page), ink: rounded(drawn.ink) },
    assumed: colour === null && lamp !== 'D65',
    timesTheLight: {
      value: besidePaper(page, control.paper).timesTheLight,
      doubt: besidePaperUncertainty(device, uncertainty, control.paper).timesTheLight,
    },
  }
}

/** To two decimals: a display shows less. */
function rounded({ L, a, b }: Lab): Lab {
  const two = (value: number) => Number(value.toFixed(2))
  return { L: two(L), a: two(a), b: two(b) }
}
