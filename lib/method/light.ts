import { METHOD } from './constants'
import type { FrontLight } from './types'

const COMFORT = METHOD.light.comfort.value

/** Held between low and high, [0, 1] unless told. NaN stays NaN: it is a bug further up. */
export function clamp(value: number, low = 0, high = 1): number {
  return Math.min(Math.max(value, low), high)
}

/** Most light the front light gives on a white page, cd/m²; 0 where there is none or nothing is stated. */
export function frontLightMax(frontLight: FrontLight): number {
  return frontLight ? frontLight.max : 0
}

/**
 * Luminance of a matte page, cd/m²: what the room gives, E·Y/(100·π), and from the front light as much as is missing
 * to 15 cd/m². Method 1, section 2.
 * @param lux illuminance on the page, 0–200,000
 * @param yPage luminance factor of the page, percent
 * @param frontLight most the front light gives, cd/m²; 0 where there is none or it may not be used
 */
export function pageLuminance(lux: number, yPage: number, frontLight: number): number {
  const ambient = (lux * yPage) / (100 * Math.PI)
  return ambient + clamp(COMFORT - ambient, 0, frontLight)
}

/** Michelson-like contrast of ink on page, 0–1, the same with and without a front light; 0 where ink is the lighter. */
export function inkContrast(yPage: number, yInk: number): number {
  return yPage > 0 ? Math.max(0, 1 - yInk / yPage) : 0
}
