import { type ScaleLogarithmic, scaleLog } from 'd3-scale'
import { curveMonotoneX, line } from 'd3-shape'
import { READING_ANCHORS } from '@/lib/vision/contrast-reserve'
import { LINE_PX, textWidth, wrapWords } from './text-width'

export type LadderPoint = { lux: number; reserve: number }
export type LadderCurve = {
  name: string
  points: readonly LadderPoint[]
  style: 'first' | 'second' | 'third' | 'quiet'
}
export type LadderBand = { label: string; hint: string; lo: number; hi: number; tone: 'lamp' | 'room' | 'daylight' }

const DARKEST = 1
const BRIGHTEST = 100_000
const LOWEST = 2
const LEAST_TOP = 50

export type LadderLayout = {
  width: number
  height: number
  plot: { left: number; right: number; top: number; bottom: number }
  /** `side`: the end of the line at which its word is clear of the curves, which rise from the left. */
  anchors: { at: number; word: string; y: number; side: 'left' | 'right' }[]
  luxTicks: { lux: number; x: number }[]
  bands: { band: LadderBand; left: number; right: number; middle: number; labelY: number; hint: boolean }[]
  curves: {
    curve: LadderCurve
    path: string
    marks: { lux: number; reserve: number; x: number; y: number }[]
    label: { lines: string[]; y: number } | null
  }[]
}

/** The drawing a path is given in: it is stretched to the plot, its stroke is not. */
export const PATH_BOX = { width: 1000, height: 1000 }

/**
 * Contrast reserve over the light on the page, both logarithmic, laid out for the least width it is shown at.
 * @param gutter px at the right for the names of the curves; 0 leaves them to a key
 */
export function layOutLadder({
  width,
  plotHeight,
  gutter,
  curves,
  bands,
}: {
  width: number
  plotHeight: number
  gutter: number
  curves: readonly LadderCurve[]
  bands: readonly LadderBand[]
}): LadderLayout {
  const left = 40
  const right = width - (gutter || 8)
  const x = scaleLog().domain([DARKEST, BRIGHTEST]).range([left, right])
  const placedBands = placeBands(bands, x, left, width - 4)
  const lines = Math.max(0, ...placedBands.map((band) => band.level + 1))
  const top = lines * (2 * LINE_PX) + (lines > 0 ? 4 : 20)
  const bottom = top + plotHeight
  const highest = Math.max(LEAST_TOP, ...curves.flatMap((curve) => curve.points.map((point) => point.reserve * 1.1)))
  const y = scaleLog().domain([LOWEST, highest]).range([bottom, top])

  return {
    width,
    height: bottom + 44,
    plot: { left, right, top, bottom },
    anchors: [
      { at: READING_ANCHORS.spot, word: 'spot reading' },
      { at: READING_ANCHORS.fluent, word: 'fluent' },
      { at: READING_ANCHORS.best, word: 'easiest' },
    ].map((anchor) => ({ ...anchor, y: y(anchor.at), side: anchor.at < READING_ANCHORS.best ? 'right' : 'left' })),
    luxTicks: [1, 10, 100, 1000, 10_000, 100_000].map((lux) => ({ lux, x: x(lux) })),
    bands: placedBands.map(({ band, middle, level, hint }) => ({
      band,
      left: x(Math.max(DARKEST, band.lo)),
      right: x(Math.min(BRIGHTEST, band.hi)),
      middle,
      labelY: top - 8 - level * 2 * LINE_PX,
      hint,
    })),
    curves: withLabels(
      curves.map((curve) => ({ curve, path: pathOf(curve, highest), marks: marksOf(curve, bands, x, y) })),
      (reserve) => y(reserve),
      { gutter, top, bottom },
    ),
  }
}

