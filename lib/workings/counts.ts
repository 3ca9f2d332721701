import type { Counts, PartId, State } from './budget'

type Counted = { slug: string; unit: string; set: number; session: string; state: State; readings: number }

/** Units, sets and readings behind a device's figure of each state. */
export function countsOf(sets: readonly Counted[], slug: string): Record<State, Counts> {
  const of = (state: State): Counts => {
    const own = sets.filter((set) => set.slug === slug && set.state === state)
    return {
      units: new Set(own.map(({ unit }) => unit)).size,
      sets: own.length,
      readings: own.reduce((sum, { readings }) => sum + readings, 0),
    }
  }
  return { page: of('page'), ink: of('ink') }
}

/**
 * Degrees of freedom of the spreads pooled over an edition: readings less sets, sets less units, units less models; and
 * of the session's, sessions of each tile less one.
 * @param tileSessions how many sessions each control tile was read in
 * @see JCGM 100:2008, G.3; ISO 5725-2:1994, 7.4
 */
export function degreesOf(
  sets: readonly Counted[],
  state: State,
  tileSessions: readonly number[],
): Partial<Record<PartId, number>> {
  const own = sets.filter((set) => set.state === state)
  const units = new Set(own.map(({ slug, unit }) => `${slug} ${unit}`)).size
  const models = new Set(own.map(({ slug }) => slug)).size
  const degrees: Partial<Record<PartId, number>> = {
    reading: own.reduce((sum, { readings }) => sum + readings - 1, 0),
    position: own.length - units,
    unit: units - models,
    session: tileSessions.reduce((sum, sessions) => sum + sessions - 1, 0),
  }
  // A part nothing was repeated for has no degrees of its own to state.
  return Object.fromEntries(Object.entries(degrees).filter(([, count]) => count > 0))
}
