import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { drawFits } from '@/lib/method/draws'
import { errorSource } from '@/lib/method/errors'
import { prepareAnswers, scoreDevice, surfaceOf } from '@/lib/method/fit'
import { reserveIn } from '@/lib/method/reserve'
import type { Answers, Edition, EditionDevice } from '@/lib/method/types'
import { anyAnswers, anyDevice, plausibleDevice } from '@/tests/fixtures/arbitraries'
import { makeAnswers, makeDevice, makeEdition, syntheticEdition } from '@/tests/fixtures/edition'

const within = (L: number) => Math.min(Math.max(L, 0), 100)

/** Method 1, section 6, drawn plainly: the same errors, each draw scored by `scoreDevice`. */
function plainly(device: EditionDevice, edition: Edition, answers: Answers, draws: number): number[] {
  const prepared = prepareAnswers(answers)
  const { L, a, b, ink } = errorSource(edition, prepared, draws)(device)
  return Array.from({ length: draws }, (_, k) => {
    const page = {
      ...device.page,
      L: within(device.page.L + L[k]!),
      a: device.page.a + a[k]!,
      b: device.page.b + b[k]!,
    }
    return scoreDevice({ ...device, page, ink: { ...device.ink, L: within(device.ink.L + ink[k]!) } }, prepared).fit
  })
}

function largestDifference(device: EditionDevice, edition: Edition, answers: Answers, draws: number): number {
  const fits = drawFits([device], edition, prepareAnswers(answers), draws)
  const plain = plainly(device, edition, answers, draws)
  return plain.reduce((worst, fit, k) => Math.max(worst, Math.abs(fit - fits[k]!)), 0)
}

/** The bound on what a table may do to a fit, points. */
const TABLE_ERROR = 1e-3

