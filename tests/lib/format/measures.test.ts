import { expect, test } from 'vitest'
import { formatDiagonal, formatMass } from '@/lib/format/measures'

// 1 in = 25.4 mm and 1 lb = 0.453 592 37 kg exactly (international yard and pound agreement, 1959); 16 oz to the pound.
const OUNCE = 453.59237 / 16

test('a diagonal is told in inches, and in centimetres beside it for metric readers', () => {
  expect(formatDiagonal(10, 'inch')).toBe('10.0\u202fin')
  expect(formatDiagonal(10, 'metric')).toBe('10.0\u202fin (25.4\u202fcm)')
  expect(formatDiagonal(5.2, 'metric')).toBe('5.2\u202fin (13.2\u202fcm)')
})

test('a mass is told in grams, or in ounces to a tenth', () => {
  expect(formatMass(208, 'metric')).toBe('208\u202fg')
  expect(formatMass(10 * OUNCE, 'inch')).toBe('10.0\u202foz')
  expect(formatMass(158, 'inch')).toBe(`${(158 / OUNCE).toFixed(1)}\u202foz`)
})
