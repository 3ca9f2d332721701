import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { prepareAnswers } from '@/lib/method/fit'
import { AIMS, type Aim } from '@/lib/method/types'
import { aimWeights, colourfulness, normalised, rankOrderCentroid } from '@/lib/method/weights'
import { anyAnswers } from '@/tests/fixtures/arbitraries'
import { makeAnswers } from '@/tests/fixtures/edition'
import cam16 from '@/tests/reference/cam16.json'
import reference from '@/tests/reference/weights.json'

const sum = (weights: Record<Aim, number>) => AIMS.reduce((total, aim) => total + weights[aim], 0)

describe('weights of ranked aims', () => {
  // Barron & Barrett 1996; tables of tests/reference/weights.json, exact fractions to eight digits.
  test.each(reference.tables.tables.rankOrderCentroid)('rank-order-centroid weights of $n aims', ({ n, weights }) => {
    const own = rankOrderCentroid(n)
    expect(own).toHaveLength(n)
    for (const [i, weight] of weights.entries()) expect(own[i]).toBeCloseTo(weight, 8)
  })

  // By hand from 25/48, 13/48, 7/48, 3/48.
  test.each<{ aims: Aim[][]; expected: number[] }>([
    { aims: [['clarity'], ['whiteness'], ['tint'], ['handling']], expected: [25 / 48, 13 / 48, 7 / 48, 3 / 48] },
    { aims: [['handling'], ['tint'], ['whiteness'], ['clarity']], expected: [3 / 48, 7 / 48, 13 / 48, 25 / 48] },
    { aims: [['clarity'], ['whiteness', 'tint'], ['handling']], expected: [25 / 48, 10 / 48, 10 / 48, 3 / 48] },
    { aims: [['clarity', 'whiteness', 'tint', 'handling']], expected: [1 / 4, 1 / 4, 1 / 4, 1 / 4] },
    {
      aims: [
        ['clarity', 'handling'],
        ['tint', 'whiteness'],
      ],
      expected: [19 / 48, 5 / 48, 5 / 48, 19 / 48],
    },
  ])('tied aims share the mean of their places: $aims', ({ aims, expected }) => {
    const weights = aimWeights(aims)
    for (const [i, aim] of AIMS.entries()) expect(weights[aim]).toBeCloseTo(expected[i]!, 12)
  })

  test.each<{ name: string; aims: Aim[][] }>([
    { name: 'one missing', aims: [['clarity'], ['whiteness', 'tint']] },
    { name: 'one twice', aims: [['clarity'], ['whiteness', 'tint'], ['handling', 'tint']] },
    { name: 'one twice in place of another', aims: [['clarity'], ['whiteness', 'tint', 'tint']] },
  ])('aims with $name are refused', ({ aims }) => {
    expect(() => aimWeights(aims)).toThrow(RangeError)
  })

  test.each([
    { name: 'all 0', weights: [0, 0, 0, 0] },
    { name: 'a negative one', weights: [1, -0.1, 1, 1] },
    { name: 'not a number', weights: [1, Number.NaN, 1, 1] },
    { name: 'an infinite one', weights: [1, Infinity, 1, 1] },
  ])('weights by hand with $name are refused', ({ weights: [clarity, whiteness, tint, handling] }) => {
    expect(() => normalised({ clarity: clarity!, whiteness: whiteness!, tint: tint!, handling: handling! })).toThrow(
      RangeError,
    )
  })

  test('weights as large or as small as numbers go are still rescaled', () => {
    for (const size of [Number.MAX_VALUE, Number.MIN_VALUE]) {
      expect(normalised({ clarity: size, whiteness: size, tint: size, handling: size }).tint).toBe(0.25)
    }
  })
})

describe('what the reader’s light does to the weights', () => {
  // F_L of CIECAM16 (CIE 248:2022) as tests/reference/cam16.json has it for the same adapting luminance, 0.2·E/π.
  test('colourfulness follows F_L to the power 0.25', () => {
    const rows = cam16.vectors.filter((vector) => vector.Yb === 20 && vector.E_lx >= 1)
    expect(rows.length).toBeGreaterThan(3)
    const [first, ...others] = rows
    for (const row of others) {
      const expected = (row.intermediate.FL / first!.intermediate.FL) ** 0.25
      // The reference prints F_L to seven digits.
      expect(colourfulness(row.E_lx) / colourfulness(first!.E_lx)).toBeCloseTo(expected, 6)
    }
  })

  test('in 500 lux, with usual eyes, normal text and no front light nothing is multiplied', () => {
    const { multipliers } = prepareAnswers(makeAnswers({ spots: [{ lux: 500, hours: 3, frontLight: false }] }))
    for (const aim of AIMS) expect(multipliers[aim]).toBeCloseTo(1, 12)
  })

  test('dim light lets lightness count for more and tint for less; sun the other way round', () => {
    const at = (lux: number) =>
      prepareAnswers(makeAnswers({ spots: [{ lux, hours: 1, frontLight: false }] })).multipliers
    expect(at(5).clarity).toBeGreaterThan(1)
    expect(at(5).tint).toBeLessThan(1)
    expect(at(80_000).clarity).toBe(0.1)
    expect(at(80_000).whiteness).toBeGreaterThan(1)
    expect(at(80_000).handling).toBe(1)
  })

  test('below one lux tint is taken at one lux', () => {
    expect(colourfulness(0)).toBe(colourfulness(1))
  })

  test('weights set by hand are final: rescaled, and not multiplied by the light', () => {
    const weights = { clarity: 2, whiteness: 1, tint: 1, handling: 0 }
    const prepared = prepareAnswers(makeAnswers({ weights, spots: [{ lux: 5, hours: 1, frontLight: false }] }))
    expect(prepared.weights).toEqual({ clarity: 0.5, whiteness: 0.25, tint: 0.25, handling: 0 })
    expect(prepared.multipliers).toEqual({ clarity: 1, whiteness: 1, tint: 1, handling: 1 })
  })

  test('whatever the answers, weights are between 0 and 1 and sum to 1, and multipliers keep their bounds', () => {
    fc.assert(
      fc.property(anyAnswers, (answers) => {
        const { weights, multipliers } = prepareAnswers(answers)
        expect(sum(weights)).toBeCloseTo(1, 12)
        for (const aim of AIMS) {
          expect(weights[aim]).toBeGreaterThanOrEqual(0)
          expect(weights[aim]).toBeLessThanOrEqual(1)
        }
        expect(multipliers.clarity).toBeGreaterThanOrEqual(0.1)
        expect(multipliers.clarity).toBeLessThanOrEqual(3)
      }),
      { numRuns: 300 },
    )
  })
})
