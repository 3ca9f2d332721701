import { lightnessToY } from '@/lib/colour/lab'
import type { Doubts } from '@/lib/findings/difference'
import { gloomAt } from '@/lib/lamp/ranking'
import { METHOD } from '@/lib/method/constants'
import { clamp, frontLightMax } from '@/lib/method/light'
import { eyeOf, luminanceIn, reserveIn, type Surface } from '@/lib/method/reserve'
import type { EditionDevice, Lab } from '@/lib/method/types'
import { PRINT_LIGHTNESS } from '@/lib/quiz/in-light'
import type { LightChoice } from './choice'
import { type Figured, lightnessDoubt } from './doubts'

/** What of a device its place in a light rests on. */
export type LitDevice = Pick<EditionDevice, 'slug' | 'name' | 'page' | 'ink' | 'sessions' | 'frontLight'>

/** How far a reserve carries: the method's anchors, and below 1, where ink cannot be told from page. */
export const READINGS = ['unseen', 'too-little', 'spot', 'fluent', 'easiest'] as const
export type Reading = (typeof READINGS)[number]

export type LitRow<Device extends LitDevice = LitDevice> = {
  device: Device
  /** Times the contrast this eye needs, and its expanded uncertainty (k = 2). */
  reserve: number
  reserveDoubt: number
  reading: Reading
  /** cd/m², with the front light where it is on; its doubt is that of the page alone, the light counted as exact. */
  luminance: number
  luminanceDoubt: number
  /** Page luminance as a multiple of the control paper's in the same light; null where the paper gives none. */
  ofPaper: number | null
  frontLight: 'on' | 'not-needed' | 'none' | 'unstated' | 'off'
  /** How dark the sheet is drawn, 0–1. */
  gloom: number
  /** Places of the group too close to call that it stands in, from 1; the same number twice where it stands alone. */
  places: readonly [first: number, last: number]
}

export type LitPaper = { luminance: number; reserve: number; gloom: number }

type Lit = Pick<LightChoice, 'lux' | 'frontLight' | 'lightNeed' | 'text'>

const { spotReading, fluentReading, bestReading } = METHOD.reserve

/** What a reserve lets one read. Below 3 is too little for reading (Method 1, section 3); below 1 nothing is seen. */
export function readingAt(reserve: number): Reading {
  if (reserve < 1) return 'unseen'
  if (reserve < spotReading.value) return 'too-little'
  if (reserve < fluentReading.value) return 'spot'
  return reserve < bestReading.value ? 'fluent' : 'easiest'
}

/** The control paper in this light, printed in the house's ink; it has no light of its own. */
export function paperIn(paper: Lab, choice: Lit): LitPaper {
  const surface = { yPage: lightnessToY(paper.L), yInk: lightnessToY(PRINT_LIGHTNESS), frontLight: 0 }
  const luminance = luminanceIn(surface, choice)
  const reserve = reserveIn(surface, choice, eyeOf(choice.lightNeed, choice.text))
  return { luminance, reserve, gloom: gloomAt(luminance) }
}

/**
 * Pages in one light, most contrast reserve first, equal ones by slug. Luminance and contrast are Method 1's, from the
 * published L* under D65; a lamp changes the colour drawn, not the order.
 */
export function rankInLight<Device extends LitDevice>(
  edition: Doubts & { control: { paper: Lab }; devices: readonly Device[] },
  choice: Lit,
): LitRow<Device>[] {
  const paper = paperIn(edition.control.paper, choice).luminance
  const rows = edition.devices.map((device) => {
    const [ofReserve, ofLuminance] = [reserveOf(device, choice), luminanceOf(device, choice)]
    const reserve = ofReserve.figure(device.page.L, device.ink.L)
    const luminance = ofLuminance.figure(device.page.L, device.ink.L)
    return {
      device,
      reserve,
      reserveDoubt: lightnessDoubt(edition, ofReserve),
      reading: readingAt(reserve),
      luminance,
      luminanceDoubt: lightnessDoubt(edition, ofLuminance),
      ofPaper: paper > 0 ? luminance / paper : null,
      frontLight: frontLightIn(device, choice),
      gloom: gloomAt(luminance),
    }
  })
  rows.sort((one, other) => other.reserve - one.reserve || (one.device.slug < other.device.slug ? -1 : 1))
  return withPlaces(rows, (one, other) => tied(edition, choice, one.device, other.device))
}

/** A group is the first not yet grouped and those directly below it while too close to that first one. */
function withPlaces<Row>(rows: readonly Row[], tied: (one: Row, other: Row) => boolean) {
  const placed: (Row & Pick<LitRow, 'places'>)[] = []
  while (placed.length < rows.length) {
    const start = placed.length
    const head = rows[start]!
    let end = start + 1
    while (end < rows.length && tied(head, rows[end]!)) end += 1
    for (const row of rows.slice(start, end)) placed.push({ ...row, places: [start + 1, end] })
  }
  return placed
}

function tied(edition: Doubts, choice: Lit, one: LitDevice, other: LitDevice): boolean {
  const [first, second] = [reserveOf(one, choice), reserveOf(other, choice)]
  const difference = first.figure(one.page.L, one.ink.L) - second.figure(other.page.L, other.ink.L)
  return Math.abs(difference) <= lightnessDoubt(edition, first, second)
}

function reserveOf(device: LitDevice, choice: Lit): Figured {
  const eye = eyeOf(choice.lightNeed, choice.text)
  return { device, figure: (page, ink) => reserveIn(surfaceIn(device, page, ink), choice, eye) }
}

function luminanceOf(device: LitDevice, choice: Lit): Figured {
  return { device, figure: (page, ink) => luminanceIn(surfaceIn(device, page, ink), choice) }
}

/** Held to the scale of lightness: a slope at its end may ask a step beyond. */
function surfaceIn({ frontLight }: LitDevice, pageL: number, inkL: number): Surface {
  const y = (L: number) => lightnessToY(clamp(L, 0, 100))
  return { yPage: y(pageL), yInk: y(inkL), frontLight: frontLightMax(frontLight) }
}

function frontLightIn(device: LitDevice, choice: Lit): LitRow['frontLight'] {
  if (!choice.frontLight) return 'off'
  if (device.frontLight === null) return 'unstated'
  const surface = surfaceIn(device, device.page.L, device.ink.L)
  if (surface.frontLight === 0) return 'none'
  return luminanceIn(surface, choice) > luminanceIn(surface, { ...choice, frontLight: false }) ? 'on' : 'not-needed'
}
