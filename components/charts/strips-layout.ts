import { type ScaleLinear, scaleLinear } from 'd3-scale'
import { formatTimes } from '@/lib/format/number'
import { READING_ANCHORS } from '@/lib/vision/contrast-reserve'
import { type PlacedLabel, placeLabels } from './strip-labels'
import { LINE_PX, textWidth, wrapWords } from './text-width'

export type StripSpot = { name: string; detail: string }
/** A device on the strips; `reserves` one a spot, 0 where nothing can be read there. */
export type StripDevice = { slug: string; name: string; reserves: readonly number[] }

/** A sheet on a strip: x its middle, y its top. */
export type PlacedMark = { slug: string; name: string; reserve: number; x: number; y: number }
export type PlacedStrip = {
  heading: { text: string; strong: boolean; y: number }[]
  axisY: number
  /** The named devices and the control paper, standing on the axis. */
  standing: PlacedMark[]
  /** All others, hanging below it. */
  hanging: PlacedMark[]
  labels: PlacedLabel[]
  /** How many devices cannot be read here; null where all can. */
  note: { text: string; x: number; y: number } | null
}
export type StripsLayout = {
  width: number
  height: number
  plot: { left: number; right: number; top: number; bottom: number }
  /** Right end of the stretch below three times, where nothing can be read. */
  tooLittle: number
  ticks: { x: number; times: string; timesX: number; words: { text: string; x: number; y: number }[] }[]
  strips: PlacedStrip[]
}

export const STANDING = { width: 10, height: 16 }
export const PAPER = { width: 12, height: 18 }
export const HANGING = { width: 7, height: 11 }
export const PAPER_SLUG = 'control-paper'

const LANE_PX = HANGING.height + 2
/** Sheets in one lane lie like a fanned hand of cards: this much of each shows. */
const FAN_PX = 4

const ANCHORS = [
  { at: READING_ANCHORS.spot, word: 'spot reading' },
  { at: READING_ANCHORS.fluent, word: 'fluent' },
  { at: READING_ANCHORS.best, word: 'easiest' },
]

type Options = {
  /** The least width the drawing is shown at, px: there nothing touches anything, and more room only pulls it apart. */
  width: number
  /** px at the left for the spots' names; 0 puts them above their strip. */
  gutter: number
  spots: readonly StripSpot[]
  devices: readonly StripDevice[]
  paper: readonly number[] | null
  named: readonly string[]
}

/** One strip a spot over one scale from nothing, which always holds the data and the three anchors. */
export function layOutStrips(options: Options): StripsLayout {
  const { width, gutter, spots, devices, paper } = options
  const most = Math.max(...devices.flatMap((device) => device.reserves), ...(paper ?? []), READING_ANCHORS.best)
  const plot = { left: gutter, right: width - 6, top: 0, bottom: 0 }
  const scale = scaleLinear()
    .domain([0, most * 1.06])
    .range([plot.left, plot.right])

  const ticks = ANCHORS.map(({ at, word }) =>
    tickAt(scale(at), `${at}×`, wrapWords(word, gutter > 0 ? 120 : 52), width),
  )
  plot.top = Math.max(...ticks.map((tick) => 14 + tick.words.length * LINE_PX)) + 8

  let top = plot.top
  const strips = spots.map((spot, i) => {
    const strip = layOutStrip(spot, i, top, scale, options)
    top = strip.bottom
    return strip.placed
  })
  plot.bottom = top - 4
  return { width, height: top, plot, tooLittle: scale(READING_ANCHORS.spot), ticks, strips }
}

function tickAt(x: number, times: string, words: string[], width: number) {
  const kept = (text: string) => Math.min(width - textWidth(text) / 2, Math.max(textWidth(text) / 2, x))
  return {
    x,
    times,
    timesX: kept(times),
    words: words.map((text, i) => ({ text, x: kept(text), y: 14 + (i + 1) * LINE_PX })),
  }
}

