import { formatList } from '@/lib/format/list'
import { formatShare } from '@/lib/format/number'
import { groupTies } from '@/lib/method/groups'
import type { RankedDevice } from '@/lib/method/types'

/** House: first in fewer than half of the draws is a whisker; in up to three quarters with a lead below a point, too. */
const WHISKER = { first: 0.5, points: 1, firstByPoints: 0.75 }
const MOST_NAMED = 5

/** How far the first is ahead: alone left, level, within the doubt by a whisker or a little, or clear of the others. */
export type Margin = 'alone' | 'whisker' | 'little' | 'clear'

export function marginOf(ranked: readonly Pick<RankedDevice, 'slug' | 'fit' | 'first' | 'tiedWith'>[]): Margin {
  const [first, second] = ranked
  if (!first || !second) return 'alone'
  const [group] = groupTies(ranked)
  if (!group || group.length < 2) return 'clear'
  const narrow = first.fit - second.fit < WHISKER.points && first.first < WHISKER.firstByPoints
  return first.first < WHISKER.first || narrow ? 'whisker' : 'little'
}

/** Behind the name of the first, in a headline. */
export const MARGIN_WORDS: Record<Margin, string> = {
  alone: '',
  whisker: 'by a whisker',
  little: 'by a little',
  clear: '',
}

/** Who else could be first, each with its share of the draws; null where the first stands clear. */
export function rivalsSentence(ranked: readonly RankedDevice[], nameOf: (slug: string) => string): string | null {
  const [, ...rivals] = groupTies(ranked)[0] ?? []
  if (rivals.length === 0) return null
  const named = rivals.slice(0, MOST_NAMED).map(({ slug, first }) => `${nameOf(slug)} (${formatShare(first)})`)
  const more = rivals.length - named.length
  const names = formatList(more > 0 ? [...named, `${more} more`] : named)
  return `Allowing for what we cannot measure better, ${names} could ${rivals.length > 1 ? 'each be' : 'also be'} first. Between these, choose on price, size or feel.`
}
