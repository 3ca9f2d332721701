import { type Box, overlaps, within } from './boxes'
import { textWidth } from './text-width'

/** A page on the map: a*, b* and the half-widths of its ellipse, in the same units. */
export type MapPoint = { slug: string; name: string; a: number; b: number; ra: number; rb: number }

export type PlacedPoint = {
  slug: string
  name: string
  x: number
  y: number
  rx: number
  ry: number
  /** Its words: left edge and baseline from the point's middle, px. */
  label: { text: string; dx: number; dy: number }
  /** Whether they are its number in the key rather than its name. */
  numbered: boolean
  /** A line to words that had to stand apart. */
  leader: boolean
}
export type MapLayout = {
  width: number
  /** Down to the foot of the plot; what is written below keeps its size and hangs out. */
  height: number
  plot: Box
  gridA: { at: number; x: number }[]
  gridB: { at: number; y: number }[]
  points: PlacedPoint[]
}

export const POINT = { width: 14, height: 18 }
const MARGIN = { left: 32, right: 8, top: 30 }
const LABEL_PX = 16
/** px to a unit of a* or b*, at most: closer pages would not be told apart any better. */
const LARGEST_SCALE = 64
const TALLEST = 470

/**
 * b* against a* at equal scale, laid out for the least width it is shown at. Every page has words that touch nothing
 * else: its name where there is room, else its number in a key.
 * @param first slug of the point that is placed first and always by name
 * @param namesUpTo with more points than this all but `first` and the paper are numbered
 */
export function layOutMap({
  width,
  points,
  first,
  namesUpTo,
}: {
  width: number
  points: readonly MapPoint[]
  first?: string
  namesUpTo: number
}): MapLayout {
  const room = width - MARGIN.left - MARGIN.right
  const a = padded(points.flatMap((point) => [point.a - point.ra, point.a + point.ra]))
  const b = padded(points.flatMap((point) => [point.b - point.rb, point.b + point.rb]))
  const scale = Math.min(LARGEST_SCALE, room / (a.to - a.from), TALLEST / (b.to - b.from))
  // The width is always filled: what the data leave over goes to both sides.
  const spare = (room / scale - (a.to - a.from)) / 2
  a.from -= spare
  a.to += spare
  const plot = { x: MARGIN.left, y: MARGIN.top, width: room, height: (b.to - b.from) * scale }
  const px = (value: number) => plot.x + (value - a.from) * scale
  const py = (value: number) => plot.y + (b.to - value) * scale
  const step = Math.max(a.to - a.from, b.to - b.from) > 14 ? 5 : scale < 30 ? 2 : 1

  const marks = points.map((point) => ({
    ...point,
    x: px(point.a),
    y: py(point.b),
    rx: point.ra * scale,
    ry: point.rb * scale,
  }))
  return {
    width,
    height: plot.y + plot.height,
    plot,
    gridA: ticks(a, step).map((at) => ({ at, x: px(at) })),
    gridB: ticks(b, step).map((at) => ({ at, y: py(at) })),
    points: withWords(
      marks,
      { x: plot.x + 2, y: plot.y - 6, width: width - plot.x - 4, height: plot.height + 6 },
      first,
      namesUpTo,
    ),
  }
}

function padded(values: number[]) {
  return { from: Math.min(0, ...values) - 0.4, to: Math.max(0, ...values) + 0.4 }
}

function ticks({ from, to }: { from: number; to: number }, step: number): number[] {
  const all: number[] = []
  for (let at = Math.ceil(from / step) * step; at <= to; at += step) all.push(at === 0 ? 0 : at)
  return all
}

type Mark = MapPoint & { x: number; y: number; rx: number; ry: number }

function withWords(marks: Mark[], bounds: Box, first: string | undefined, namesUpTo: number): PlacedPoint[] {
  const boxes = marks.map(boxOf)
  const taken: Box[] = []
  const words = new Map<string, Pick<PlacedPoint, 'label' | 'numbered' | 'leader'>>()
  const isFirst = (mark: Mark) => mark.slug === first
  const byName = marks.filter((mark) => marks.length <= namesUpTo || isFirst(mark) || mark.slug === PAPER_SLUG)
  byName.sort(
    (one, two) =>
      Number(isFirst(two)) - Number(isFirst(one)) || Number(two.slug === PAPER_SLUG) - Number(one.slug === PAPER_SLUG),
  )
  for (const mark of byName) place(mark, mark.name, false, RINGS_FOR_NAMES)
  let number = 0
  for (const mark of marks) {
    if (words.has(mark.slug)) continue
    number += 1
    place(mark, `${number}`, true, RINGS_FOR_NUMBERS)
  }
  return marks.flatMap((mark) => {
    const own = words.get(mark.slug)
    return own ? [{ slug: mark.slug, name: mark.name, x: mark.x, y: mark.y, rx: mark.rx, ry: mark.ry, ...own }] : []
  })

  /** The first place round the mark that is free; numbers always get one, at the worst far out. */
  function place(mark: Mark, text: string, numbered: boolean, rings: readonly number[]) {
    const wide = textWidth(text)
    for (const ring of rings) {
      for (const [dx, dy] of DIRECTIONS) {
        const x = mark.x + dx * (POINT.width / 2 + ring) + (dx > 0 ? 0 : dx < 0 ? -wide : -wide / 2)
        const middle = mark.y + dy * (POINT.height / 2 + LABEL_PX / 2 + ring - 3)
        const box = { x, y: middle - LABEL_PX / 2, width: wide, height: LABEL_PX }
        if (
          !within(box, bounds) ||
          boxes.some((other) => overlaps(box, other, 1)) ||
          taken.some((other) => overlaps(box, other, 2))
        )
          continue
        taken.push(box)
        words.set(mark.slug, {
          label: { text, dx: x - mark.x, dy: middle + 5 - mark.y },
          numbered,
          leader: ring > NEAR,
        })
        return
      }
    }
  }
}

/** The control paper among the points. */
export const PAPER_SLUG = 'control-paper'

const NEAR = 8
const RINGS_FOR_NAMES = [4, 8, 14]
const RINGS_FOR_NUMBERS = [3, 6, 12, 20, 30, 45, 60, 80, 110, 150, 200]
const DIRECTIONS: readonly (readonly [number, number])[] = [
  [1, 0],
  [-1, 0],
  [1, -0.7],
  [1, 0.7],
  [-1, -0.7],
  [-1, 0.7],
  [0, 1],
  [0, -1],
]

function boxOf({ x, y }: { x: number; y: number }): Box {
  return { x: x - POINT.width / 2, y: y - POINT.height / 2, width: POINT.width, height: POINT.height }
}
