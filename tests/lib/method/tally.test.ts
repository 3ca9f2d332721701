import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { errorSource } from '@/lib/method/errors'
import { rankDraws, tooClose } from '@/lib/method/tally'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'
import reference from '@/tests/reference/rank-correlation.json'

type RankCase = {
  id: string
  input: { mean: number[]; sd: number[]; commonSensitivity?: number[]; commonSd?: number }
  expected: { pBest: number[]; rankMatrix: number[][]; rankInterval95: number[][]; pairwise: (number | null)[][] }
}
const cases = reference.cases.filter((one) => one.kind === 'rank-probability') as unknown as RankCase[]

const DRAWS = 100_000

/**
 * Scores mean + error of the case's options, their errors drawn by the product: an option's own doubt is the doubt of
 * a page's L*, and the bias it shares with the others, times its sensitivity, is a session's error times its share.
 */
function drawnScores({ id, input }: RankCase): Float64Array {
  const none = { L: 0, a: 0, b: 0 }
  const edition = makeEdition([], { uncertainty: { common: none, session: { ...none, L: input.commonSd ?? 0 } } })
  const errorsOf = errorSource(edition, { question: id }, DRAWS)
  const scores = new Float64Array(input.mean.length * DRAWS)
  for (const [i, mean] of input.mean.entries()) {
    const page = { L: 70, a: 0, b: 0, u: { ...none, L: input.sd[i]! } }
    const sessions = { bias: input.commonSensitivity?.[i] ?? 0 }
    const { L } = errorsOf(makeDevice({ slug: `option-${i}`, page, sessions }))
    for (let k = 0; k < DRAWS; k++) scores[i * DRAWS + k] = mean + L[k]!
  }
  return scores
}

const standardError = (p: number) => Math.sqrt((p * (1 - p)) / DRAWS)

describe('what the draws say', () => {
  test('there are reference cases to hold it to', () => {
    expect(cases.length).toBe(7)
  })

  // tests/reference/rank-correlation.json: exact probabilities by numerical integration. Shared errors of the same
  // sensitivity cancel there ("ranks-shared-bias-cancels"), and do not where sensitivities differ.
  test.each(cases)('first-place shares match the exact probabilities: $id', (one) => {
    const options = one.input.mean.length
    const tallies = rankDraws(drawnScores(one), options, DRAWS)
    for (const [i, p] of one.expected.pBest.entries()) {
      expect(Math.abs(tallies[i]!.first - p)).toBeLessThanOrEqual(3 * standardError(p))
    }
    expect(tallies.reduce((sum, { first }) => sum + first, 0)).toBeCloseTo(1, 9)
  })

  test('a bias shared by all, treated as independent, would not match', () => {
    const one = cases.find(({ id }) => id === 'ranks-shared-bias-cancels')!
    const total = Math.hypot(one.input.sd[0]!, one.input.commonSd!)
    const independent = { ...one, input: { mean: one.input.mean, sd: one.input.mean.map(() => total) } }
    const [leader] = rankDraws(drawnScores(independent), 4, DRAWS)
    expect(Math.abs(leader!.first - one.expected.pBest[0]!)).toBeGreaterThan(
      100 * standardError(one.expected.pBest[0]!),
    )
  })

  test.each(cases)('rank intervals are those of the exact rank probabilities: $id', (one) => {
    const tallies = rankDraws(drawnScores(one), one.input.mean.length, DRAWS)
    for (const [i, interval] of one.expected.rankInterval95.entries()) expect(tallies[i]!.rank95).toEqual(interval)
  })

  // A pair is too close where the one of the higher mean is ahead with a probability under 95 %; cases within four
  // standard errors of 95 % decide nothing and none is.
  test.each(cases)('pairs too close to call are those under 95 %: $id', (one) => {
    const ties = tooClose(drawnScores(one), one.input.mean.length, DRAWS)
    for (const [i, row] of one.expected.pairwise.entries()) {
      for (let j = i + 1; j < row.length; j++) {
        const p = row[j]!
        expect(Math.abs(p - 0.95)).toBeGreaterThan(4 * standardError(0.95))
        expect(ties[i]!.includes(j)).toBe(p < 0.95)
        expect(ties[j]!.includes(i)).toBe(p < 0.95)
      }
    }
  })
})

/** Rows of draws, one a device, as one array. */
const rows = (...values: number[][]) => Float64Array.from(values.flat())