describe('draws of the fit', () => {
  test('agree with the plain way for every device of an edition', () => {
    const edition = syntheticEdition(40)
    for (const answers of [
      makeAnswers(),
      makeAnswers({ spots: [{ lux: 5, hours: 1, frontLight: false }], lightNeed: 'much-more', text: 'small' }),
      makeAnswers({ spots: [{ lux: 80_000, hours: 1, frontLight: false }] }),
    ]) {
      for (const device of edition.devices) {
        expect(largestDifference(device, edition, answers, 500)).toBeLessThan(TABLE_ERROR)
      }
    }
  })

  test('agree with the plain way for any plausible device and answers', () => {
    fc.assert(
      fc.property(plausibleDevice('a'), anyAnswers, (device, answers) => {
        expect(largestDifference(device, makeEdition([device]), answers, 300)).toBeLessThan(TABLE_ERROR)
      }),
      { numRuns: 300 },
    )
  })

  test('agree with the plain way at the edges: wide doubts, dark pages, strong colours', () => {
    fc.assert(
      fc.property(anyDevice('a'), anyAnswers, (device, answers) => {
        const fits = drawFits([device], makeEdition([device]), prepareAnswers(answers), 300)
        expect(fits.every((fit) => fit >= 0 && fit <= 100 + 1e-9)).toBe(true)
        expect(largestDifference(device, makeEdition([device]), answers, 300)).toBeLessThan(TABLE_ERROR)
      }),
      { numRuns: 300 },
    )
  })

  // On a page of L* 70, 0.385 lx is 0.05 cd/m², the edge of the model; 15 cd/m² come at 115.7 lx; the reserve of this page
  // passes 3 near 1 to 2 lx with small print and much need of light.
  test.each([
    { name: 'the dark end of the model', lux: 0.385, frontLight: false },
    { name: 'the light at which a front light hands over', lux: 115.7, frontLight: true },
    { name: 'the step from readable to not', lux: 1.5, frontLight: false },
    { name: 'a front light used to its full', lux: 60, frontLight: true },
    { name: 'the bright end of the model', lux: 15_427, frontLight: false },
  ])('agree with the plain way where a page’s doubt straddles $name', ({ lux, frontLight }) => {
    const device = makeDevice({ slug: 'a', frontLight: { max: 7.2, min: null } })
    // With usual eyes and normal text a page is read down to the very end of the model, where the reserve is still 4.6.
    for (const eye of [{ lightNeed: 'much-more', text: 'small' }, {}] as const) {
      for (const factor of [0.97, 0.99, 1, 1.01, 1.03]) {
        const answers = makeAnswers({ ...eye, spots: [{ lux: lux * factor, hours: 1, frontLight }] })
        expect(largestDifference(device, makeEdition([device]), answers, 2000)).toBeLessThan(TABLE_ERROR)
      }
    }
  })

  // Of 200,000 draws some ten lie so near the step that a table good to 1e-5 alone would put them on the wrong side.
  test('agree with the plain way however near a draw comes to the step from readable to not', () => {
    const device = makeDevice({ slug: 'a', page: { L: 70, a: -1, b: 1, u: { L: 1, a: 0, b: 0 } }, frontLight: false })
    const answers = makeAnswers({ text: 'small' })
    const { eye } = prepareAnswers(answers)
    let [dim, bright] = [0.1, 100]
    for (let i = 0; i < 60; i++) {
      const lux = Math.sqrt(dim * bright)
      if (reserveIn(surfaceOf(device), { lux, frontLight: false }, eye) < 3) dim = lux
      else bright = lux
    }
    const spots = [{ lux: bright, hours: 1, frontLight: false }]
    expect(largestDifference(device, makeEdition([device]), { ...answers, spots }, 200_000)).toBeLessThan(TABLE_ERROR)
  })

  test('a page without any doubt has the same fit in every draw', () => {
    const none = { L: 0, a: 0, b: 0 }
    const device = makeDevice({
      slug: 'a',
      page: { L: 70, a: -1, b: 1, u: none },
      ink: { L: 22, a: 0, b: 0, u: none },
    })
    const edition = makeEdition([device], { uncertainty: { common: none, session: none } })
    const prepared = prepareAnswers(makeAnswers())
    const fits = drawFits([device], edition, prepared, 50)
    expect(new Set(fits).size).toBe(1)
    expect(fits[0]).toBeCloseTo(scoreDevice(device, prepared).fit, 3)
  })

  test('the same question has the same draws, and another question, edition or method others', () => {
    const edition = syntheticEdition(3)
    const answers = makeAnswers()
    const draw = (edition: Edition, answers: Answers) => [
      ...errorSource(edition, prepareAnswers(answers), 20)(edition.devices[0]!).L,
    ]
    const first = draw(edition, answers)
    expect(draw(structuredClone(edition), structuredClone(answers))).toEqual(first)
    expect(draw({ ...edition, number: 2 }, answers)).not.toEqual(first)
    expect(draw({ ...edition, method: 2 }, answers)).not.toEqual(first)
    expect(draw(edition, { ...answers, hold: 'table' })).not.toEqual(first)
  })

  test('limits, the scale of hours and of reading, and the order of tied aims do not make it another question', () => {
    const edition = syntheticEdition(3)
    const answers = makeAnswers()
    const draw = (answers: Answers) => [...drawFits(edition.devices, edition, prepareAnswers(answers), 20)]
    const first = draw(answers)
    expect(draw({ ...answers, limits: { pen: true, budget: 100, currency: 'GBP' } })).toEqual(first)
    expect(draw({ ...answers, aims: [['handling', 'tint', 'clarity', 'whiteness']] })).toEqual(first)
    expect(draw({ ...answers, spots: [{ lux: 9, hours: 0, frontLight: true }, ...answers.spots] })).toEqual(first)
    const scaled = draw({
      ...answers,
      spots: answers.spots.map((spot) => ({ ...spot, hours: spot.hours * 0.3 })),
      reads: { articles: 0.1, novels: 0.3 },
    })
    for (const [k, fit] of scaled.entries()) expect(fit).toBeCloseTo(first[k]!, 9)
  })

  test('nor does the order in which an edition lists a device’s sessions', () => {
    const shares = { s1: 0.1, s2: 0.2, s3: 0.7 }
    const device = makeDevice({ slug: 'a', sessions: shares })
    const turned = { ...device, sessions: Object.fromEntries(Object.entries(shares).reverse()) }
    const errorsOf = errorSource(makeEdition([]), { question: 'order' }, 200)
    const before = structuredClone(errorsOf(device))
    expect(errorsOf(turned)).toEqual(before)
  })

  test('removing a device leaves the draws of the others as they are, to the last bit', () => {
    const edition = syntheticEdition(12)
    const prepared = prepareAnswers(makeAnswers())
    const all = drawFits(edition.devices, edition, prepared, 200)
    const kept = edition.devices.filter((_, i) => i % 3 !== 0)
    const fewer = drawFits(kept, { ...edition, devices: kept }, prepared, 200)
    for (const [row, device] of kept.entries()) {
      const before = edition.devices.indexOf(device)
      expect(fewer.subarray(row * 200, (row + 1) * 200)).toEqual(all.subarray(before * 200, (before + 1) * 200))
    }
  })

  // Method 1, section 6: variances add, u² + s_session²·Σ share² + u_common²; page and ink share the last two.
  test('errors have the spread and the shared parts the method gives them', () => {
    const draws = 40_000
    const edition = makeEdition([], {
      uncertainty: { common: { L: 0.8, a: 0.2, b: 0.3 }, session: { L: 1.5, a: 0.4, b: 0.5 } },
    })
    const page = { L: 70, a: 0, b: 0, u: { L: 0.6, a: 0.1, b: 0.7 } }
    const ink = { L: 22, a: 0, b: 0, u: { L: 0.9, a: 0.1, b: 0.1 } }
    const one = makeDevice({ slug: 'one', page, ink, sessions: { s1: 0.25, s2: 0.75 } })
    const other = makeDevice({ slug: 'other', page, ink, sessions: { s2: 1 } })
    const errorsOf = errorSource(edition, { question: 'spread' }, draws)
    const mine = structuredClone(errorsOf(one))
    const theirs = structuredClone(errorsOf(other))
    const covariance = (x: Float64Array, y: Float64Array) => x.reduce((sum, value, k) => sum + value * y[k]!, 0) / draws
    const shared = 0.8 ** 2 + 1.5 ** 2 * (0.25 ** 2 + 0.75 ** 2)
    const near = (value: number, expected: number, scale: number) =>
      // A covariance of n draws has a standard error of about scale·√(2/n).
      expect(Math.abs(value - expected)).toBeLessThan(4 * scale * Math.sqrt(2 / draws))
    near(covariance(mine.L, mine.L), shared + 0.6 ** 2, shared + 0.6 ** 2)
    near(covariance(mine.ink, mine.ink), shared + 0.9 ** 2, shared + 0.9 ** 2)
    near(covariance(mine.L, mine.ink), shared, 3)
    near(covariance(mine.L, theirs.L), 0.8 ** 2 + 1.5 ** 2 * 0.75, 3)
    near(covariance(mine.b, mine.b), 0.7 ** 2 + 0.3 ** 2 + 0.5 ** 2 * 0.625, 1)
    near(covariance(mine.L, mine.a), 0, 3)
    near(covariance(mine.a, mine.b), 0, 1)
  })
})
