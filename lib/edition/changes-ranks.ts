import type { RankedDevice } from '@/lib/method/types'

type Ranked = Pick<RankedDevice, 'slug' | 'fit' | 'sd' | 'rank95'>

/** Where a device stands in one edition's ranking: its place by fit, counted from 1, and the band the doubt allows. */
export type Standing = { place: number; rank95: [number, number]; fit: number; sd: number }

/**
 * How one device's place came to change. Its new place is the old one, plus the devices added above it and those that
 * passed it, less the ones it passed and the ones withdrawn from above it.
 */
export type Move = {
  slug: string
  /** Null where it is in one of the editions only. */
  before: Standing | null
  after: Standing | null
  addedAbove: string[]
  withdrawnAbove: string[]
  passed: string[]
  passedBy: string[]
}

/**
 * Every device of either ranking with its places in both, in the order of the new one; withdrawn devices last.
 * @param before ranking of the older edition, best fit first
 * @param after ranking of the newer one by the same answers
 */
export function rankMoves(before: readonly Ranked[], after: readonly Ranked[]): Move[] {
  const old = standings(before)
  const now = standings(after)
  const slugs = [...now.keys(), ...[...old.keys()].filter((slug) => !now.has(slug))]
  return slugs.map((slug) => {
    const [was, is] = [old.get(slug) ?? null, now.get(slug) ?? null]
    const move: Move = { slug, before: was, after: is, addedAbove: [], withdrawnAbove: [], passed: [], passedBy: [] }
    if (!was || !is) return move
    for (const other of slugs) {
      const [otherWas, otherIs] = [old.get(other), now.get(other)]
      const wasAbove = otherWas !== undefined && otherWas.place < was.place
      const isAbove = otherIs !== undefined && otherIs.place < is.place
      if (!otherWas && isAbove) move.addedAbove.push(other)
      else if (!otherIs && wasAbove) move.withdrawnAbove.push(other)
      else if (otherWas && otherIs && wasAbove && !isAbove && other !== slug) move.passed.push(other)
      else if (otherWas && otherIs && !wasAbove && isAbove) move.passedBy.push(other)
    }
    return move
  })
}

/** Whether there is something to say of it: it is new, gone, in another place, or in a band of other ends. */
export function hasMoved({ before, after }: Move): boolean {
  if (!before || !after) return true
  return before.place !== after.place || before.rank95.some((end, i) => end !== after.rank95[i])
}

function standings(ranked: readonly Ranked[]): Map<string, Standing> {
  return new Map(ranked.map(({ slug, fit, sd, rank95 }, i) => [slug, { place: i + 1, rank95, fit, sd }]))
}
