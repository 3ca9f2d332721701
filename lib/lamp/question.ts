import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Answers } from '@/lib/method/types'

/** House: in this much light or more nobody turns a front light on, so the home page counts none. */
export const FRONT_LIGHT_BELOW_LUX = 100

/**
 * The reader the home page speaks of: the method's defaults, but one spot alone, in the lamp's light. The front light
 * may be used below 100 lux.
 * @param lux illuminance on the page, 0–200,000
 */
export function lampAnswers(lux: number): Answers {
  return { ...DEFAULT_ANSWERS, spots: [{ lux, hours: 1, frontLight: lux < FRONT_LIGHT_BELOW_LUX }] }
}
