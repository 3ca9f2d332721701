import { mean } from '@/lib/stats/describe'
import { nestedComponents } from '@/lib/stats/variance-components'
import { METHOD } from './constants'
import { requireFigures } from './derived-figures'
import type { Lab, MeasuredState } from './types'

export { besidePaper, type DerivedFigures, derivedFigures } from './derived-figures'
export { besidePaperUncertainty, derivedUncertainty, expandedFigure } from './figure-doubts'

/** One set: accepted readings (n ≥ 1) of one state at one position of one unit, in one session. */
export type SetReadings = {
  session: string
  unit: string
  position: string
  state: 'page' | 'ink'
  readings: Lab[]
}

/** Standard deviations per channel, pooled over an edition: within sets, between positions, between units of a model. */
export type Components = { reading: Lab; position: Lab; unit: Lab }

const CHANNELS = ['L', 'a', 'b'] as const
type Channel = (typeof CHANNELS)[number]

function byChannel(value: (channel: Channel) => number): Lab {
  return { L: value('L'), a: value('a'), b: value('b') }
}

/**
 * Components of variance of both states, pooled over all devices of an edition. While fewer than three models have two
 * or more units, the spread between units is held at 0.5 (L*), 0.3 (a*), 0.4 (b*) or more (house). A spread that
 * nothing was repeated for counts as 0. Method 1, section 1.
 */
export function pooledComponents(devices: readonly { slug: string; sets: readonly SetReadings[] }[]): {
  page: Components
  ink: Components
} {
  const pool = (state: SetReadings['state']): Components => {
    const models = devices.map(({ sets }) => unitsOf(sets.filter((set) => set.state === state)))
    const parts = { reading: byChannel(() => 0), position: byChannel(() => 0), unit: byChannel(() => 0) }
    for (const channel of CHANNELS) {
      const found = nestedComponents(
        models.map((units) => units.map((sets) => sets.map((set) => set.readings.map((reading) => reading[channel])))),
      )
      const known = found.modelsWithTwoUnits >= METHOD.figures.modelsForUnitSpread.value
      parts.reading[channel] = found.sReading ?? 0
      parts.position[channel] = found.sPosition ?? 0
      parts.unit[channel] = Math.max(found.sUnit ?? 0, known ? 0 : METHOD.figures.unitFloor.value[channel])
    }
    return parts
  }
  return { page: pool('page'), ink: pool('ink') }
}

/**
 * A device's figures from its sets: a unit's is the mean of its set means, the device's the mean of its units'. The
 * uncertainty is of the device's own part: u² = s_unit²/k + s_pos²/m + s_r²/N, for k units, m sets, N readings.
 * @param sets of both states; each with at least one accepted reading
 * @returns `units` those measured in both states at least, provisional where that is one; `sessions` the share of all sets
 * @throws RangeError where a state or a reading is missing, L* is outside 0–100, or the page's L* is under 20
 */
export function deviceFigures(
  sets: readonly SetReadings[],
  components: { page: Components; ink: Components },
): { page: MeasuredState; ink: MeasuredState; units: number; provisional: boolean; sessions: Record<string, number> } {
  const ofState = (state: SetReadings['state']) => sets.filter((set) => set.state === state)
  const page = stateFigure('page', ofState('page'), components.page)
  const ink = stateFigure('ink', ofState('ink'), components.ink)
  requireFigures(page.figure, ink.figure)
  const units = Math.min(page.units, ink.units)
  const sessions: Record<string, number> = {}
  for (const { session } of sets) sessions[session] = (sessions[session] ?? 0) + 1
  for (const session in sessions) sessions[session] = sessions[session]! / sets.length
  return { page: page.figure, ink: ink.figure, units, provisional: units === 1, sessions }
}

function stateFigure(state: string, sets: readonly SetReadings[], { unit, position, reading }: Components) {
  if (sets.length === 0) throw new RangeError(`a device needs at least one set of its ${state}`)
  const units = unitsOf(sets)
  const readings = sets.reduce((count, set) => count + set.readings.length, 0)
  const value = (channel: Channel) =>
    mean(units.map((own) => mean(own.map((set) => mean(set.readings.map((one) => one[channel]))))))
  const u = (channel: Channel) =>
    Math.sqrt(
      unit[channel] ** 2 / units.length + position[channel] ** 2 / sets.length + reading[channel] ** 2 / readings,
    )
  return { figure: { ...byChannel(value), u: byChannel(u) }, units: units.length }
}

function unitsOf(sets: readonly SetReadings[]): SetReadings[][] {
  const units = new Map<string, SetReadings[]>()
  for (const set of sets) {
    const own = units.get(set.unit)
    if (own) own.push(set)
    else units.set(set.unit, [set])
  }
  return [...units.values()]
}
