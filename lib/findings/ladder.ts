import { eyeOf, reserveIn, type Surface } from '@/lib/method/reserve'

const POINTS_A_DECADE = 8
const DECADES = 5

/** The lights a ladder is drawn at, lux: from 1 to 100,000, eight to a factor of ten. */
const LIGHTS = Array.from({ length: DECADES * POINTS_A_DECADE + 1 }, (_, i) => 10 ** (i / POINTS_A_DECADE))

/**
 * Contrast reserve of a page over the light falling on it, its front light off, for usual eyes and normal text.
 * @param surface luminance factors of page and ink, percent
 */
export function ladderPoints({ yPage, yInk }: Pick<Surface, 'yPage' | 'yInk'>): { lux: number; reserve: number }[] {
  const eye = eyeOf('usual', 'normal')
  return LIGHTS.map((lux) => ({
    lux,
    reserve: reserveIn({ yPage, yInk, frontLight: 0 }, { lux, frontLight: false }, eye),
  }))
}
