import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { findLatestEdition } from '@/db/queries/editions'
import { match } from '@/lib/method/ranking'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import { AIMS, type Answers, type Edition, type EditionDevice } from '@/lib/method/types'
import { createSeededDatabase } from '@/tests/fixtures/db'
import { workOut } from '@/tests/fixtures/second-route'

let edition: Edition
let drop: () => Promise<void>
beforeAll(async () => {
  const seeded = await createSeededDatabase()
  drop = seeded.drop
  edition = (await findLatestEdition(seeded.db))!
})
afterAll(() => drop())

type Reader = { who: string; first: string; answers: Partial<Answers>; left: (device: EditionDevice) => boolean }

const everything = () => true
const READERS: Reader[] = [
  {
    who: 'reads small print in a dim bedroom and wants more light than others',
    first: 'tamber-reed-7',
    answers: {
      spots: [
        { lux: 0.1, hours: 3, frontLight: true },
        { lux: 80, hours: 6, frontLight: true },
      ],
      lightNeed: 'more',
      text: 'small',
    },
    left: everything,
  },
  {
    who: 'reads outdoors, in the shade and in the sun',
    first: 'ostler-plain-7',
    answers: {
      spots: [
        { lux: 8000, hours: 6, frontLight: false },
        { lux: 80_000, hours: 2, frontLight: false },
      ],
    },
    left: everything,
  },
  {
    who: 'likes a warm white above all, in an armchair',
    first: 'pellow-wayside-5',
    answers: {
      spots: [{ lux: 250, hours: 8, frontLight: false }],
      preferredWhite: 'warm',
      aims: [['tint'], ['whiteness'], ['clarity'], ['handling']],
    },
    left: everything,
  },
  {
    who: 'must have a pen for under £300, at a desk',
    first: 'haldon-copybook-10',
    answers: {
      spots: [{ lux: 400, hours: 8, frontLight: false }],
      reads: { notes: 3, documents: 1 },
      limits: { pen: true, budget: 30_000, currency: 'GBP' },
    },
    left: (device) => device.pen !== false && (device.price === null || device.price.amount <= 30_000),
  },
]
const complete = (answers: Partial<Answers>): Answers => ({ ...structuredClone(DEFAULT_ANSWERS), ...answers })

// Method 1 worked a second time from its text, as on a spreadsheet: tests/fixtures/second-route.ts.
describe.each([
  { who: 'answers nothing', first: 'ostler-plain-7', answers: {}, left: everything } satisfies Reader,
  ...READERS,
])('a reader who $who', ({ first, answers, left }) => {
  test('gets the ranking, fits, scores and weights that Method 1 gives by another route', () => {
    const asked = complete(answers)
    const own = match(edition, asked, { draws: 100 })
    const { weights, rows } = workOut(edition.devices.filter(left), asked)
    expect(own.ranked.map((row) => row.slug)).toEqual(rows.map((row) => row.slug))
    for (const [i, row] of own.ranked.entries()) {
      expect(Math.abs(row.fit - rows[i]!.fit), row.slug).toBeLessThan(1e-6)
      for (const aim of AIMS) expect(Math.abs(row.scores[aim] - rows[i]!.scores[aim])).toBeLessThan(1e-6)
    }
    for (const aim of AIMS) expect(Math.abs(own.weights[aim] - weights[aim])).toBeLessThan(1e-9)
    expect(rows[0]!.slug).toBe(first)
  })
})

test('four readers get four different first places, each clear of every other device', () => {
  const firsts = READERS.map(({ answers }) => match(edition, complete(answers)).ranked[0]!)
  expect(new Set(firsts.map((row) => row.slug)).size).toBe(4)
  for (const row of firsts) {
    expect(row.tiedWith, row.slug).toEqual([])
    expect(row.first, row.slug).toBeGreaterThan(0.95)
  }
})

describe('why each comes first can be said in a sentence', () => {
  const rankingOf = (reader: number) => match(edition, complete(READERS[reader]!.answers), { draws: 100 })
  const row = (ranking: ReturnType<typeof rankingOf>, slug: string) => ranking.ranked.find((one) => one.slug === slug)!
  const device = (slug: string) => edition.devices.find((one) => one.slug === slug)!

  test('in the dim bedroom the outdoor reader’s choice has no front light, so nothing can be read once it is dark', () => {
    expect(device('ostler-plain-7').frontLight).toBe(false)
    expect(row(rankingOf(0), 'ostler-plain-7').unreadable).toBeCloseTo(3 / 9, 12)
    expect(row(rankingOf(0), 'tamber-reed-7').unreadable).toBe(0)
  })

  test('outdoors every page without a colour filter is light enough, so whiteness and tint decide', () => {
    const { ranked } = rankingOf(1)
    for (const { slug, scores } of ranked) if (!device(slug).colour) expect(scores.clarity, slug).toBe(1)
    expect(ranked[0]!.scores.tint).toBeGreaterThan(row(rankingOf(1), 'tamber-reed-7').scores.tint)
  })

  test('the warm white is found on the page nearest to it, which is not a light one', () => {
    const { ranked } = rankingOf(2)
    expect(ranked[0]!.scores.tint).toBe(Math.max(...ranked.map((one) => one.scores.tint)))
    const lighter = edition.devices.filter((one) => one.page.L > device('pellow-wayside-5').page.L)
    expect(lighter.length).toBeGreaterThan(5)
  })

  test('of the pens under £300 the larger page suits notes better, and the dearer ones are near misses', () => {
    const { ranked, nearMisses } = rankingOf(3)
    expect(ranked.map((one) => one.slug).slice(0, 2)).toEqual(['haldon-copybook-10', 'corrin-octavo-8'])
    expect(ranked[0]!.scores.handling).toBeGreaterThan(ranked[1]!.scores.handling)
    const dearer = nearMisses.find((miss) => miss.slug === 'quayle-margin-10')
    expect(dearer).toEqual({ slug: 'quayle-margin-10', limit: 'budget', by: 9900 })
  })
})
