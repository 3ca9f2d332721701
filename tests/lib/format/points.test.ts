import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { formatShare, formatTimes, formatUnit, roundToTotal } from '@/lib/format/number'

test.each([
  [formatUnit(80, 'lux'), '80\u202flux'],
  [formatUnit(2.5, 'h', 1), '2.5\u202fh'],
  [formatTimes(18.74), '18.7×'],
  [formatShare(0.616), '62\u202f%'],
  // An estimate from draws is never quite none or all.
  [formatShare(0), '<\u202f1\u202f%'],
  [formatShare(0.0049), '<\u202f1\u202f%'],
  [formatShare(0.005), '1\u202f%'],
  [formatShare(0.9949), '99\u202f%'],
  [formatShare(1), '>\u202f99\u202f%'],
])('%s', (shown, expected) => {
  expect(shown).toBe(expected)
})

describe('points rounded to whole numbers', () => {
  test.each([
    // Worked by hand: the largest remainders go up until the sum is right.
    [
      [42.1, 12.3, 18.7, 5.6],
      [42, 12, 19, 6],
    ],
    [
      [0.5, 0.5],
      [1, 0],
    ],
    [
      [0, 0, 0, 0],
      [0, 0, 0, 0],
    ],
    [
      [25, 25, 25, 25],
      [25, 25, 25, 25],
    ],
  ])('%j are shown as %j', (parts, shown) => {
    expect(roundToTotal(parts)).toEqual(shown)
  })

  test('always add up to the rounded fit, each less than one from its own value', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 100, noNaN: true }), { minLength: 1, maxLength: 6 }), (parts) => {
        const shown = roundToTotal(parts)
        expect(shown.reduce((sum, part) => sum + part, 0)).toBe(Math.round(parts.reduce((sum, part) => sum + part, 0)))
        parts.forEach((part, i) => {
          expect(Math.abs((shown[i] ?? Infinity) - part)).toBeLessThan(1)
        })
      }),
    )
  })
})
