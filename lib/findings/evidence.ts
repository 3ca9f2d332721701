import type { Lab } from '@/lib/method/types'
import { mean, pooledSd, sd } from '@/lib/stats/describe'

/** What of a set says how well a figure is known. */
export type EvidenceSet = {
  unit: string
  position: string
  state: 'page' | 'ink'
  /** Day of its session, ISO 8601. */
  measuredOn: string
  /** Readings that count. */
  readings: readonly Lab[]
}

export type Evidence = {
  readings: number
  sets: number
  units: number
  /** Positions on a unit; the most where units differ. */
  positions: number
  /** First and last day, ISO 8601. */
  from: string
  to: string
  /** Standard deviation of L* within sets of the page, pooled; null where no set has two readings. */
  repeatability: number | null
  /** Standard deviation of the units' L* of the page; null for a single unit. */
  betweenUnits: number | null
}

/** How well a device's page and ink are known, counted and pooled from the sets its figures rest on; null without any. */
export function evidenceOf(sets: readonly EvidenceSet[]): Evidence | null {
  const [first] = sets
  if (!first) return null
  const days = sets.map(({ measuredOn }) => measuredOn).sort()
  const units = groupBy(sets, ({ unit }) => unit)
  const pages = sets.filter(({ state }) => state === 'page')
  const lightness = ({ readings }: EvidenceSet) => readings.map(({ L }) => L)
  const unitMeans = groupBy(pages, ({ unit }) => unit).map((own) => mean(own.map((set) => mean(lightness(set)))))
  return {
    readings: sets.reduce((count, { readings }) => count + readings.length, 0),
    sets: sets.length,
    units: units.length,
    positions: Math.max(...units.map((own) => new Set(own.map(({ position }) => position)).size)),
    from: days[0] ?? first.measuredOn,
    to: days.at(-1) ?? first.measuredOn,
    repeatability: pooledSd(pages.map(lightness)),
    betweenUnits: sd(unitMeans),
  }
}

function groupBy<T>(items: readonly T[], key: (item: T) => string): T[][] {
  const groups = new Map<string, T[]>()
  for (const item of items) groups.set(key(item), [...(groups.get(key(item)) ?? []), item])
  return [...groups.values()]
}
