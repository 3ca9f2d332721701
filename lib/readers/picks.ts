import { groupTies } from '@/lib/method/groups'
import type { RankedDevice } from '@/lib/method/types'

/** House: groups are shown until at least so many devices are. */
const LEAST_SHOWN = 4

/** Devices a reader can read on somewhere, in groups too close to call, best fit first; and those of them shown. */
export type Picks = { readable: RankedDevice[]; groups: RankedDevice[][]; shown: RankedDevice[][] }

/**
 * The guide's picks: the leading groups of a ranking, whole, so that no tie is cut through. A device that cannot be read
 * in any of the reader's spots has fit 0 and is no pick.
 */
export function picksOf(ranked: readonly RankedDevice[]): Picks {
  const readable = ranked.filter(({ unreadable }) => unreadable < 1)
  const groups = groupTies(readable)
  const shown: RankedDevice[][] = []
  let count = 0
  for (const group of groups) {
    if (count >= LEAST_SHOWN) break
    shown.push(group)
    count += group.length
  }
  return { readable, groups, shown }
}

/** How sure the first place is, in a few words to stand above it. */
export function tieWords({ readable, groups }: Picks): string {
  const [first] = readable
  if (!first) return 'No device can be read here'
  if (readable.length === 1) return 'The only device left'
  const level = Math.max(groups[0]?.length ?? 1, first.tiedWith.length + 1)
  return level === 1
    ? 'Ahead of each of the others in at least 95 of 100 draws'
    : `${level} devices are too close to call`
}
