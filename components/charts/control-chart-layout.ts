import { scaleLinear } from 'd3-scale'
import { formatMonth } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'
import type { Limits } from '@/lib/stats/control-chart'
import { PATH_BOX } from './ladder-layout'
import { textWidth } from './text-width'

/** A session on a control chart; `day` is ISO 8601, `rules` are those whose window ends here. */
export type ControlPoint = { label: string; day: string; value: number; outside: boolean; rules: readonly number[] }

/** How a point is drawn: its shape says what its colour says. */
export type PointShape = 'circle' | 'triangle' | 'diamond'

export type ControlLayout = {
  width: number
  height: number
  plot: { left: number; right: number; top: number; bottom: number }
  /** The centre and the limits, from the top: what stands beside each line, and the same in full. */
  lines: { id: 'upper' | 'centre' | 'lower'; beside: string; words: string; y: number }[]
  /** One and two sigma either side of the centre: what the run rules count by. */
  zones: number[]
  points: { point: ControlPoint; x: number; y: number; shape: PointShape }[]
  path: string
  months: { text: string; x: number; anchor: 'start' | 'middle' | 'end' }[]
}

const NAMES = { upper: 'upper limit', centre: 'centre', lower: 'lower limit' } as const
/** Least gutter in which a line's words have room beside its number, px. */
const ROOM_FOR_WORDS = 120

/**
 * Points in order of time, evenly spaced as control charts are, with the limits they are judged by.
 * @param gutter px at the right for the lines' numbers, and their words where there is room
 * @param zones whether the sigma zones are drawn: a chart of ranges has none
 */
export function layOutControl({
  width,
  plotHeight,
  gutter,
  points,
  limits,
  decimals,
  zones,
}: {
  width: number
  plotHeight: number
  gutter: number
  points: readonly ControlPoint[]
  limits: Limits
  decimals: number
  zones: boolean
}): ControlLayout {
  const [left, right, top] = [12, width - gutter, 16]
  const bottom = top + plotHeight
  const values = points.map(({ value }) => value)
  const low = Math.min(limits.lower, ...values)
  const high = Math.max(limits.upper, ...values)
  const room = (high - low || 1) * 0.06
  const y = scaleLinear()
    .domain([low - room, high + room])
    .range([bottom, top])
  const x = scaleLinear()
    .domain([0, Math.max(1, points.length - 1)])
    .range([left + 8, right - 8])
  const placed = points.map((point, i) => ({ point, x: x(i), y: y(point.value), shape: shapeOf(point) }))
  return {
    width,
    height: bottom + 30,
    plot: { left, right, top, bottom },
    lines: (['upper', 'centre', 'lower'] as const).map((id) => {
      const number = formatNumber(limits[id], decimals)
      const words = `${NAMES[id]} ${number}`
      return { id, words, beside: gutter < ROOM_FOR_WORDS ? number : words, y: y(limits[id]) }
    }),
    zones: zones ? [-2, -1, 1, 2].map((sigmas) => y(limits.centre + sigmas * limits.sigma)) : [],
    points: placed,
    path: pathThrough(placed, { left, right, top, bottom }),
    months: monthsUnder(points, x, right),
  }
}

function shapeOf({ outside, rules }: ControlPoint): PointShape {
  return outside ? 'diamond' : rules.length > 0 ? 'triangle' : 'circle'
}

/** The line from point to point in the box a path is given in, which is stretched to the plot. */
function pathThrough(points: readonly { x: number; y: number }[], { left, right, top, bottom }: ControlLayout['plot']) {
  const tenth = (value: number) => Math.round(10 * value) / 10
  return points
    .map((point, i) => {
      const px = (PATH_BOX.width * (point.x - left)) / (right - left)
      const py = (PATH_BOX.height * (point.y - top)) / (bottom - top)
      return `${i === 0 ? 'M' : 'L'}${tenth(px)} ${tenth(py)}`
    })
    .join('')
}

/** The month of the first and the last session, and of others between where their words have room. */
function monthsUnder(points: readonly ControlPoint[], x: (index: number) => number, right: number) {
  const [first, last] = [points[0], points.at(-1)]
  if (!first || !last) return []
  const texts = points.map(({ day }) => formatMonth(day))
  const start = { text: texts[0]!, x: x(0) - 8, anchor: 'start' as const }
  if (texts.at(-1) === texts[0]) return [start]
  const end = { text: texts.at(-1)!, x: right, anchor: 'end' as const }
  const months: ControlLayout['months'] = [start]
  let from = start.x + textWidth(start.text) + 16
  const to = right - textWidth(end.text) - 16
  points.forEach((_, i) => {
    const half = textWidth(texts[i]!) / 2
    const isNew = i > 0 && texts[i] !== texts[i - 1]
    if (!isNew || x(i) - half < from || x(i) + half > to) return
    months.push({ text: texts[i]!, x: x(i), anchor: 'middle' })
    from = x(i) + half + 16
  })
  return [...months, end]
}