function layOutStrip(
  spot: StripSpot,
  index: number,
  top: number,
  scale: ScaleLinear<number, number>,
  { width, gutter, devices, paper, named }: Options,
) {
  const words = [
    ...wrapWords(spot.name, (gutter || width) - 12).map((text) => ({ text, strong: true })),
    ...wrapWords(spot.detail, (gutter || width) - 12).map((text) => ({ text, strong: false })),
  ]
  const all = devices.map((device) => ({ slug: device.slug, name: device.name, reserve: device.reserves[index] ?? 0 }))
  const standing = stand(
    [
      ...named.flatMap((slug) => all.filter((device) => device.slug === slug)),
      ...(paper ? [{ slug: PAPER_SLUG, name: 'Control paper', reserve: paper[index] ?? 0 }] : []),
    ],
    scale,
  )
  const hanging = hang(
    all.filter((device) => !named.includes(device.slug)),
    scale,
  )
  const labels = placeLabels(
    standing.map((mark) => ({ slug: mark.slug, at: mark.x, text: wordsFor(mark, width - gutter) })),
    { left: gutter, right: width },
  )

  const unread = all.filter((device) => device.reserve < READING_ANCHORS.spot).length
  const lines = Math.max(0, ...labels.map((label) => label.line + 1))
  const tallest = Math.max(0, ...standing.map((mark) => mark.rise + heightOf(mark)))
  const lanes = Math.max(0, ...hanging.map((mark) => mark.lane + 1))
  const above = lines * LINE_PX + tallest + 4
  const below = 4 + lanes * LANE_PX + (unread > 0 ? LINE_PX : 0)

  // Words at the side are centred on the axis and may be what decides the height.
  const beside = gutter > 0 ? (words.length * LINE_PX) / 2 : 0
  const head = gutter > 0 ? 6 : 8 + words.length * LINE_PX
  const axisY = top + head + Math.max(above, beside)
  const headTop = gutter > 0 ? axisY - beside + 13 : top + 20
  return {
    bottom: axisY + Math.max(below, beside) + 14,
    placed: {
      heading: words.map((word, line) => ({ ...word, y: headTop + line * LINE_PX })),
      axisY,
      standing: standing.map((mark) => ({ ...mark, y: axisY - mark.rise - heightOf(mark) })),
      hanging: hanging.map((mark) => ({ ...mark, y: axisY + 4 + mark.lane * LANE_PX })),
      labels: labels.map((label) => ({ ...label, y: axisY - tallest - 8 - label.line * LINE_PX })),
      note: unread > 0 ? { text: unreadWords(unread, all.length), x: gutter, y: axisY + below - 2 } : null,
    },
  }
}

/** A name with its value, in the longest words there is room for; a name too long even alone is cut. */
function wordsFor({ slug, name, reserve }: { slug: string; name: string; reserve: number }, room: number): string {
  const short = slug === PAPER_SLUG ? 'paper' : name
  const fits = (text: string) => textWidth(text) <= room
  const values = reserve > 0 ? [formatTimes(reserve)] : ['cannot be read', 'unread']
  const whole = values.map((value) => `${short} ${value}`).find(fits)
  if (whole) return whole
  const letters = [...short]
  while (letters.length > 0 && !fits(`${letters.join('')}… ${values.at(-1)}`)) letters.pop()
  return `${letters.join('').trimEnd()}… ${values.at(-1)}`
}

function unreadWords(unread: number, of: number): string {
  if (unread < of) return `${unread} of ${of} cannot be read here`
  return of === 1 ? 'cannot be read here' : `none of the ${of} can be read here`
}

const heightOf = (mark: { slug: string }) => (mark.slug === PAPER_SLUG ? PAPER : STANDING).height

/** Sheets on the axis; where two would touch, the later stands on the other. */
function stand<Device extends { slug: string; reserve: number }>(
  devices: Device[],
  scale: ScaleLinear<number, number>,
) {
  const placed: (Device & { x: number; rise: number })[] = []
  for (const device of devices) {
    const x = Math.max(scale(0) + PAPER.width / 2, scale(device.reserve))
    const under = placed.filter((other) => Math.abs(other.x - x) < PAPER.width + 1)
    placed.push({ ...device, x, rise: Math.max(0, ...under.map((other) => other.rise + heightOf(other) + 2)) })
  }
  return placed
}

/** Small sheets below the axis, each in the first lane where enough of its neighbour shows; unread ones at the left. */
function hang<Device extends { slug: string; reserve: number }>(devices: Device[], scale: ScaleLinear<number, number>) {
  const sorted = [...devices].sort((one, two) => one.reserve - two.reserve || (one.slug < two.slug ? -1 : 1))
  const ends: number[] = []
  const spread = Math.max(1, Math.floor((scale(READING_ANCHORS.spot) - scale(0)) / (HANGING.width + 2)))
  return sorted.map((device, i) => {
    // Those that cannot be read at all come first in the order; they have no place of their own on the scale.
    const least = scale(0) + HANGING.width / 2 + (device.reserve > 0 ? 0 : (i % spread) * (HANGING.width + 2))
    const x = Math.max(least, scale(device.reserve))
    let lane = 0
    while ((ends[lane] ?? -Infinity) + FAN_PX > x) lane += 1
    ends[lane] = x
    return { ...device, x, lane }
  })
}
