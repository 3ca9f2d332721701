import { describe, expect, test } from 'vitest'
import { formatDay, formatMonth } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatMoney } from '@/lib/format/money'
import { formatDoubt, formatExact, formatLux, formatNumber, formatOrdinal, formatRange } from '@/lib/format/number'

describe('numbers', () => {
  test.each([
    [formatNumber(73.449, 1), '73.4'],
    [formatNumber(-1.25, 1), '−1.3'],
    [formatNumber(-0.04, 1), '0.0'],
    [formatNumber(80_000), '80,000'],
    [formatExact(0.3138), '0.3138'],
    [formatExact(-1.36415), '−1.36415'],
    [formatExact(200_000), '200,000'],
    [formatExact(1e-6), '0.000001'],
    [formatLux(79.43), '79'],
    [formatLux(0.1), '0.1'],
    [formatLux(8000), '8,000'],
    [formatDoubt(0.83, 1), '±\u202f0.8'],
    [formatDoubt(3.4), '±\u202f3'],
    [formatDoubt(0.04, 1), '±\u202f0.04'],
    [formatDoubt(0, 1), '±\u202f0.0'],
    [formatRange(2, 5), '2–5'],
    [formatRange(3, 3), '3'],
  ])('%s', (shown, expected) => {
    expect(shown).toBe(expected)
  })
})

test.each([
  [1, '1st'],
  [2, '2nd'],
  [3, '3rd'],
  [4, '4th'],
  [11, '11th'],
  [12, '12th'],
  [13, '13th'],
  [22, '22nd'],
])('place %i is %s', (place, words) => {
  expect(formatOrdinal(place)).toBe(words)
})

test.each([
  [{ amount: 18_900, currency: 'GBP' }, '£189'],
  [{ amount: 18_950, currency: 'GBP' }, '£189.50'],
  [{ amount: 24_900, currency: 'EUR' }, '€249'],
  // ISO 4217: the yen has no minor unit.
  [{ amount: 24_900, currency: 'JPY' }, 'JP¥24,900'],
])('%j is %s', (price, words) => {
  expect(formatMoney(price)).toBe(words)
})

test('a date is the day it is in UTC', () => {
  expect(formatDay('2026-11-14T23:59:59Z')).toBe('14 November 2026')
  expect(formatMonth('2026-11-30T23:59:59Z')).toBe('November 2026')
})

test('names are listed as in a sentence', () => {
  expect(formatList(['A', 'B', 'C'])).toBe('A, B and C')
})