/** Band words centred over their band, moved in from the edges, and raised a level where they would touch. */
function placeBands(bands: readonly LadderBand[], x: ScaleLogarithmic<number, number>, from: number, to: number) {
  const ends: number[] = []
  return bands.map((band) => {
    const wide = Math.max(textWidth(band.label), textWidth(band.hint))
    const centre = x(Math.sqrt(Math.max(DARKEST, band.lo) * Math.min(BRIGHTEST, band.hi)))
    const middle = Math.min(to - wide / 2, Math.max(from + wide / 2, centre))
    let level = 0
    while ((ends[level] ?? -Infinity) + 8 > middle - wide / 2) level += 1
    ends[level] = middle + wide / 2
    return { band, middle, level, hint: band.hint !== '' }
  })
}

function pathOf(curve: LadderCurve, highest: number): string {
  const px = scaleLog().domain([DARKEST, BRIGHTEST]).range([0, PATH_BOX.width])
  const py = scaleLog().domain([LOWEST, highest]).range([PATH_BOX.height, 0])
  const draw = line<LadderPoint>()
    .defined((point) => point.reserve > 0)
    .x((point) => Math.round(10 * px(point.lux)) / 10)
    .y((point) => Math.round(10 * py(point.reserve)) / 10)
    .curve(curveMonotoneX)
  return draw([...curve.points]) ?? ''
}

/** The points one can stop at: the middle of each band, or each factor of ten where there are no bands. */
function marksOf(
  curve: LadderCurve,
  bands: readonly LadderBand[],
  x: ScaleLogarithmic<number, number>,
  y: ScaleLogarithmic<number, number>,
) {
  if (curve.style === 'quiet') return []
  const stops =
    bands.length > 0 ? bands.map((band) => Math.sqrt(band.lo * band.hi)) : [1, 10, 100, 1000, 10_000, 100_000]
  return stops.flatMap((lux) => {
    const reserve = reserveAt(curve.points, lux)
    return reserve !== null && reserve >= LOWEST ? [{ lux, reserve, x: x(lux), y: y(reserve) }] : []
  })
}

/** The reserve in a light between two points of a curve, straight in the logarithms; null outside the curve. */
export function reserveAt(points: readonly LadderPoint[], lux: number): number | null {
  const after = points.findIndex((point) => point.lux >= lux)
  const next = points[after]
  if (!next) return null
  if (next.lux === lux) return next.reserve
  const before = points[after - 1]
  if (!before || !(before.reserve > 0) || !(next.reserve > 0)) return null
  const share = Math.log(lux / before.lux) / Math.log(next.lux / before.lux)
  return before.reserve * (next.reserve / before.reserve) ** share
}

/** Names at the curves' ends, pushed apart until none touches another. */
function withLabels(
  curves: Pick<LadderLayout['curves'][number], 'curve' | 'path' | 'marks'>[],
  y: (reserve: number) => number,
  { gutter, top, bottom }: { gutter: number; top: number; bottom: number },
): LadderLayout['curves'] {
  const named = curves
    .filter(({ curve }) => gutter > 0 && curve.style !== 'quiet')
    .map((entry) => {
      const lines = wrapWords(entry.curve.name, gutter - 14)
      const end = [...entry.curve.points].reverse().find((point) => point.lux <= BRIGHTEST && point.reserve > 0)
      return { entry, lines, tall: lines.length * LINE_PX, middle: end ? y(Math.max(LOWEST, end.reserve)) : bottom }
    })
    .sort((one, two) => one.middle - two.middle)
  let from = top - LINE_PX / 2
  for (const label of named) {
    label.middle = Math.max(label.middle, from + label.tall / 2)
    from = label.middle + label.tall / 2 + 2
  }
  let to = bottom + LINE_PX / 2
  for (const label of [...named].reverse()) {
    label.middle = Math.min(label.middle, to - label.tall / 2)
    to = label.middle - label.tall / 2 - 2
  }
  return curves.map((entry) => {
    const own = named.find((label) => label.entry === entry)
    return { ...entry, label: own ? { lines: own.lines, y: own.middle - own.tall / 2 + 13 } : null }
  })
}
