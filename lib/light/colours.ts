import { deltaE00 } from '@/lib/colour/difference'
import { type UnderLamp, underLamp } from '@/lib/colour/under-lamp'
import { WEIGHTS } from '@/lib/colour/weights'
import type { Lab } from '@/lib/method/types'
import type { LampName } from './lamps'
import type { DeviceSpectra } from './spectra'

/** A page under a lamp, worked out from its spectrum, beside the same readings in daylight. */
export type LampColour = {
  lamp: UnderLamp
  daylight: UnderLamp
  /** ΔE00 between the two as a used eye sees them. */
  change: number
  readings: number
}

/** How a page and its ink are drawn; `colour` is null where no spectrum is known and the daylight colour is kept. */
export type DrawnColour = { page: Lab; ink: Lab; colour: LampColour | null }

/**
 * The colour of a page under a lamp. With a spectrum: reflectance by the lamp's weights, adapted by CAT16. Without one
 * the published colour under D65 is kept, which takes colours for constant.
 * @param published page and ink, CIELAB under D65
 */
export function coloursUnder(
  name: LampName,
  published: { page: Lab; ink: Lab },
  spectra: DeviceSpectra | undefined,
): DrawnColour {
  if (!spectra) return { page: plain(published.page), ink: plain(published.ink), colour: null }
  const lamp = underLamp(spectra.page, WEIGHTS[name])
  const daylight = underLamp(spectra.page, WEIGHTS.D65)
  return {
    page: lamp.inDaylight,
    ink: underLamp(spectra.ink, WEIGHTS[name]).inDaylight,
    colour: { lamp, daylight, change: deltaE00(lamp.inDaylight, daylight.inDaylight), readings: spectra.readings },
  }
}

function plain({ L, a, b }: Lab): Lab {
  return { L, a, b }
}
