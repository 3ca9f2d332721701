import { deltaE00 } from '@/lib/colour/difference'
import { labToLch, labToXyz, lightnessToY } from '@/lib/colour/lab'
import { cieWhiteness } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import { METHOD } from './constants'
import type { Lab } from './types'

export type DerivedFigures = {
  /** CIE whiteness W₁₀ and tint T₁₀ of the page, and whether CIE vouches for them (on e-paper never). */
  whiteness: number
  tint: number
  withinLimits: boolean
  /** Y_page/Y_ink, d/8° specular included. */
  contrast: number
  /** Chroma C*ab of the page, and its hue angle in degrees; null for a neutral. */
  chroma: number
  hue: number | null
  /** Luminance factors, percent. */
  yPage: number
  yInk: number
}

/** @throws RangeError where the page's L* is not in 20–100, or the ink's not in 0–100 */
export function requireFigures(page: Lab, ink: Lab): void {
  const least = METHOD.figures.leastLightness.value
  if (!(page.L >= least && page.L <= 100))
    throw new RangeError(`L* of a page must be from ${least} to 100, got ${page.L}`)
  if (!(ink.L >= 0 && ink.L <= 100)) throw new RangeError(`L* of an ink must be from 0 to 100, got ${ink.L}`)
}

/**
 * Figures that follow from a page and its ink.
 * @throws RangeError where the page's L* is not in 20–100 or the ink's not in 0–100; and for an ink of L* 0, whose
 *   contrast ratio has no value: no surface measured with the specular part sends nothing back
 */
export function derivedFigures(page: Lab, ink: Lab): DerivedFigures {
  requireFigures(page, ink)
  if (ink.L === 0) throw new RangeError('L* of an ink must be above 0 for a contrast ratio')
  return derive(page, ink)
}

/** `derivedFigures` a step outside its range too, for slopes at its ends. */
export function derive(page: Lab, ink: Lab): DerivedFigures {
  const xyy = xyzToXyy(labToXyz(page))
  const yInk = lightnessToY(ink.L)
  const { C, h } = labToLch(page)
  return { ...cieWhiteness(xyy), contrast: xyy.Y / yInk, chroma: C, hue: h, yPage: xyy.Y, yInk }
}

/** A page beside the named control paper: ΔE00, and how many times that paper's light it needs to look as light. */
export function besidePaper(page: Lab, paper: Lab): { deltaE00: number; timesTheLight: number } {
  return { deltaE00: deltaE00(page, paper), timesTheLight: lightnessToY(paper.L) / lightnessToY(page.L) }
}
