/**
 * What a colour difference ΔE00 means to an eye (house, after what the trade commonly takes: about 1 is just seen side
 * by side, 2 to 3 from memory or apart). Ascending; each holds from its number on.
 */
export const SEEN = [
  { from: 0, words: 'hard to tell apart side by side' },
  { from: 1, words: 'told apart side by side, hard to tell apart from memory' },
  { from: 3, words: 'told apart even when seen one after the other' },
] as const

/** Steps of whiteness and tint (Ganz) commonly described as too small to be told apart. */
export const SMALLEST_STEP = { whiteness: 5, tint: 0.5 }

/** The words for a colour difference, and those its doubt allows besides: less, more, or both. */
export type SeenWords = { words: string; orPerhaps: string[] }

/**
 * @param deltaE00 ≥ 0
 * @param doubt its expanded uncertainty, ≥ 0
 */
export function seenWords(deltaE00: number, doubt: number): SeenWords {
  const own = bandOf(deltaE00)
  const low = bandOf(Math.max(0, deltaE00 - doubt))
  const high = bandOf(deltaE00 + doubt)
  return {
    words: SEEN[own]!.words,
    orPerhaps: SEEN.slice(low, high + 1)
      .map(({ words }) => words)
      .filter((words) => words !== SEEN[own]!.words),
  }
}

function bandOf(deltaE00: number): number {
  return SEEN.findLastIndex(({ from }) => deltaE00 >= from)
}
