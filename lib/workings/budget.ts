import type { Components } from '@/lib/method/figures'
import type { Lab } from '@/lib/method/types'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import { CHANNELS, type Channel } from './readings'

export type State = 'page' | 'ink'
export type PartId = 'reading' | 'position' | 'unit' | 'session' | 'common'

/** One line of an uncertainty budget; all sizes are standard (k = 1), in CIELAB units. */
export type Part = {
  id: PartId
  /** A: from our own repeated readings. B: from a certificate (JCGM 100, 4.2 and 4.3). */
  type: 'A' | 'B'
  /** Whether one error moves page and ink together. */
  shared: boolean
  /** The spread it comes from, and what that is divided by. */
  spread: Record<State, Lab>
  divisor: Record<State, number>
  u: Record<State, Lab>
  /** null: its source states none, and it counts as without end. */
  degrees: number | null
}

export type Counts = { units: number; sets: number; readings: number }

export type BudgetInput = {
  /** Standard deviations of one reading, one position, one unit. */
  components: Record<State, Components>
  session: Lab
  common: Lab
  counts: Record<State, Counts>
  /** √Σ share² over the sessions of the sets: 1 for a single session. */
  togetherness: number
  degrees: Partial<Record<PartId, number>>
}

/**
 * The budget of a device's L*, a*, b*, by Method 1, section 1: u² = s_unit²/k + s_pos²/m + s_r²/N of its own, beside
 * the session's part and the common one.
 * @param input counts of at least one unit, set and reading a state
 */
export function budgetParts({ components, session, common, counts, togetherness, degrees }: BudgetInput): Part[] {
  const own = (id: 'reading' | 'position' | 'unit', counted: keyof Counts): Part =>
    part({
      id,
      type: 'A',
      shared: false,
      spread: { page: components.page[id], ink: components.ink[id] },
      divisor: { page: Math.sqrt(counts.page[counted]), ink: Math.sqrt(counts.ink[counted]) },
      degrees: degrees[id] ?? null,
    })
  const shared = (id: 'session' | 'common', type: Part['type'], size: Lab, divisor: number): Part =>
    part({
      id,
      type,
      shared: true,
      spread: { page: size, ink: size },
      divisor: { page: divisor, ink: divisor },
      degrees: degrees[id] ?? null,
    })
  return [
    own('reading', 'readings'),
    own('position', 'sets'),
    own('unit', 'units'),
    shared('session', 'A', session, 1 / togetherness),
    shared('common', 'B', common, 1),
  ]
}

function part(line: Omit<Part, 'u'>): Part {
  const over = (state: State): Lab => {
    const { L, a, b } = line.spread[state]
    const by = line.divisor[state]
    return { L: L / by, a: a / by, b: b / by }
  }
  return { ...line, u: { page: over('page'), ink: over('ink') } }
}

/** Combined standard uncertainty √Σu² of one state, channel by channel (JCGM 100, 5.1.2). */
export function combined(parts: readonly Part[], state: State): Lab {
  const channel = (name: Channel) => Math.hypot(...parts.map((one) => one.u[state][name]))
  const [L, a, b] = CHANNELS.map(channel) as [number, number, number]
  return { L, a, b }
}

/** Expanded uncertainty k·u with the coverage factor of every published figure. */
export function expanded(parts: readonly Part[], state: State): Lab {
  const { L, a, b } = combined(parts, state)
  return { L: COVERAGE_FACTOR * L, a: COVERAGE_FACTOR * a, b: COVERAGE_FACTOR * b }
}

/** The device's own part: what does not move all pages of a session or of the bench together. */
export function ownPart(parts: readonly Part[], state: State): Lab {
  return combined(
    parts.filter(({ shared }) => !shared),
    state,
  )
}

/**
 * Which part weighs most, and its share of the variance, 0–1; null where every part is nil.
 * @param sizes standard uncertainties of one figure, one for each part
 */
export function largestOf<Id>(sizes: readonly { id: Id; u: number }[]): { id: Id; share: number } | null {
  const total = sizes.reduce((sum, { u }) => sum + u * u, 0)
  const [first] = [...sizes].sort((one, other) => other.u - one.u)
  return first && total > 0 ? { id: first.id, share: (first.u * first.u) / total } : null
}

/**
 * Effective degrees of freedom of a combined uncertainty, u⁴/Σ(uᵢ⁴/νᵢ): for information, since our coverage factor is
 * fixed. A part whose degrees are not stated counts as without end.
 * @returns Infinity where no part with stated degrees weighs anything
 * @see JCGM 100:2008, G.4.1 (Welch and Satterthwaite)
 */
export function effectiveDegrees(sizes: readonly { u: number; degrees: number | null }[]): number {
  const u2 = sizes.reduce((sum, { u }) => sum + u * u, 0)
  const below = sizes.reduce((sum, { u, degrees }) => sum + (degrees === null ? 0 : u ** 4 / degrees), 0)
  return below > 0 ? u2 ** 2 / below : Infinity
}
