import { lightnessToY } from '@/lib/colour/lab'
import { surfaceOf } from '@/lib/method/fit'
import { type Eye, luminanceIn, reserveIn, SPOT_READING } from '@/lib/method/reserve'
import type { EditionDevice, Lab, Spot } from '@/lib/method/types'

/** Lightness of the print on the control paper the reserves are drawn with, L* (house): that of the bright reference. */
export const PRINT_LIGHTNESS = 20

/** A device's contrast reserve in one spot; `readable` from three times what the eye needs. */
export type InLight = { reserve: number; readable: boolean; frontLightOn: boolean }

export function deviceInLight(device: EditionDevice, spot: Spot, eye: Eye): InLight {
  const surface = surfaceOf(device)
  const reserve = reserveIn(surface, spot, eye)
  const frontLightOn = luminanceIn(surface, spot) > luminanceIn(surface, { ...spot, frontLight: false })
  return { reserve, readable: reserve >= SPOT_READING, frontLightOn }
}

/** Contrast reserve of print on the control paper, which has no light of its own. */
export function paperInLight(paper: Lab, spot: Spot, eye: Eye): InLight {
  const surface = { yPage: lightnessToY(paper.L), yInk: lightnessToY(PRINT_LIGHTNESS), frontLight: 0 }
  const reserve = reserveIn(surface, spot, eye)
  return { reserve, readable: reserve >= SPOT_READING, frontLightOn: false }
}

/** The spots in which none of these devices can be read. */
export function darkSpots<S extends Spot>(spots: readonly S[], devices: readonly EditionDevice[], eye: Eye): S[] {
  return spots.filter((spot) => devices.every((device) => !deviceInLight(device, spot, eye).readable))
}
