import fc from 'fast-check'
import { expect, test } from 'vitest'
import { mean, pooledSd, sd } from '@/lib/stats/describe'
import gum from '@/tests/reference/gum.json'

const readings = fc.array(
  fc.integer({ min: -10_000, max: 10_000 }).map((n) => n / 100),
  { minLength: 2, maxLength: 30 },
)

function numacc2({ first, thenAlternating, n }: { first: number; thenAlternating: number[]; n: number }): number[] {
  return Array.from({ length: n }, (_, i) => (i === 0 ? first : thenAlternating[(i - 1) % 2]!))
}

// NIST Statistical Reference Datasets, certified values, as read in gum.json.
test.each(gum.cases.filter((entry) => entry.kind === 'descriptive'))(
  'mean and standard deviation keep the certified digits of $id',
  ({ input, expected, tolerance }) => {
    const data = input.data ?? numacc2(input as { first: number; thenAlternating: number[]; n: number })
    const { meanRel, sRel } = tolerance as { meanRel: number; sRel: number }
    expect(Math.abs(mean(data) / expected.mean! - 1)).toBeLessThanOrEqual(meanRel)
    expect(Math.abs(sd(data)! / expected.s! - 1)).toBeLessThanOrEqual(sRel)
  },
)

// JCGM 100:2008, 4.4.3 and Table 1, from memory (gum.json).
test('twenty thermometer readings give the mean and standard deviation of the Guide', () => {
  const { input, expected, tolerance } = gum.cases.find(({ id }) => id === 'gum-4.4.3-thermometer')!
  expect(mean(input.data!)).toBeCloseTo(expected.mean!, 9)
  expect(Math.abs(sd(input.data!)! - expected.s!)).toBeLessThanOrEqual((tolerance as { s: number }).s)
  expect(sd(input.data!)).toBeCloseTo(expected.s!, 9)
})

// By hand: the groups have sums of squares 2, 0.5 and none, on 2 + 1 + 0 degrees of freedom.
test('pooling weighs each group by its degrees of freedom and passes over groups of one', () => {
  expect(pooledSd([[1, 2, 3], [7, 8], [100], []])).toBeCloseTo(Math.sqrt(2.5 / 3), 14)
})

test('one reading has no spread to report, and no reading has no mean', () => {
  expect(sd([])).toBeNull()
  expect(sd([70.2])).toBeNull()
  expect(pooledSd([])).toBeNull()
  expect(pooledSd([[70.2], [69.8], []])).toBeNull()
  expect(() => mean([])).toThrow(RangeError)
  expect(() => mean([70, Number.NaN])).toThrow(RangeError)
})

test('equal readings have a spread of exactly zero', () => {
  fc.assert(
    fc.property(fc.double({ min: -200, max: 200, noNaN: true }), fc.integer({ min: 2, max: 60 }), (value, n) => {
      expect(sd(new Array(n).fill(value))).toBe(0)
    }),
  )
})

test('the order of readings changes nothing; adding and scaling act as they should', () => {
  fc.assert(
    fc.property(readings, fc.integer({ min: -50, max: 50 }), fc.integer({ min: 1, max: 9 }), (data, shift, scale) => {
      const [centre, spread] = [mean(data), sd(data)!]
      const reversed = data.toReversed()
      const moved = data.map((value) => value * scale + shift)
      expect(mean(reversed)).toBeCloseTo(centre, 10)
      expect(sd(reversed)).toBeCloseTo(spread, 10)
      expect(mean(moved)).toBeCloseTo(centre * scale + shift, 9)
      expect(sd(moved)).toBeCloseTo(spread * scale, 9)
      expect(pooledSd([data])).toBeCloseTo(spread, 12)
    }),
  )
})
