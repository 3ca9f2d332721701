import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { prepareAnswers, scoreDevice } from '@/lib/method/fit'
import { rankByFit } from '@/lib/method/ranking'
import { AIMS, type Aim, type Answers } from '@/lib/method/types'
import { anyAnswers, anyDevice } from '@/tests/fixtures/arbitraries'
import { makeAnswers, makeDevice, makeEdition } from '@/tests/fixtures/edition'
import { workOut } from '@/tests/fixtures/second-route'

const u = { L: 0.4, a: 0.15, b: 0.2 }
const devices = [
  makeDevice({ slug: 'pale', page: { L: 75.2, a: -2.4, b: 3.1, u }, ink: { L: 21, a: 0, b: 0, u }, frontLight: false }),
  makeDevice({ slug: 'cool', page: { L: 70.4, a: -1.1, b: -1.8, u }, ink: { L: 24.5, a: 0, b: 0, u }, diagonal: 7.8 }),
  makeDevice({ slug: 'tinted', page: { L: 58.3, a: -2.2, b: 1.4, u }, ink: { L: 27, a: 0, b: 0, u }, ppi: null }),
  makeDevice({
    slug: 'large',
    page: { L: 72.6, a: -1.6, b: 0.6, u },
    ink: { L: 20.2, a: 0, b: 0, u },
    diagonal: 13.3,
    weight: 580,
    ppi: 207,
    frontLight: null,
  }),
  makeDevice({ slug: 'unknown', diagonal: null, weight: null, ppi: null, frontLight: { max: 8, min: null } }),
]
const edition = makeEdition(devices)

const readers: Record<string, Answers> = {
  'who answered nothing': makeAnswers(),
  'in a dim bedroom with small print': makeAnswers({
    spots: [
      { lux: 5, hours: 9, frontLight: true },
      { lux: 0.1, hours: 3, frontLight: false },
    ],
    lightNeed: 'more',
    text: 'small',
    aims: [['clarity'], ['handling'], ['tint', 'whiteness']],
    hold: 'one-hand',
  }),
  outdoors: makeAnswers({
    spots: [
      { lux: 8000, hours: 4, frontLight: false },
      { lux: 80_000, hours: 2.5, frontLight: false },
    ],
    aims: [['whiteness'], ['tint'], ['clarity'], ['handling']],
  }),
  'of warm pages, large type': makeAnswers({
    preferredWhite: 'warm',
    text: 'large',
    lightNeed: 'much-more',
    aims: [['tint'], ['clarity', 'whiteness', 'handling']],
    reads: { comics: 2, notes: 5, documents: 1 },
    hold: 'table',
  }),
  'with weights by hand': makeAnswers({
    weights: { clarity: 1, whiteness: 0, tint: 2, handling: 5 },
    preferredWhite: 'cool',
  }),
}

