import { contrastReserve } from '@/lib/vision/contrast-reserve'
import { METHOD } from './constants'
import { clamp, inkContrast, pageLuminance } from './light'
import type { LightNeed, Spot, TextSize } from './types'

/** Reserves of spot reading and of the best reading rate, and their logarithms: the ends of the clarity scale. */
export const SPOT_READING = METHOD.reserve.spotReading.value
export const LOG_SPOT_READING = Math.log10(SPOT_READING)
export const LOG_BEST_READING = Math.log10(METHOD.reserve.bestReading.value)

/** The observer of the threshold model: age in years, target size in microsteradians. */
export type Eye = { age: number; size: number }

/** What a page gives to the eye: luminance factors in percent, and its front light's most in cd/m² (0: none). */
export type Surface = { yPage: number; yInk: number; frontLight: number }

export type Light = Pick<Spot, 'lux' | 'frontLight'>

export function eyeOf(lightNeed: LightNeed, text: TextSize): Eye {
  return { age: METHOD.reserve.age.value[lightNeed], size: METHOD.reserve.size.value[text] }
}

/** Luminance of this page in this light, cd/m²; the front light only where the spot lets it be used. */
export function luminanceIn(surface: Pick<Surface, 'yPage' | 'frontLight'>, light: Light): number {
  return pageLuminance(light.lux, surface.yPage, light.frontLight ? surface.frontLight : 0)
}

/** Contrast reserve of a page in one light: how many times more contrast than this eye needs; 0 outside the model. */
export function reserveIn(surface: Surface, light: Light, eye: Eye): number {
  const contrast = inkContrast(surface.yPage, surface.yInk)
  return contrastReserve({ contrast, luminance: luminanceIn(surface, light), ...eye })
}

/** ρ of Method 1, section 3: log₁₀ of the reserve between spot reading (3) and the best rate (30). */
export function fluency(reserve: number): number {
  return reserve > 0 ? clamp(Math.log10(reserve), LOG_SPOT_READING, LOG_BEST_READING) : LOG_SPOT_READING
}
