import { SEEN, SMALLEST_STEP } from '@/lib/compare/seen'
import { formatRange, formatExact as n } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { AMOUNTS } from '@/lib/quiz/answers'
import { BAND_FACTOR, SIGHTS } from '@/lib/quiz/estimate'
import { HEAVY_TO_HOLD, LIGHT_TO_HOLD, LITTLE_TINT, SAME_FIT, SUITS, TINTS, UNSUITED } from '@/lib/quiz/thresholds'
import { AMOUNT_NAMES } from '@/lib/quiz/words'
import { READING_ANCHORS } from '@/lib/vision/contrast-reserve'
import type { WordThreshold } from './words-table'

const { spot, fluent, best } = READING_ANCHORS

/** From where to where a word holds, in an ascending scale. */
const upTo = (from: number, below: number | undefined) => {
  if (below === undefined) return `from ${n(from)}`
  return from === 0 ? `under ${n(below)}` : `from ${n(from)} to under ${n(below)}`
}

/** Words of this site that stand for a number, from the numbers the code decides by. */
export const HOUSE_WORDS: WordThreshold[] = [
  {
    words: 'too close to call',
    holds: `under ${n(METHOD.ties.clearlyAheadPercent.value)} % of draws ahead; of single figures, a difference within its doubt`,
    of: 'two devices',
    standing: 'house',
  },
  {
    words: 'cannot be read',
    holds: `reserve under ${n(spot)}`,
    of: 'contrast reserve, times',
    standing: 'anchors from memory',
  },
  {
    words: 'enough to read but short of fluent',
    holds: `reserve from ${n(spot)} to under ${n(fluent)}`,
    of: 'contrast reserve, times',
    standing: 'anchors from memory',
  },
  {
    words: 'all that the easiest reading asks for',
    holds: `reserve from ${n(best)}`,
    of: 'contrast reserve, times',
    standing: 'anchors from memory',
  },
  ...SEEN.map(({ from, words }, i) => ({
    words,
    holds: upTo(from, SEEN[i + 1]?.from),
    of: 'ΔE00 between two pages',
    standing: 'house',
  })),
  {
    words: 'a step too small to be told apart',
    holds: `under ${n(SMALLEST_STEP.whiteness)} of whiteness, under ${n(SMALLEST_STEP.tint)} of tint`,
    of: 'W₁₀ and T₁₀ of two pages',
    standing: 'common practice, no source',
  },
  ...TINTS.map(({ below, words }, i) => ({
    words,
    holds: upTo(TINTS[i - 1]?.below ?? 0, Number.isFinite(below) ? below : undefined),
    of: 'ΔC*ab from the preferred white',
    standing: 'house' as const,
  })),
  {
    words: 'what speaks for a page',
    holds: `a tint under ${n(LITTLE_TINT)}`,
    of: 'ΔC*ab from the preferred white',
    standing: 'house',
  },
  ...(['one-hand', 'two-hands'] as const).map((hold) => ({
    words: `light, heavy ${hold === 'one-hand' ? 'in one hand' : 'in two hands'}`,
    holds: `up to ${n(LIGHT_TO_HOLD[hold])} g, from ${n(HEAVY_TO_HOLD[hold])} g`,
    of: 'weight',
    standing: 'house' as const,
  })),
  {
    words: 'its inches suit what you read, or do not',
    holds: `from ${n(SUITS)}, under ${n(UNSUITED)}`,
    of: 'score of the size alone, 0 to 1',
    standing: 'house',
  },
  { words: 'the same fit', holds: `under ${n(SAME_FIT)} points apart`, of: 'two fits', standing: 'house' },
  ...AMOUNTS.map((amount) => ({
    words: AMOUNT_NAMES[amount],
    holds: `counts as ${n(amount)}`,
    of: 'share of one’s reading, by the sum of all shares',
    standing: 'house',
  })),
  ...SIGHTS.map(({ words, lux, low, high }) => ({
    words,
    holds: `${n(lux)} lux, band ${formatRange(low, high)}`,
    of: 'light by what one can see there',
    standing: 'bands common practice, middles house',
  })),
  {
    words: 'a light worked out from a lamp or a camera',
    holds: `may be off by a factor of ${n(BAND_FACTOR)} either way`,
    of: 'lux',
    standing: 'house',
  },
]
