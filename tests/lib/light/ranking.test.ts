import { describe, expect, test } from 'vitest'
import { differenceDoubt, type Quantity, withinDoubt } from '@/lib/findings/difference'
import { publishedFigures } from '@/lib/findings/published'
import { type LightChoice, OPENING } from '@/lib/light/choice'
import { lightnessDoubt } from '@/lib/light/doubts'
import { paperIn, rankInLight, readingAt } from '@/lib/light/ranking'
import { orderInWords, placeInWords } from '@/lib/light/words'
import type { EditionDevice } from '@/lib/method/types'
import { makeDevice, makeEdition, syntheticEdition } from '../../fixtures/edition'
import { reserve } from '../../fixtures/second-route'

const AGE = { usual: 25, more: 50, 'much-more': 65 }
const SIZE = { small: 2, normal: 4.8, large: 10 }
const lux = [0.1, 5, 80, 250, 1000, 80_000]
const choices: LightChoice[] = lux.flatMap((each) =>
  [true, false].flatMap((frontLight) =>
    (['usual', 'more', 'much-more'] as const).map((lightNeed) => ({
      ...OPENING,
      lux: each,
      frontLight,
      lightNeed,
      text: lightNeed === 'usual' ? ('normal' as const) : ('large' as const),
    })),
  ),
)

/** Worked a second time by tests/fixtures/second-route.ts, straight from Method 1, sections 2 and 3. */
function second({ page, ink, frontLight }: EditionDevice, choice: LightChoice): number {
  const front = frontLight ? frontLight.max : 0
  const surface = { L: page.L, a: page.a, b: page.b, ink: ink.L, front }
  return reserve(surface, choice.lux, choice.frontLight, AGE[choice.lightNeed], SIZE[choice.text])
}

const edition = syntheticEdition(40)

test('contrast reserve in any light is that of Method 1 worked a second time, and the order is by it', () => {
  for (const choice of choices) {
    const rows = rankInLight(edition, choice)
    expect(rows).toHaveLength(40)
    for (const row of rows) {
      const device = edition.devices.find(({ slug }) => slug === row.device.slug)!
      expect(row.reserve).toBeCloseTo(second(device, choice), 9)
    }
    const reserves = rows.map((row) => row.reserve)
    expect(reserves).toEqual([...reserves].sort((one, other) => other - one))
  }
})

// L = E·Y/(100π) by hand: L* 70 is Y 40.7494, so 80 lux give 80 × 40.7494 / 314.15927 = 10.3769 cd/m².
test('page luminance is the light times the luminance factor over π, and a front light fills it up to 15', () => {
  const device = makeDevice({ slug: 'one', frontLight: { max: 95, min: 1 } })
  const weak = makeDevice({ slug: 'weak', frontLight: { max: 2, min: 1 } })
  const none = makeDevice({ slug: 'none', frontLight: false })
  const unknown = makeDevice({ slug: 'unknown', frontLight: null })
  const all = makeEdition([device, weak, none, unknown])
  const shown = (choice: LightChoice) =>
    Object.fromEntries(rankInLight(all, choice).map((row) => [row.device.slug, row]))
  const off = shown(OPENING)
  expect(off.one!.luminance).toBeCloseTo(10.3769, 3)
  expect(off.one!.frontLight).toBe('off')
  const on = shown({ ...OPENING, frontLight: true })
  expect(on.one!.luminance).toBeCloseTo(15, 9)
  expect(on.one!.luminanceDoubt).toBeLessThan(1e-6)
  expect(on.weak!.luminance).toBeCloseTo(12.3769, 3)
  expect(on.none!.luminance).toBeCloseTo(10.3769, 3)
  expect([on.one, on.weak, on.none, on.unknown].map((row) => row!.frontLight)).toEqual(['on', 'on', 'none', 'unstated'])
  expect(shown({ ...OPENING, lux: 400, frontLight: true }).one!.frontLight).toBe('not-needed')
})

test('a page’s luminance is told as a multiple of the control paper’s, its inverse the light it needs', () => {
  const [device] = edition.devices
  const [row] = rankInLight({ ...edition, devices: [device!] }, OPENING)
  const { timesTheLight } = publishedFigures(edition, device!)
  expect(row!.ofPaper).toBeCloseTo(1 / timesTheLight.value, 9)
  expect(row!.luminance / paperIn(edition.control.paper, OPENING).luminance).toBeCloseTo(row!.ofPaper!, 12)
})

