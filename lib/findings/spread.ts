import type { Lab } from '@/lib/method/types'
import { mean, pooledSd } from '@/lib/stats/describe'
import type { EvidenceSet } from './evidence'

/** What one unit, or one position, gave. */
export type SpreadRow = {
  name: string
  sets: number
  readings: number
  /** Mean of the set means; null where the state was not read there. */
  page: Lab | null
  ink: Lab | null
  /** L* of the page less the mean of all rows; null where there is none. */
  offset: number | null
  /** Standard deviation of L* within the page's sets, pooled; null where no set has two readings. */
  repeatability: number | null
}

/**
 * Sets gathered by unit or by position, in the order they come in. Offsets are from the mean of the rows, each
 * counting once, as a device's figure is the mean of its units'.
 */
export function spreadBy(sets: readonly EvidenceSet[], by: 'unit' | 'position'): SpreadRow[] {
  const names = [...new Set(sets.map((set) => set[by]))]
  const rows = names.map((name) => {
    const own = sets.filter((set) => set[by] === name)
    const pages = own.filter(({ state }) => state === 'page')
    return {
      name,
      sets: own.length,
      readings: own.reduce((count, { readings }) => count + readings.length, 0),
      page: meanOf(pages),
      ink: meanOf(own.filter(({ state }) => state === 'ink')),
      repeatability: pooledSd(pages.map(({ readings }) => readings.map(({ L }) => L))),
    }
  })
  const measured = rows.flatMap(({ page }) => (page ? [page.L] : []))
  const centre = measured.length > 0 ? mean(measured) : 0
  return rows.map((row) => ({ ...row, offset: row.page && row.page.L - centre }))
}

/** The mean of set means in L*, a*, b*; null without sets. */
function meanOf(sets: readonly EvidenceSet[]): Lab | null {
  if (sets.length === 0) return null
  const channel = (name: 'L' | 'a' | 'b') => mean(sets.map(({ readings }) => mean(readings.map((one) => one[name]))))
  return { L: channel('L'), a: channel('a'), b: channel('b') }
}