describe('ranks within a draw', () => {
  test('a rank is 1 + the number strictly ahead, and first place is shared by those level', () => {
    const [a, b, c] = rankDraws(rows([9, 5, 5], [9, 7, 5], [1, 6, 5]), 3, 3)
    expect([a!.first, b!.first, c!.first]).toEqual([(1 / 2 + 1 / 3) / 3, (1 / 2 + 1 + 1 / 3) / 3, 1 / 3 / 3])
    expect([a!.rank95, b!.rank95, c!.rank95]).toEqual([
      [1, 3],
      [1, 1],
      [1, 3],
    ])
  })

  test('the spread is the standard deviation with n − 1', () => {
    const [only] = rankDraws(rows([2, 4, 4, 4, 5, 5, 7, 9]), 1, 8)
    expect(only!.sd).toBeCloseTo(Math.sqrt(32 / 7), 12)
    expect(rankDraws(rows([2]), 1, 1)[0]!.sd).toBe(0)
  })

  // Nearest rank: of 4,000 draws the 100th and the 3,900th; of 40 the 1st and the 39th.
  test.each([
    { draws: 4000, behind: 100, interval: [1, 1] },
    { draws: 4000, behind: 101, interval: [1, 2] },
    { draws: 4000, behind: 3900, interval: [1, 2] },
    { draws: 4000, behind: 3901, interval: [2, 2] },
    { draws: 40, behind: 1, interval: [1, 1] },
    { draws: 40, behind: 2, interval: [1, 2] },
  ])('second in $behind of $draws draws gives the interval $interval', ({ draws, behind, interval }) => {
    const own = Array.from({ length: draws }, (_, k) => (k < behind ? 0 : 2))
    const other = own.map(() => 1)
    expect(rankDraws(rows(own, other), 2, draws)[0]!.rank95).toEqual(interval)
  })

  // Strictly ahead in fewer than 95 % of draws: 3,800 of 4,000 settle a pair, 3,799 do not; level is not ahead.
  test.each([
    { draws: 4000, notAhead: 200, tied: false },
    { draws: 4000, notAhead: 201, tied: true },
    { draws: 4001, notAhead: 200, tied: false },
    { draws: 4001, notAhead: 201, tied: true },
  ])('not ahead in $notAhead of $draws draws: tied is $tied', ({ draws, notAhead, tied }) => {
    const other = Array.from({ length: draws }, () => 1)
    for (const without of [0, 1]) {
      const own = other.map((_, k) => (k % 19 === 3 && Math.floor(k / 19) < notAhead ? without : 2))
      expect(own.filter((value) => value === without)).toHaveLength(notAhead)
      expect(tooClose(rows(own, other), 2, draws)[0]).toEqual(tied ? [1] : [])
    }
  })

  // 150 draws in which the one falls back and 150 others in which the other leaps ahead: 300 of 4,000.
  test('draws not ahead count whether the one falls back or the other leaps ahead', () => {
    const own = Array.from({ length: 4000 }, (_, k) => (k < 150 ? 0 : 2))
    const other = own.map((_, k) => (k >= 3850 ? 3 : 1))
    expect(tooClose(rows(own, other), 2, 4000)).toEqual([[1], [0]])
  })

  test('two devices that are always level are too close to call', () => {
    expect(tooClose(rows([0, 0, 0], [0, 0, 0]), 2, 3)).toEqual([[1], [0]])
  })

  test('counting no pair that sorted draws settle finds the same ties as counting every pair', () => {
    const draws = 60
    const matrix = fc.integer({ min: 1, max: 9 }).chain((devices) =>
      fc.array(
        fc.record({
          at: fc.integer({ min: 0, max: 30 }),
          noise: fc.array(fc.integer({ min: -4, max: 4 }), { minLength: draws, maxLength: draws }),
        }),
        { minLength: devices, maxLength: devices },
      ),
    )
    fc.assert(
      fc.property(matrix, (options) => {
        const values = options.map(({ at, noise }) => noise.map((error) => at + error / 2))
        const ties = tooClose(rows(...values), options.length, draws)
        for (const [i, own] of values.entries()) {
          const expected = values.flatMap((other, j) => {
            if (i === j) return []
            const [upper, lower] = i < j ? [own, other] : [other, own]
            return upper.filter((fit, k) => fit > lower[k]!).length < 0.95 * draws ? [j] : []
          })
          expect(ties[i]).toEqual(expected)
        }
      }),
      { numRuns: 300 },
    )
  })
})
