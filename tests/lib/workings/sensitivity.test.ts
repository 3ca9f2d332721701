import fc from 'fast-check'
import { expect, test } from 'vitest'
import { slopesOf } from '@/lib/workings/sensitivity'

/** dY/dL* = 3·100/116·((L* + 16)/116)², ISO/CIE 11664-4 differentiated by hand; valid above L* 8. */
const steepness = (L: number) => (300 / 116) * ((L + 16) / 116) ** 2
const luminance = (L: number) => 100 * ((L + 16) / 116) ** 3

test('the slopes of a contrast ratio are those found by hand', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 40, max: 95, noNaN: true }),
      fc.double({ min: 12, max: 35, noNaN: true }),
      (L, dark) => {
        const { page, ink } = slopesOf('contrast', { L, a: -1, b: 2 }, { L: dark, a: 0, b: 0 })
        expect(page.L / (steepness(L) / luminance(dark))).toBeCloseTo(1, 5)
        expect(ink / ((-luminance(L) * steepness(dark)) / luminance(dark) ** 2)).toBeCloseTo(1, 4)
        expect(page.a).toBeCloseTo(0, 9)
        expect(page.b).toBeCloseTo(0, 9)
      },
    ),
  )
})

// CIE 15 differentiated by hand at a neutral: with S = X + Y + Z, dX/da* = 3·Xₙf²/500, dZ/db* = −3·Zₙf²/200.
test('the slopes of whiteness and tint over a* and b* are those found by hand', () => {
  const L = 70
  const f = (L + 16) / 116
  const [X, Y, Z] = [94.811 * f ** 3, 100 * f ** 3, 107.304 * f ** 3]
  const S = X + Y + Z
  const dXda = (3 * 94.811 * f ** 2) / 500
  const dZdb = (-3 * 107.304 * f ** 2) / 200
  const overA = { x: (dXda * (S - X)) / S ** 2, y: (-dXda * Y) / S ** 2 }
  const overB = { x: (-dZdb * X) / S ** 2, y: (-dZdb * Y) / S ** 2 }
  const whitenessOf = ({ x, y }: typeof overA) => -800 * x - 1700 * y
  const tintOf = ({ x, y }: typeof overA) => -900 * x + 650 * y
  const grey = [
    { L, a: 0, b: 0 },
    { L: 22, a: 0, b: 0 },
  ] as const
  const whiteness = slopesOf('whiteness', ...grey)
  const tint = slopesOf('tint', ...grey)
  expect(whiteness.page.a).toBeCloseTo(whitenessOf(overA), 4)
  expect(whiteness.page.b).toBeCloseTo(whitenessOf(overB), 4)
  expect(whiteness.page.L).toBeCloseTo(steepness(L), 3)
  expect(tint.page.a).toBeCloseTo(tintOf(overA), 4)
  expect(tint.page.b).toBeCloseTo(tintOf(overB), 4)
  expect(whiteness.ink).toBe(0)
})
