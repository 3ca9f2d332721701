import { deltaE00 } from '@/lib/colour/difference'
import { differenceDoubt, pairDoubt, type Quantity } from '@/lib/findings/difference'
import { derive } from '@/lib/method/derived-figures'
import type { Edition, EditionDevice, Lab } from '@/lib/method/types'
import { SMALLEST_STEP } from './seen'

/** How much more of a figure the one has than the other, and how sure that is. */
export type Difference = {
  /** Signed: above 0 the one has more. */
  by: number
  /** Expanded uncertainty of the difference (k = 2), in the figure's unit. */
  doubt: number
  /** Whether the difference is within its doubt: too close to call. */
  close: boolean
  /** Whether it is beyond its doubt, yet a step commonly taken as too small to be seen. */
  small: boolean
}

export const COMPARED = ['lightness', 'whiteness', 'tint', 'contrast'] as const
export type Compared = (typeof COMPARED)[number]

export type PairDifferences = {
  one: EditionDevice
  other: EditionDevice
  /** Colour difference ΔE00 of the two pages, and its expanded uncertainty. */
  colour: { deltaE00: number; doubt: number }
} & Record<Compared, Difference>

const QUANTITIES: Record<Compared, Quantity> = {
  lightness: ({ page }) => page.L,
  whiteness: ({ page, ink }) => derive(page, ink).whiteness,
  tint: ({ page, ink }) => derive(page, ink).tint,
  contrast: ({ page, ink }) => derive(page, ink).contrast,
}

/** The published figure, as frozen, so that a difference is that of the figures shown. */
const FIGURES: Record<Compared, (device: EditionDevice) => number> = {
  lightness: ({ page }) => page.L,
  whiteness: ({ whiteness }) => whiteness,
  tint: ({ tint }) => tint,
  contrast: ({ contrast }) => contrast,
}

/** How two pages of an edition differ, each difference with its doubt. Method 1, section 1. */
export function differencesOf(
  edition: Pick<Edition, 'uncertainty'>,
  one: EditionDevice,
  other: EditionDevice,
): PairDifferences {
  const difference = (name: Compared): Difference => {
    const by = FIGURES[name](one) - FIGURES[name](other)
    const doubt = differenceDoubt(edition, one, other, QUANTITIES[name])
    const close = Math.abs(by) <= doubt
    const step = name === 'whiteness' || name === 'tint' ? SMALLEST_STEP[name] : 0
    return { by, doubt, close, small: !close && Math.abs(by) < step }
  }
  return {
    one,
    other,
    colour: { deltaE00: deltaE00(one.page, other.page), doubt: colourDoubt(edition, one, other) },
    lightness: difference('lightness'),
    whiteness: difference('whiteness'),
    tint: difference('tint'),
    contrast: difference('contrast'),
  }
}

/** Below this the distance has no direction, and so no slope (house: far under what an instrument reads). */
const NO_DISTANCE = 1e-3

/**
 * Expanded uncertainty of ΔE00 of two pages, first order. For pages of one colour, where a distance has no slope, the
 * length of the three channels' own doubts as ΔE00.
 */
function colourDoubt(edition: Pick<Edition, 'uncertainty'>, one: EditionDevice, other: EditionDevice): number {
  const { page } = one
  if (deltaE00(page, other.page) >= NO_DISTANCE) {
    return pairDoubt(edition, one, other, (a, b) => deltaE00(a.page, b.page))
  }
  const along = (channel: keyof Lab) =>
    deltaE00(page, { ...page, [channel]: page[channel] + differenceDoubt(edition, one, other, (s) => s.page[channel]) })
  return Math.hypot(along('L'), along('a'), along('b'))
}
