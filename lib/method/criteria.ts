import { labToXyz, lightnessToY } from '@/lib/colour/lab'
import { cieWhiteness } from '@/lib/colour/whiteness'
import { METHOD } from './constants'
import { clamp } from './light'
import type { Surface } from './reserve'
import type { Lab, PreferredWhite } from './types'

/** The two colours of a page that decide whiteness and tint, without its uncertainty. */
type Tone = { a: number; b: number }

const { brightPage, brightInk, dimPage, dimInk, referenceFrontLight, tintSpan, alike } = METHOD.criteria

/** The fixed pages every score is measured between, so that one more device never moves the others. */
export const BRIGHT_PAGE: Surface = {
  yPage: lightnessToY(brightPage.value.L),
  yInk: lightnessToY(brightInk.value),
  frontLight: referenceFrontLight.value,
}
export const DIM_PAGE: Surface = {
  yPage: lightnessToY(dimPage.value.L),
  yInk: lightnessToY(dimInk.value),
  frontLight: referenceFrontLight.value,
}

/** X + Y + Z under which there is no chromaticity to speak of; a page of L* 20 has about 9. */
export const LEAST_TOTAL = 1e-9

/** W₁₀ of the reference pages as they are: the ends of the whiteness scale. */
export const WHITENESS_DIM = whitenessOf(dimPage.value)
export const WHITENESS_SPAN = whitenessOf(brightPage.value) - WHITENESS_DIM

export function whiteOf(preferred: PreferredWhite): Tone {
  return METHOD.criteria.preferredWhite.value[preferred]
}

/**
 * Clarity, 0–1, from hour-weighted sums of ρ above the dim page's: the device's over the bright page's.
 * @param span Σ η(ρ_bright − ρ_dim); where it vanishes every reference reads alike, and a device scores 1 if it reads
 *   no worse than they do, else 0
 */
export function clarityScore(gain: number, span: number): number {
  if (span < alike.value) return gain >= -alike.value ? 1 : 0
  return clamp(gain / span)
}

/** Whiteness, 0–1, around the white the reader prefers; bluer than that white earns nothing. */
export function whitenessScore(page: Lab, white: Tone): number {
  const seen = { L: page.L, a: page.a - white.a, b: Math.max(page.b - white.b, 0) }
  return clamp((whitenessOf(seen) - WHITENESS_DIM) / WHITENESS_SPAN)
}

/** Tint, 0–1: 1 at the preferred white, 0 from six units of a*b* away. */
export function tintScore(page: Tone, white: Tone): number {
  return clamp(1 - Math.sqrt((page.a - white.a) ** 2 + (page.b - white.b) ** 2) / tintSpan.value)
}

/** W₁₀; a colour that sends nothing back (L* 0 in a draw, or no real colour) has the chromaticity of the white: W = Y. */
function whitenessOf(lab: Lab): number {
  const { X, Y, Z } = labToXyz(lab)
  const total = X + Y + Z
  return total > LEAST_TOTAL ? cieWhiteness({ x: X / total, y: Y / total, Y }).whiteness : Y
}