describe('doubts', () => {
  // lib/findings/difference.ts is checked on its own; without a front light both must say the same.
  test('of a difference are those every other finding uses', () => {
    const [one, other] = edition.devices as [EditionDevice, EditionDevice]
    const figure = (page: number, ink: number) => page ** 1.5 - 2 * ink
    expect(lightnessDoubt(edition, { device: one, figure }, { device: other, figure })).toBeCloseTo(
      differenceDoubt(edition, one, other, ({ page, ink }) => figure(page.L, ink.L)),
      7,
    )
  })

  // U = 2·√(u² + s²·Σ share² + u_common²), Method 1, section 1: 2·√(0.4² + 0.12²·0.5 + 0.25²).
  test('of one figure hold its own part, its sessions’ and the common one', () => {
    const device = makeDevice({ slug: 'one' })
    const doubt = lightnessDoubt(makeEdition([device]), { device, figure: (page) => page })
    expect(doubt).toBeCloseTo(2 * Math.sqrt(0.4 ** 2 + 0.12 ** 2 * 0.5 + 0.25 ** 2), 9)
  })

  test('of page and ink together leave out what moves both alike', () => {
    const device = makeDevice({ slug: 'one' })
    const doubt = lightnessDoubt(makeEdition([device]), { device, figure: (page, ink) => page - ink })
    expect(doubt).toBeCloseTo(2 * Math.hypot(0.4, 0.5), 9)
  })
})

test('pages closer than their doubt share the places of a group, and a clear one stands alone', () => {
  const page = (slug: string, L: number) =>
    makeDevice({ slug, page: { L, a: -1, b: 1, u: { L: 0.4, a: 0.1, b: 0.1 } } })
  const rows = rankInLight(makeEdition([page('c', 60), page('a', 70), page('b', 70.2)]), OPENING)
  expect(rows.map(({ device, places }) => [device.slug, ...places])).toEqual([
    ['b', 1, 2],
    ['a', 1, 2],
    ['c', 3, 3],
  ])
  expect(rows.map(placeInWords)).toEqual(['1–2, too close to call', '1–2, too close to call', '3'])
  expect(orderInWords(rows, 80)).toMatch(/^Example b and Example a keep the most contrast at about 80 lux, .*too close/)
})

// lib/findings/difference.ts on the second route's reserve: another derivative of another formula.
test('a group holds those within the doubt of its first page, and ends where one is clear of that first', () => {
  for (const choice of choices.filter((each) => !each.frontLight && each.lux >= 5)) {
    const rows = rankInLight(edition, choice)
    const reserveOf: Quantity = ({ page, ink }) =>
      second({ ...edition.devices[0]!, page: { ...page, u: page }, ink: { ...ink, u: ink } }, choice)
    const tied = (one: number, other: number) =>
      withinDoubt(edition, rows[one - 1]!.device, rows[other - 1]!.device, reserveOf)
    for (const [i, { places }] of rows.entries()) {
      const [first, last] = places
      expect(i + 1).toBeGreaterThanOrEqual(first)
      expect(i + 1).toBeLessThanOrEqual(last)
      if (first < i + 1) expect(tied(first, i + 1)).toBe(true)
      if (last < rows.length) expect(tied(first, last + 1)).toBe(false)
    }
  }
})

test('in the dark without a front light nothing can be read, and that is what is said', () => {
  const rows = rankInLight(edition, { ...OPENING, lux: 0.1 })
  expect(rows.every((row) => row.reserve === 0 && row.reading === 'unseen')).toBe(true)
  expect(rows.map(placeInWords)).toEqual(Array(40).fill('cannot be read'))
  expect(orderInWords(rows, 0.1)).toMatch(/^Nothing can be read on any of these pages at about 0.1 lux/)
})

test('where only some can be read the sentence counts those that cannot', () => {
  const rows = rankInLight(
    makeEdition([makeDevice({ slug: 'lit' }), makeDevice({ slug: 'dark', frontLight: false })]),
    {
      ...OPENING,
      lux: 0.1,
      frontLight: true,
    },
  )
  expect(orderInWords(rows, 0.1)).toMatch(/1 of the 2 cannot be read there\.$/)
})

// Anchors of Method 1, section 3: 3, 10 and 30; below 1 the ink is under the threshold itself.
test.each([
  [0, 'unseen'],
  [0.99, 'unseen'],
  [1, 'too-little'],
  [2.99, 'too-little'],
  [3, 'spot'],
  [10, 'fluent'],
  [30, 'easiest'],
])('a reserve of %d is enough for: %s', (reserveOf, reading) => {
  expect(readingAt(reserveOf)).toBe(reading)
})

test('a page at an end of the scale is ranked like any other', () => {
  const u = { L: 0.5, a: 0.1, b: 0.1 }
  const white = makeDevice({ slug: 'white', page: { L: 100, a: 0, b: 0, u }, ink: { L: 0.001, a: 0, b: 0, u } })
  const [row] = rankInLight(makeEdition([white]), OPENING)
  expect(row!.reserve).toBeGreaterThan(10)
  expect(Number.isFinite(row!.reserveDoubt)).toBe(true)
})
