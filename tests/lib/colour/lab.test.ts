import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { type Lab, labToLch, labToXyz, lightnessToY, xyzToLab } from '@/lib/colour/lab'
import { D65_10, type Xyz } from '@/lib/colour/white'
import reference from '../../reference/cielab.json'

const xyz = ([X, Y, Z]: number[]): Xyz => ({ X: X!, Y: Y!, Z: Z! })
const whites = {
  'D65/10deg': xyz(reference.whites['D65/10deg'].XYZ),
  'D65/2deg': xyz(reference.whites['D65/2deg'].XYZ),
}
const channel = (min: number, max: number) => fc.double({ min, max, noNaN: true })

// tests/reference/cielab.json: CIE 15 / ISO/CIE 11664-4 by three routes, seven decimals.
describe('CIELAB agrees with the reference vectors', () => {
  test.each(reference.vectors)('$id, XYZ $XYZ against $white', ({ white, XYZ, Lab, LCh }) => {
    const against = whites[white as keyof typeof whites]
    const lab = xyzToLab(xyz(XYZ), against)
    expect(lab.L).toBeCloseTo(Lab[0]!, 6)
    expect(lab.a).toBeCloseTo(Lab[1]!, 6)
    expect(lab.b).toBeCloseTo(Lab[2]!, 6)

    // From the printed seven decimals back: one unit of the last moves X or Z by less than 1e-6.
    const back = labToXyz({ L: Lab[0]!, a: Lab[1]!, b: Lab[2]! }, against)
    expect(back.X).toBeCloseTo(XYZ[0]!, 5)
    expect(back.Y).toBeCloseTo(XYZ[1]!, 5)
    expect(back.Z).toBeCloseTo(XYZ[2]!, 5)

    const lch = labToLch(lab)
    expect(lch.L).toBe(lab.L)
    expect(lch.C).toBeCloseTo(LCh[1]!, 6)
    if (LCh[2] === null) expect(lch.h).toBeNull()
    // A hue is an angle at a radius of C: the doubt of 1e-7 in a* or b* is 1e-7/C in radians.
    else expect(Math.abs(lch.h! - LCh[2]!)).toBeLessThan(1e-6 + 1e-5 / LCh[1]!)
  })
})

test('the published white is that of ASTM E308 for D65 and the 10° observer', () => {
  expect(D65_10).toEqual(whites['D65/10deg'])
  expect(labToXyz({ L: 100, a: 0, b: 0 })).toEqual({ X: 94.811, Y: 100, Z: 107.304 })
})

// ISO/CIE 11664-4: Y/Yn = L*·27/24389 at or below L* 8.
test('the straight branch meets the cube at L* 8', () => {
  expect(lightnessToY(8)).toBeCloseTo((100 * 216) / 24389, 12)
  expect(lightnessToY(4)).toBeCloseTo((100 * 4 * 27) / 24389, 12)
})

// Common rounded pairs, worked from ISO/CIE 11664-4.
test.each([
  [0, 0],
  [25, 57.1],
  [42, 70.9],
  [60, 81.8],
  [88, 95.2],
  [100, 100],
])('a page that reflects %d percent has L* %d', (Y, L) => {
  const page = xyzToLab({ X: 40, Y, Z: 40 })
  expect(page.L).toBeCloseTo(L, 1)
  expect(lightnessToY(page.L)).toBeCloseTo(Y, 9)
})

test('a colour survives the way to XYZ and back, dark and strong ones too', () => {
  fc.assert(
    fc.property(channel(0, 100), channel(-128, 128), channel(-128, 128), (L, a, b) => {
      const back: Lab = xyzToLab(labToXyz({ L, a, b }))
      expect(back.L).toBeCloseTo(L, 9)
      expect(back.a).toBeCloseTo(a, 9)
      expect(back.b).toBeCloseTo(b, 9)
    }),
  )
})

test('a hue angle is from 0 up to 360 degrees and points back at the colour', () => {
  fc.assert(
    fc.property(channel(-100, 100), channel(-100, 100), (a, b) => {
      const { C, h } = labToLch({ L: 50, a, b })
      if (h === null) {
        expect(C).toBeLessThan(1e-9)
        return
      }
      expect(h).toBeGreaterThanOrEqual(0)
      expect(h).toBeLessThan(360)
      expect(C * Math.cos((h * Math.PI) / 180)).toBeCloseTo(a, 9)
      expect(C * Math.sin((h * Math.PI) / 180)).toBeCloseTo(b, 9)
    }),
  )
})

test('a neutral has no hue, even when only the arithmetic tints it', () => {
  expect(labToLch({ L: 70, a: 0, b: 0 }).h).toBeNull()
  expect(labToLch(xyzToLab({ X: 0.42 * D65_10.X, Y: 42, Z: 0.42 * D65_10.Z })).h).toBeNull()
  expect(labToLch({ L: 70, a: 0.001, b: 0 }).h).toBe(0)
  expect(labToLch({ L: 70, a: 0.001, b: -0 }).h).toBe(0)
  expect(labToLch({ L: 70, a: 1, b: -1e-30 }).h).toBe(0)
})

test('a broken reading is refused, not carried on', () => {
  for (const broken of [Number.NaN, Infinity, -Infinity]) {
    expect(() => labToXyz({ L: broken, a: 0, b: 0 })).toThrow(RangeError)
    expect(() => labToLch({ L: 50, a: broken, b: 0 })).toThrow(RangeError)
    expect(() => xyzToLab({ X: 40, Y: 42, Z: broken })).toThrow(/X, Y, Z must be finite numbers/)
    expect(() => lightnessToY(broken)).toThrow(RangeError)
  }
  expect(() => lightnessToY(-0.01)).toThrow(/from 0 to 100/)
  expect(() => lightnessToY(100.01)).toThrow(/from 0 to 100/)
})
