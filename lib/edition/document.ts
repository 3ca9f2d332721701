import type { deviceFigures } from '@/lib/method/figures'
import { derivedFigures } from '@/lib/method/figures'
import type { EditionDevice, Lab, MeasuredState } from '@/lib/method/types'

/** The method this code works by; an edition names it. */
export const METHOD_NUMBER = 1

/** What is known of a device besides its colours, as an edition prints it; null is "not stated". */
export type StatedFacts = Omit<
  EditionDevice,
  'provisional' | 'units' | 'page' | 'ink' | 'sessions' | 'whiteness' | 'tint' | 'withinLimits' | 'contrast'
>

/** Decimals kept of colours and their doubts, and of what is worked out from them: far below any doubt. */
const COLOUR_DECIMALS = 4
const DERIVED_DECIMALS = 3

/**
 * One device of an edition document. Whiteness, tint and contrast are worked out from the colours as printed, so that
 * whoever has the document gets the same figures.
 */
export function editionDevice(facts: StatedFacts, figures: ReturnType<typeof deviceFigures>): EditionDevice {
  const page = roundState(figures.page)
  const ink = roundState(figures.ink)
  const { whiteness, tint, withinLimits, contrast } = derivedFigures(page, ink)
  return {
    ...facts,
    provisional: figures.provisional,
    units: figures.units,
    page,
    ink,
    sessions: figures.sessions,
    whiteness: round(whiteness, DERIVED_DECIMALS),
    tint: round(tint, DERIVED_DECIMALS),
    withinLimits,
    contrast: round(contrast, DERIVED_DECIMALS),
  }
}

export function roundLab({ L, a, b }: Lab): Lab {
  return { L: round(L, COLOUR_DECIMALS), a: round(a, COLOUR_DECIMALS), b: round(b, COLOUR_DECIMALS) }
}

function roundState(state: MeasuredState): MeasuredState {
  return { ...roundLab(state), u: roundLab(state.u) }
}

/** Rounded half away from zero to so many decimals; never −0, which JSON would write as 0 and hash as such. */
function round(value: number, decimals: number): number {
  const scale = 10 ** decimals
  return (Math.sign(value) * Math.round(Math.abs(value) * scale)) / scale + 0
}
