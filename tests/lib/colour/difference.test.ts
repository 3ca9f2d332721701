import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { deltaE00 } from '@/lib/colour/difference'
import reference from '../../reference/ciede2000.json'

const lab = ([L, a, b]: number[]) => ({ L: L!, a: a!, b: b! })

// Sharma, Wu, Dalal 2005, Table 1: all 34 pairs, pair 14 on the published branch.
describe('ΔE00 agrees with the published pairs', () => {
  test.each(reference.pairs)('pair $id is $dE00', ({ Lab1, Lab2, dE00, dE00computed }) => {
    const difference = deltaE00(lab(Lab1), lab(Lab2))
    expect(Math.abs(difference - dE00)).toBeLessThanOrEqual(1e-4)
    expect(difference).toBeCloseTo(dE00computed, 6)
  })
})

const pageLike = fc.record({
  L: fc.double({ min: 0, max: 100, noNaN: true }),
  a: fc.double({ min: -20, max: 20, noNaN: true }),
  b: fc.double({ min: -20, max: 20, noNaN: true }),
})

test('ΔE00 is never negative, is nil for a colour and itself, and reads alike both ways', () => {
  fc.assert(
    fc.property(pageLike, pageLike, (one, other) => {
      expect(deltaE00(one, one)).toBe(0)
      expect(deltaE00(one, other)).toBeGreaterThanOrEqual(0)
      const opposite = Math.abs(one.a * other.b - one.b * other.a) < 1e-6
      if (!opposite) expect(deltaE00(one, other)).toBeCloseTo(deltaE00(other, one), 9)
    }),
  )
})

test('a broken reading is refused', () => {
  expect(() => deltaE00(lab([50, 0, Number.NaN]), lab([50, 0, 0]))).toThrow(RangeError)
  expect(() => deltaE00(lab([50, 0, 0]), lab([Infinity, 0, 0]))).toThrow(/L\*, a\*, b\*/)
})
