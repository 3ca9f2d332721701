import type { Lab } from '@/lib/method/types'
import { individualsLimits } from '@/lib/stats/control-chart'
import { mean } from '@/lib/stats/describe'

/** A reading of a control tile in a session. */
export type ControlReading = Lab & {
  session: string
  startedAt: Date
  instrumentId: number
  sampleId: number
  moment: 'start' | 'end'
}

/** How the tile stood in one session. */
export type ControlState = {
  session: string
  startedAt: Date
  sampleId: number
  readings: number
  /** Mean of the session less the centre of its chart, in L*, a*, b*. */
  offset: Lab
  /** Half the width of the chart's limits, three sigma; null with a single session on the chart. */
  reach: Lab | null
  /** Whether all three channels lie within their limits; null where there are none. */
  inLimits: boolean | null
  /** Mean L* at the end less that at the start; null where one of them was not read. */
  drift: number | null
}

const CHANNELS = ['L', 'a', 'b'] as const

/**
 * The state of the control tile in every session, in order of time. Each tile on each instrument has a chart of its
 * own: a point is the mean of a session, the centre the mean of the points, the limits three sigma by the moving range.
 * A tile is read for stability, so its reference is its own centre and not a certified value.
 * @param readings in any order
 * @see NIST/SEMATECH e-Handbook, 6.3.2.2 (individuals chart)
 */
export function controlStates(readings: readonly ControlReading[]): ControlState[] {
  return groupBy(readings, ({ sampleId, instrumentId }) => `${sampleId} ${instrumentId}`)
    .flatMap(chartOf)
    .sort((one, other) => one.startedAt.getTime() - other.startedAt.getTime())
}

function chartOf(readings: readonly ControlReading[]): ControlState[] {
  const sessions = groupBy(readings, ({ session }) => session).sort(
    ([one], [other]) => one!.startedAt.getTime() - other!.startedAt.getTime(),
  )
  const points = sessions.map((own) => byChannel((channel) => mean(own.map((reading) => reading[channel]))))
  const centre = byChannel((channel) => mean(points.map((point) => point[channel])))
  const limits = CHANNELS.map((channel) => individualsLimits(points.map((point) => point[channel]))?.value ?? null)
  const [L, a, b] = limits.map((one) => (one ? 3 * one.sigma : null))
  const reach = L == null || a == null || b == null ? null : { L, a, b }
  return sessions.map((own, i) => {
    const { session, startedAt, sampleId } = own[0]!
    const offset = byChannel((channel) => points[i]![channel] - centre[channel])
    const inLimits = reach && CHANNELS.every((channel) => Math.abs(offset[channel]) <= reach[channel])
    return { session, startedAt, sampleId, readings: own.length, offset, reach, inLimits, drift: driftOf(own) }
  })
}

function driftOf(readings: readonly ControlReading[]): number | null {
  const at = (moment: ControlReading['moment']) => readings.filter((one) => one.moment === moment).map(({ L }) => L)
  const [start, end] = [at('start'), at('end')]
  return start.length > 0 && end.length > 0 ? mean(end) - mean(start) : null
}

function byChannel(value: (channel: (typeof CHANNELS)[number]) => number): Lab {
  return { L: value('L'), a: value('a'), b: value('b') }
}

function groupBy<T>(items: readonly T[], key: (item: T) => string): T[][] {
  const groups = new Map<string, T[]>()
  for (const item of items) {
    const known = groups.get(key(item))
    if (known) known.push(item)
    else groups.set(key(item), [item])
  }
  return [...groups.values()]
}
