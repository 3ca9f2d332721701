import { lightnessToY } from '@/lib/colour/lab'
import { prepareAnswers, scoreDevice, surfaceOf } from '@/lib/method/fit'
import { clamp, pageLuminance } from '@/lib/method/light'
import { byFit } from '@/lib/method/order'
import { type Light, luminanceIn, type Surface } from '@/lib/method/reserve'
import type { EditionDevice, Lab } from '@/lib/method/types'
import { lampAnswers } from './question'

/** What the lamp needs of a device: little, since it travels with the page. */
export type LampDevice = Pick<
  EditionDevice,
  'slug' | 'name' | 'page' | 'ink' | 'frontLight' | 'diagonal' | 'weight' | 'ppi'
>

export type LampRow = {
  device: LampDevice
  /** 0–100; 0 where nothing can be read. */
  fit: number
  readable: boolean
  /** What the front light does in this light; `unstated` counts as none, `off`: nobody would turn one on. */
  frontLight: 'on' | 'none' | 'unstated' | 'off'
  /** How dark the page looks, 0 (as measured) to 1 (black): a picture, not a measurement. */
  gloom: number
}

/** Page luminances, cd/m², between which the picture darkens (house): at 15 a page looks as measured, at 0.02 black. */
const CLEAR = 15
const BLACK = 0.02

/** How dark a surface of this luminance, cd/m², looks in the picture: 0 as measured, 1 black. */
export function gloomAt(luminance: number): number {
  return luminance > 0 ? clamp(Math.log(CLEAR / luminance) / Math.log(CLEAR / BLACK)) : 1
}

/** How dark a paper looks in this light; it has no light of its own. */
export function gloomOfPaper(paper: Lab, lux: number): number {
  return gloomAt(pageLuminance(lux, lightnessToY(paper.L), 0))
}

function frontLightIn(light: Light, { frontLight }: LampDevice, surface: Surface): LampRow['frontLight'] {
  if (!light.frontLight) return 'off'
  if (frontLight === null) return 'unstated'
  if (surface.frontLight === 0) return 'none'
  return luminanceIn(surface, light) > luminanceIn(surface, { ...light, frontLight: false }) ? 'on' : 'off'
}

/**
 * Every device ordered by its fit for the lamp's reader in this light, by point values alone.
 * @param lux illuminance on the page, 0–200,000
 */
export function rankUnderLamp(devices: readonly LampDevice[], lux: number): LampRow[] {
  const prepared = prepareAnswers(lampAnswers(lux))
  const [light] = prepared.spots
  if (!light) return []
  return devices
    .map((device) => {
      const { fit, unreadable } = scoreDevice(device, prepared)
      const surface = surfaceOf(device)
      const luminance = luminanceIn(surface, light)
      return {
        device,
        fit,
        readable: unreadable < 1,
        frontLight: frontLightIn(light, device, surface),
        gloom: gloomAt(luminance),
      }
    })
    .sort((one, other) => byFit({ slug: one.device.slug, fit: one.fit }, { slug: other.device.slug, fit: other.fit }))
}
