import { labToXyz, lightnessToY } from '@/lib/colour/lab'
import { cieWhiteness } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import { surfaceOf } from '@/lib/method/fit'
import { eyeOf, reserveIn } from '@/lib/method/reserve'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Answers, Edition, EditionDevice, Lab } from '@/lib/method/types'

/** Round figures to try the components with; nothing here was measured. */
const ROWS: readonly (readonly [string, number, number, number, number, number, number, number, boolean])[] = [
  ['Ostler Plain 6', 71.8, -1.9, 1.6, 24.6, 6, 158, 139, false],
  ['Ostler Plain 7', 73.4, -1.7, 0.9, 23.9, 7, 205, 189, false],
  ['Tamber Reed 7', 72.6, -2.3, -0.2, 22.8, 7, 228, 219, false],
  ['Tamber Reed 7 Colour', 61.9, -2.8, 2.4, 26.1, 7, 231, 249, true],
  ['Wexby Vesper 6', 70.3, -1.2, 3.1, 25, 6, 162, 129, false],
  ['Wexby Vesper 8', 71.1, -1.3, 2.9, 24.4, 8, 240, 199, false],
  ['Quayle Margin 10', 75.1, -1.4, 2, 25.5, 10.3, 372, 399, false],
  ['Quayle Margin 13', 74.6, -1.5, 2.2, 25.9, 13.3, 560, 599, false],
  ['Corrin Quarto 10 Colour', 63.4, -2.1, 4, 27.4, 10.3, 430, 449, true],
  ['Corrin Octavo 8', 73, -2, 1.1, 24.1, 8, 268, 289, false],
  ['Haldon Copybook 10', 74.2, -0.6, 1.4, 26.3, 10.3, 381, 369, false],
  ['Haldon Copybook 10 Colour', 60.8, -1.1, 3.6, 27.9, 10.3, 388, 429, true],
  ['Pellow Wayside 5', 69.4, -1.5, 2.2, 24.9, 5.2, 121, 119, false],
  ['Pellow Broadsheet 13 Colour', 58.7, -2.4, 4.6, 28.3, 13.3, 590, 579, true],
  ['Tamber Almanac 6', 71.9, -1.9, 1.5, 23.4, 6, 170, 149, false],
  ['Corrin Duodecimo 6 Colour', 59.9, -2.6, 3.1, 27, 6, 176, 179, true],
]

export const DEVICES: EditionDevice[] = ROWS.map(([name, L, a, b, ink, diagonal, weight, pounds, colour], i) => ({
  slug: name.toLowerCase().replaceAll(' ', '-'),
  name,
  maker: name.split(' ')[0] ?? name,
  revision: '1',
  provisional: i === 12,
  units: i === 12 ? 1 : 2,
  page: { L, a, b, u: { L: 0.3, a: 0.16, b: 0.2 + (i % 3) * 0.04 } },
  ink: { L: ink, a: -0.5, b: -1, u: { L: 0.3, a: 0.1, b: 0.1 } },
  sessions: { s1: 1 },
  ...cieWhiteness(xyzToXyy(labToXyz({ L, a, b }))),
  contrast: lightnessToY(L) / lightnessToY(ink),
  frontLight: diagonal > 10 && !colour ? false : { max: 90, min: 0.5 },
  diagonal,
  ppi: colour ? 150 : 300,
  weight: i === 5 ? null : weight,
  price: i === 14 ? null : { amount: 100 * pounds, currency: 'GBP' },
  pen: diagonal > 9,
  colour,
  water: 0,
  pageButtons: i % 2 === 0,
  onSale: true,
  lending: null,
  speech: null,
  formats: null,
}))

export const PAPER: Lab = { L: 94.2, a: 0.4, b: -1.2 }

export const EDITION: Edition = {
  number: 1,
  publishedAt: '2026-11-14T00:00:00Z',
  sha256: '',
  method: 1,
  control: { paper: PAPER },
  uncertainty: { common: { L: 0.2, a: 0.08, b: 0.1 }, session: { L: 0.1, a: 0.04, b: 0.05 } },
  devices: DEVICES,
}

export const ANSWERS: Answers = {
  ...DEFAULT_ANSWERS,
  spots: [
    { lux: 80, hours: 7, frontLight: true },
    { lux: 200, hours: 4, frontLight: false },
    { lux: 8000, hours: 1, frontLight: false },
  ],
}

const eye = eyeOf('usual', 'normal')
const control = { yPage: lightnessToY(PAPER.L), yInk: lightnessToY(22), frontLight: 0 }

export type SampleSpot = { name: string; lux: number; hours: number; frontLight: boolean }

/** Rows of the light strips for some spots, and the paper's reserve there. */
export function stripsFor(spots: readonly SampleSpot[], devices: readonly EditionDevice[]) {
  return {
    spots,
    rows: devices.map((device) => ({
      slug: device.slug,
      name: device.name,
      page: device.page,
      reserves: spots.map((spot) => reserveIn(surfaceOf(device), spot, eye)),
    })),
    paper: spots.map((spot) => reserveIn(control, { ...spot, frontLight: false }, eye)),
  }
}

/** A curve of the ladder for one device, without its front light. */
export function curveOf(device: EditionDevice, style: 'first' | 'second' | 'third' | 'quiet') {
  const points = Array.from({ length: 101 }, (_, i) => 10 ** (i / 20)).map((lux) => ({
    lux,
    reserve: reserveIn(surfaceOf(device), { lux, frontLight: false }, eye),
  }))
  return { name: device.name, points, style }
}