describe('the fit of a device to a reader', () => {
  // tests/fixtures/second-route.ts: Method 1 worked a second time from its text, sharing no code with the product.
  test.each(Object.entries(readers))(
    'for a reader %s agrees with the method worked by a second route',
    (_, answers) => {
      const expected = workOut(devices, answers)
      const { ranked, weights } = rankByFit(edition, answers)
      for (const aim of AIMS) expect(weights[aim]).toBeCloseTo(expected.weights[aim], 9)
      expect(ranked.map(({ slug }) => slug)).toEqual(expected.rows.map(({ slug }) => slug))
      for (const [i, row] of expected.rows.entries()) {
        expect(ranked[i]!.fit).toBeCloseTo(row.fit, 9)
        expect(ranked[i]!.unreadable).toBeCloseTo(row.unreadable, 9)
        for (const aim of AIMS) expect(ranked[i]!.scores[aim]).toBeCloseTo(row.scores[aim], 9)
      }
    },
  )

  test('different readers get different first places', () => {
    expect(
      new Set(Object.values(readers).map((answers) => rankByFit(edition, answers).ranked[0]!.slug)).size,
    ).toBeGreaterThan(1)
  })

  test('agrees with the second route for any device and any answers', () => {
    fc.assert(
      fc.property(anyDevice('a'), anyAnswers, (device, answers) => {
        const [expected] = workOut([device], answers).rows
        expect(scoreDevice(device, prepareAnswers(answers)).fit).toBeCloseTo(expected!.fit, 9)
      }),
      { numRuns: 1000 },
    )
  })

  test('every score is finite and within 0 to 1, and contributions add up to the fit exactly, for every legal input', () => {
    fc.assert(
      fc.property(anyDevice('a'), anyAnswers, (device, answers) => {
        const { fit, scores, contributions, unreadable } = scoreDevice(device, prepareAnswers(answers))
        for (const value of [...AIMS.map((aim) => scores[aim]), unreadable, fit / 100]) {
          expect(value).toBeGreaterThanOrEqual(0)
          expect(value).toBeLessThanOrEqual(1 + 1e-12)
        }
        for (const aim of AIMS) expect(scores[aim]).toBeLessThanOrEqual(1)
        expect(AIMS.reduce((sum, aim) => sum + contributions[aim], 0)).toBe(fit)
      }),
      { numRuns: 1000 },
    )
  })

  // Edges of Method 1, sections 2 and 3: no light, the model's 0.05 cd/m², 0.0533 at the highest need, 500 lx and full sun;
  // pages at both ends of L*, colours far outside any paper's, ink lighter than page; front lights of 0, 15 and beyond.
  test('at every edge together the fit is a number from 0 to 100', () => {
    const zero = { L: 0, a: 0, b: 0 }
    const pages = [20, 50, 80, 100].flatMap((L) =>
      [-128, 0, 127].flatMap((a) => [-128, 0, 127].map((b) => ({ L, a, b, u: zero }))),
    )
    const lights = [false, null, ...[0, 1e-9, 14.999, 15, 1000].map((max) => ({ max, min: null }))] as const
    const luxes = [0, 0.157, 0.158, 0.34, 0.5, 1, 94.2, 94.3, 500, 12_566, 200_000]
    for (const lux of luxes) {
      for (const allowed of [true, false]) {
        const prepared = prepareAnswers(
          makeAnswers({ spots: [{ lux, hours: 168, frontLight: allowed }], lightNeed: 'much-more', text: 'small' }),
        )
        for (const page of pages) {
          for (const frontLight of lights) {
            for (const L of [0, 20, 100]) {
              const device = { ...devices[0]!, page, ink: { L, a: 0, b: 0, u: zero }, frontLight }
              const { fit, scores } = scoreDevice(device, prepared)
              expect(fit >= 0 && fit <= 100 + 1e-9).toBe(true)
              expect(AIMS.every((aim: Aim) => scores[aim] >= 0 && scores[aim] <= 1)).toBe(true)
            }
          }
        }
      }
    }
  })

  test('where no spot can be read, unreadable is exactly 1 and the fit exactly 0', () => {
    // Six sixths do not add up to 1 in binary.
    const dark = Array.from({ length: 6 }, () => ({ lux: 0, hours: 1, frontLight: false }))
    for (const { fit, unreadable } of rankByFit(edition, makeAnswers({ spots: dark })).ranked) {
      expect(unreadable).toBe(1)
      expect(fit).toBe(0)
    }
  })

  test('hours in the dark count against a device without a front light, by their share', () => {
    const spots = [
      { lux: 0.1, hours: 1, frontLight: true },
      { lux: 500, hours: 3, frontLight: false },
    ]
    const prepared = prepareAnswers(makeAnswers({ spots }))
    expect(scoreDevice(devices[0]!, prepared).unreadable).toBeCloseTo(0.25, 12)
    expect(scoreDevice(devices[1]!, prepared).unreadable).toBe(0)
  })

  test('a front light not stated counts as none, and is named where a spot would have let it be used', () => {
    const device = makeDevice({ slug: 'a', frontLight: null })
    const none = makeDevice({ slug: 'a', frontLight: false })
    const inBed = prepareAnswers(makeAnswers({ spots: [{ lux: 5, hours: 1, frontLight: true }] }))
    expect(scoreDevice(device, inBed).fit).toBe(scoreDevice(none, inBed).fit)
    expect(scoreDevice(device, inBed).notStated).toEqual(['frontLight'])
    expect(scoreDevice(none, inBed).notStated).toEqual([])
    const atDesk = prepareAnswers(makeAnswers({ spots: [{ lux: 5, hours: 1, frontLight: false }] }))
    expect(scoreDevice(device, atDesk).notStated).toEqual([])
  })

  test('scaling all hours changes nothing, and a spot of 0 hours is as if it were not there', () => {
    fc.assert(
      fc.property(
        anyDevice('a'),
        anyAnswers,
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        (device, answers, scale) => {
          const fitWith = (spots: Answers['spots']) => scoreDevice(device, prepareAnswers({ ...answers, spots })).fit
          const fit = fitWith(answers.spots)
          expect(fitWith(answers.spots.map((spot) => ({ ...spot, hours: spot.hours * scale })))).toBeCloseTo(fit, 9)
          expect(fitWith([{ lux: 3, hours: 0, frontLight: true }, ...answers.spots])).toBe(fit)
        },
      ),
      { numRuns: 300 },
    )
  })

  test.each([
    { name: 'no spots', spots: [] },
    { name: 'hours all 0', spots: [{ lux: 80, hours: 0, frontLight: true }] },
    { name: 'negative hours', spots: [{ lux: 80, hours: -1, frontLight: true }] },
    { name: 'hours that are not a number', spots: [{ lux: 80, hours: Number.NaN, frontLight: true }] },
    { name: 'more hours than a week has', spots: [{ lux: 80, hours: 169, frontLight: true }] },
    { name: 'more light than the sun gives', spots: [{ lux: 200_001, hours: 1, frontLight: true }] },
    { name: 'light that is not a number', spots: [{ lux: Number.NaN, hours: 1, frontLight: true }] },
  ])('answers with $name are refused', ({ spots }) => {
    expect(() => prepareAnswers(makeAnswers({ spots }))).toThrow(RangeError)
  })
})
