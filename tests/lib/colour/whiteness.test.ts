import { describe, expect, test } from 'vitest'
import { labToXyz } from '@/lib/colour/lab'
import { D65_10 } from '@/lib/colour/white'
import { cieWhiteness, E313_D65_10, e313Yellowness, WHITENESS_D65_10 } from '@/lib/colour/whiteness'
import { xyzToXyy } from '@/lib/colour/xyy'
import reference from '../../reference/whiteness.json'

const { whitePointUsed, yellownessE313 } = reference.constants
const [CX, CZ] = yellownessE313.coefficients['D65/2deg']
// Tint's factor is 900 for the 10° observer and 1,000 for the 2° one: CIE 15, equations in the file.
const formulas = {
  '10deg': { ...whitePointUsed['10deg'], tintX: 900 },
  '2deg': { ...whitePointUsed['2deg'], tintX: 1000 },
}
const coefficients = { '10deg': E313_D65_10, '2deg': { CX: CX!, CZ: CZ! } }

// tests/reference/whiteness.json: CIE 15 whiteness and tint, ASTM E313 yellowness, three routes.
describe('whiteness, tint and yellowness agree with the reference vectors', () => {
  test.each(reference.vectors)('$id, $name, $observer', (vector) => {
    const observer = vector.observer as keyof typeof formulas
    const { X, Y, Z } = vector
    const sample = vector.given === 'XYZ' ? xyzToXyy({ X, Y, Z }) : { x: vector.x, y: vector.y, Y }

    const figures = cieWhiteness(sample, formulas[observer])
    expect(figures.whiteness).toBeCloseTo(vector.W, 5)
    expect(figures.tint).toBeCloseTo(vector.T, 5)
    expect(figures.withinLimits).toBe(vector.insideLimits)
    expect(e313Yellowness({ X, Y, Z }, coefficients[observer])).toBeCloseTo(vector.yellownessE313, 4)
  })

  const tenDegree = reference.vectors.filter((vector) => vector.observer === '10deg')
  test.each(tenDegree)('$id, $name, with the published white to four digits', (vector) => {
    const { X, Y, Z } = vector
    const sample = vector.given === 'XYZ' ? xyzToXyy({ X, Y, Z }) : { x: vector.x, y: vector.y, Y }
    const { whiteness, tint } = cieWhiteness(sample)
    expect(whiteness).toBeCloseTo(vector['W_with_xn0.3138_yn0.3310']!, 5)
    expect(tint).toBeCloseTo(vector['T_with_xn0.3138_yn0.3310']!, 5)
  })
})

test('the published figures use the white of ASTM E313 and its D65/10° coefficients', () => {
  const { xn, yn } = whitePointUsed.alternative10deg
  expect(WHITENESS_D65_10).toMatchObject({ xn, yn, tintX: 900 })
  expect([E313_D65_10.CX, E313_D65_10.CZ]).toEqual(yellownessE313.coefficients['D65/10deg'])
  // The file's own check: the coefficients cancel on the ASTM white.
  expect(Math.abs(e313Yellowness(D65_10))).toBeLessThan(0.01)
})

// CIE 15:2004: on the achromatic axis W = Y by definition; the last row is worked by hand from the formula.
test.each([
  { name: 'perfect diffuser', x: 0.3138, y: 0.331, Y: 100, W: 100, T: 0 },
  { name: 'black', x: 0.3138, y: 0.331, Y: 0, W: 0, T: 0 },
  { name: 'bluish white', x: 0.3038, y: 0.318, Y: 85, W: 115.1, T: 0.55 },
])('CIE whiteness of a $name is $W and its tint $T', ({ W, T, name: _, ...sample }) => {
  expect(cieWhiteness(sample).whiteness).toBeCloseTo(W, 6)
  expect(cieWhiteness(sample).tint).toBeCloseTo(T, 6)
})

// By hand: at xn, yn both 40 < Y and Y < 5Y − 280 must hold, so Y > 70; the limits themselves are outside.
test.each([
  [70, false],
  [70.001, true],
  [64, false],
])('a neutral of Y %d is within the limits: %s', (Y, within) => {
  expect(cieWhiteness({ x: WHITENESS_D65_10.xn, y: WHITENESS_D65_10.yn, Y }).withinLimits).toBe(within)
})

test('no electronic-paper page is within the limits, whatever its tint', () => {
  // Y 64 is L* 84.0; 40 < W < 5Y − 280 is then empty (CIE 15, by algebra).
  for (let L = 54; L <= 83.9; L += 2.3) {
    for (let a = -6; a <= 4; a += 1) {
      for (let b = -12; b <= 10; b += 1) {
        expect(cieWhiteness(xyzToXyy(labToXyz({ L, a, b }))).withinLimits).toBe(false)
      }
    }
  }
})

// Worked for common use by the formula: near L* 70 one unit of b* weighs about four of L*.
test('a bluer, darker page can score a higher whiteness than a lighter one', () => {
  const whiteness = (L: number, a: number, b: number) => cieWhiteness(xyzToXyy(labToXyz({ L, a, b }))).whiteness
  expect(whiteness(62, -1.5, -4)).toBeCloseTo(56, 0)
  expect(whiteness(70, -1.5, 2)).toBeCloseTo(29, 0)
})

test('a reading that cannot be is refused', () => {
  const white = { x: 0.3138, y: 0.331 }
  for (const Y of [-0.001, 100.001, Number.NaN, Infinity])
    expect(() => cieWhiteness({ ...white, Y })).toThrow(RangeError)
  expect(() => cieWhiteness({ ...white, Y: 101 })).toThrow('Y must be a percentage from 0 to 100, got 101')
  expect(() => cieWhiteness({ x: Number.NaN, y: 0.331, Y: 50 })).toThrow(RangeError)
  expect(() => e313Yellowness({ X: 0, Y: 0, Z: 0 })).toThrow(/Y must be positive/)
  expect(() => e313Yellowness({ X: Number.NaN, Y: 1, Z: 1 })).toThrow(RangeError)
})
