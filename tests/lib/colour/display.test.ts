import { expect, test } from 'vitest'
import { labToHex } from '@/lib/colour/display'

// By hand from IEC 61966-2-1: L* 50 has Y 0.18419, encoded 1.055·0.18419^(1/2.4) − 0.055 = 0.46633, 119 of 255.
test.each([
  [100, '#ffffff'],
  [50, '#777777'],
  [0, '#000000'],
])('a neutral of L* %d is drawn %s', (L, hex) => {
  expect(labToHex({ L, a: 0, b: 0 })).toBe(hex)
})

test('a warm page is drawn warm and a greenish one greenish', () => {
  const [red, , blue] = channels(labToHex({ L: 70, a: 0, b: 5 }))
  expect(red).toBeGreaterThan(blue!)
  const [r, g, b] = channels(labToHex({ L: 60, a: -4, b: 0 }))
  expect(g).toBeGreaterThan(Math.max(r!, b!))
})

test('what a display cannot show is clipped, not refused', () => {
  expect(labToHex({ L: 100, a: 0, b: 60 })).toMatch(/^#ff/)
  expect(labToHex({ L: 60, a: 110, b: -80 })).toMatch(/^#[0-9a-f]{2}00ff$/)
  expect(() => labToHex({ L: Number.NaN, a: 0, b: 0 })).toThrow(RangeError)
})

function channels(hex: string): number[] {
  return [1, 3, 5].map((start) => Number.parseInt(hex.slice(start, start + 2), 16))
}
