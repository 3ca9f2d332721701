import fc from 'fast-check'
import { expect, test } from 'vitest'
import { grubbs, grubbsCritical } from '@/lib/stats/grubbs'
import outliers from '@/tests/reference/outliers.json'

const { rows, tolerance: tableTolerance } = outliers.tables.grubbs
const cases = outliers.cases.filter(({ kind }) => kind === 'grubbs')
const judged = cases.filter(({ input, expected }) => expected.G !== null && input.data.length >= 4)
const undecided = cases.filter(({ input, expected }) => expected.G === null || input.data.length < 4)

// Grubbs & Beck 1972; ASTM E178 Table 1; ISO 5725-2:1994 Table 5, as read in outliers.json.
test.each(rows)('critical values for $n readings agree with the printed and the computed table', (row) => {
  const columns = [
    { alpha: 0.1, ...row['oneSided_0.05'] },
    { alpha: 0.05, ...row['twoSided_0.05'] },
    { alpha: 0.02, ...row['oneSided_0.01'] },
    { alpha: 0.01, ...row['twoSided_0.01'] },
  ]
  for (const { alpha, computed, published } of columns) {
    expect(Math.abs(grubbsCritical(row.n, alpha) - computed)).toBeLessThanOrEqual(1e-6)
    expect(Math.abs(grubbsCritical(row.n, alpha) - published)).toBeLessThanOrEqual(tableTolerance)
  }
})

// NIST/SEMATECH e-Handbook 1.3.5.17.1 and computed cases, outliers.json. One-sided at alpha is two-sided at twice it.
test.each(judged)('the verdict of $id is the reference’s', ({ input, expected, tolerance }) => {
  const alpha = input.alternative === 'two-sided' ? input.alpha! : 2 * input.alpha!
  const result = grubbs(input.data, alpha)
  expect(result.reason).toBeNull()
  expect(Math.abs(result.G! - expected.G!)).toBeLessThanOrEqual(tolerance!.G!)
  expect(Math.abs(result.critical! - expected.critical!)).toBeLessThanOrEqual(tolerance!.critical ?? 1e-6)
  expect(result.index).toBe(expected.suspectIndex)
  expect(input.data[result.index!]).toBe(expected.suspect)
  expect(result.isOutlier).toBe(expected.isOutlier)
})

// outliers.json leaves three readings to a stated rule, and recommends none below four.
test.each(undecided)('$id has no statistic, a reason, and no outlier', ({ input }) => {
  const reason = input.data.length < 4 ? 'too-few' : 'no-spread'
  expect(grubbs(input.data)).toEqual({ G: null, critical: null, index: null, isOutlier: false, reason })
})

test('every kind of case in the reference is met', () => {
  expect(judged.length).toBeGreaterThanOrEqual(5)
  expect(undecided.map(({ id }) => id)).toContain('grubbs-n3-max-possible')
  expect(undecided.length).toBeGreaterThanOrEqual(4)
})

const set = fc.uniqueArray(fc.integer({ min: 0, max: 10_000 }), { minLength: 4, maxLength: 20 })

// Grubbs & Beck 1972: G ≤ (n − 1)/√n, reached where all readings but one are equal.
test('G stays within its bound and does not depend on order, offset or scale', () => {
  fc.assert(
    fc.property(set, fc.integer({ min: -90, max: 90 }), fc.integer({ min: 1, max: 9 }), (data, shift, scale) => {
      const result = grubbs(data)
      expect(result.G).toBeLessThanOrEqual((data.length - 1) / Math.sqrt(data.length) + 1e-12)
      const moved = grubbs(data.map((value) => value * scale + shift).toReversed())
      expect(moved.G).toBeCloseTo(result.G!, 9)
      expect(moved.critical).toBe(result.critical)
      expect(moved.isOutlier).toBe(result.isOutlier)
    }),
  )
})
