import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { D65_10 } from '@/lib/colour/white'
import { xyyToXyz, xyzToXyy } from '@/lib/colour/xyy'
import reference from '../../reference/whiteness.json'

// tests/reference/whiteness.json gives XYZ and Yxy of each sample; the one not `given` was derived from the other.
describe('chromaticity agrees with the reference vectors', () => {
  test.each(reference.vectors)('$id, $name', ({ X, Y, Z, x, y }) => {
    const xyy = xyzToXyy({ X, Y, Z })
    expect(xyy.x).toBeCloseTo(x, 7)
    expect(xyy.y).toBeCloseTo(y, 7)
    const xyz = xyyToXyz({ x, y, Y })
    expect(xyz.X).toBeCloseTo(X, 4)
    expect(xyz.Y).toBe(Y)
    expect(xyz.Z).toBeCloseTo(Z, 4)
  })
})

// CIE 15: the D65/10° white is x 0.3138, y 0.3310 to four digits.
test('black takes the chromaticity of the white, so greys stay grey down to nothing', () => {
  const black = xyzToXyy({ X: 0, Y: 0, Z: 0 })
  expect(black.x).toBeCloseTo(0.3138, 4)
  expect(black.y).toBeCloseTo(0.331, 4)
  expect(black).toEqual({ ...xyzToXyy(D65_10), Y: 0 })
  expect(xyyToXyz({ x: 0.3, y: 0, Y: 0 })).toEqual({ X: 0, Y: 0, Z: 0 })
})

test('a surface survives the way to chromaticity and back', () => {
  const part = fc.double({ min: 0.01, max: 120, noNaN: true })
  fc.assert(
    fc.property(part, part, part, (X, Y, Z) => {
      const back = xyyToXyz(xyzToXyy({ X, Y, Z }))
      expect(back.X).toBeCloseTo(X, 9)
      expect(back.Y).toBe(Y)
      expect(back.Z).toBeCloseTo(Z, 9)
    }),
  )
})

test('what no surface can be is refused', () => {
  expect(() => xyzToXyy({ X: -3, Y: 1, Z: 2 })).toThrow(/must be positive, got 0/)
  expect(() => xyzToXyy({ X: Number.NaN, Y: 1, Z: 2 })).toThrow(RangeError)
  expect(() => xyyToXyz({ x: 0.3, y: 0, Y: 40 })).toThrow(/y must be positive/)
  expect(() => xyyToXyz({ x: 0.3, y: Infinity, Y: 40 })).toThrow(RangeError)
})
