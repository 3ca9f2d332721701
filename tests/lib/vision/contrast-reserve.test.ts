import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import {
  contrastReserve,
  log10ThresholdContrast,
  pupilRadius,
  retinalIlluminance,
  thresholdContrast,
} from '@/lib/vision/contrast-reserve'

const AGES = [25, 50, 65]
const SIZES = [2, 4.8, 10]
const ages = fc.oneof(fc.constantFrom(...AGES), fc.double({ min: 20, max: 65, noNaN: true }))
const sizes = fc.oneof(fc.constantFrom(...SIZES), fc.double({ min: 0.1, max: 200, noNaN: true }))
const contrasts = fc.double({ min: 0, max: 1, noNaN: true })
/** Most of the way from starlight to sun, where the edges lie, and then some. */
const luminances = fc.oneof(
  fc.constantFrom(0, Number.MIN_VALUE, 0.0499999, 0.05, 0.0532, 0.0533, 0.0534, 1999.99, 2000, 2000.01, 1e6, 1e300),
  fc.double({ min: -3, max: 6, noNaN: true }).map((exponent) => 10 ** exponent),
)

// Method 1, section 3, check value: A 40, ω 4.8, L 10.
describe('at 10 cd/m², age 40 and 4.8 microsteradians', () => {
  const sight = { luminance: 10, age: 40, size: 4.8 }
  test('the pupil’s radius is 2.030382 mm', () => expect(pupilRadius(10)).toBeCloseTo(2.030382, 6))
  test('the retina receives 85.477016 trolands', () => expect(retinalIlluminance(10, 40)).toBeCloseTo(85.477016, 6))
  test('the threshold contrast is 0.04803076', () => expect(thresholdContrast(sight)).toBeCloseTo(0.04803076, 8))
  test('a contrast of 0.9 leaves a reserve of 18.738', () =>
    expect(contrastReserve({ ...sight, contrast: 0.9 })).toBeCloseTo(18.738, 3))
})

/** The printed equations, term by term (Rea & Ouellette 1991, as in Method 1), with none of the guards. */
function printed(L: number, A: number, omega: number): number {
  const r = 2.3859 - 1.2204 * Math.tanh(0.3 * Math.log10(L))
  const I = L * Math.PI * r * r * (1 - 0.017 * (A - 20))
  const p1 = Math.log10(Math.tanh(20000 * omega * 1e-6))
  const p2 = Math.log10(Math.log10((10 * I) / Math.PI))
  const exponent =
    -1.36415 - 0.178589 * p1 - 0.81285 * p2 + 0.225998 * p1 ** 2 - 0.077169 * p2 ** 2 + 0.169252 * p1 * p2
  return (1 + (0.113 / 45) * (A - 20)) * 10 ** exponent
}

test('the threshold contrast is the printed equations’ everywhere inside the model', () => {
  const inside = fc.double({ min: Math.log10(0.06), max: Math.log10(2000), noNaN: true }).map((x) => 10 ** x)
  fc.assert(
    fc.property(inside, ages, sizes, (luminance, age, size) => {
      const expected = printed(luminance, age, size)
      expect(thresholdContrast({ luminance, age, size }) / expected).toBeCloseTo(1, 9)
      expect(10 ** log10ThresholdContrast(luminance, age, size) / expected).toBeCloseTo(1, 9)
    }),
  )
})

test('the reserve is finite and not negative for every legal input', () => {
  fc.assert(
    fc.property(contrasts, luminances, ages, sizes, (contrast, luminance, age, size) => {
      const reserve = contrastReserve({ contrast, luminance, age, size })
      expect(Number.isFinite(reserve)).toBe(true)
      expect(reserve).toBeGreaterThanOrEqual(0)
    }),
    { numRuns: 2000 },
  )
})

describe.each(AGES)('at age %d', (age) => {
  const reserve = (luminance: number, size = 4.8) => contrastReserve({ contrast: 0.9, luminance, age, size })

  test('nothing can be read below 0.05 cd/m²', () => {
    for (const luminance of [0, 0.01, 0.0499999]) expect(reserve(luminance)).toBe(0)
  })
  // Method 1: the retinal limit binds only at age 65, and there only below 0.0533 cd/m².
  test('from 0.05 cd/m² on the model speaks, unless too little light reaches the retina', () => {
    for (const luminance of [0.05, 0.0532]) {
      if (age === 65) expect(reserve(luminance)).toBe(0)
      else expect(reserve(luminance)).toBeGreaterThan(0)
    }
    expect(reserve(0.0533)).toBeGreaterThan(0)
  })
  test('light beyond 2,000 cd/m² counts as 2,000', () => {
    expect(reserve(1e6)).toBe(reserve(2000))
    expect(reserve(1999)).toBeLessThan(reserve(2000))
    expect(reserve(2000, 10) / (0.9 / printed(2000, age, 10))).toBeCloseTo(1, 9)
  })
  test('a page whose ink is as light as the page has no reserve', () => {
    for (const size of SIZES) expect(contrastReserve({ contrast: 0, luminance: 100, age, size })).toBe(0)
  })
})

test('the draws’ threshold is infinite outside the model, never NaN', () => {
  for (const luminance of [-1, 0, 0.0499, Number.NaN]) expect(log10ThresholdContrast(luminance, 25, 4.8)).toBe(Infinity)
  expect(log10ThresholdContrast(0.05, 65, 4.8)).toBe(Infinity)
  expect(thresholdContrast({ luminance: 0.04, age: 25, size: 4.8 })).toBe(Infinity)
})

test('more light never lowers the reserve of a page', () => {
  fc.assert(
    fc.property(contrasts, luminances, luminances, ages, sizes, (contrast, one, other, age, size) => {
      const [dim, bright] = [Math.min(one, other), Math.max(one, other)]
      const before = contrastReserve({ contrast, luminance: dim, age, size })
      // The last bits of a sum of logarithms may differ either way between neighbours.
      expect(contrastReserve({ contrast, luminance: bright, age, size })).toBeGreaterThanOrEqual(before * (1 - 1e-12))
    }),
    { numRuns: 2000 },
  )
})

test('in the same light a lighter page with the same ink never has less reserve', () => {
  const percent = fc.double({ min: 2, max: 100, noNaN: true })
  const light = fc.double({ min: -2, max: Math.log10(200_000), noNaN: true }).map((exponent) => 10 ** exponent)
  fc.assert(
    fc.property(percent, percent, percent, light, ages, sizes, (one, other, ink, lux, age, size) => {
      const reserve = (page: number) =>
        contrastReserve({
          contrast: Math.max(0, 1 - ink / page),
          luminance: (lux * page) / (100 * Math.PI),
          age,
          size,
        })
      const darker = reserve(Math.min(one, other))
      expect(reserve(Math.max(one, other))).toBeGreaterThanOrEqual(darker * (1 - 1e-12))
    }),
    { numRuns: 2000 },
  )
})

test('older eyes and smaller text never have more reserve', () => {
  fc.assert(
    fc.property(luminances, ages, ages, sizes, (luminance, one, other, size) => {
      const reserve = (age: number) => contrastReserve({ contrast: 0.9, luminance, age, size })
      expect(reserve(Math.max(one, other))).toBeLessThanOrEqual(reserve(Math.min(one, other)) * (1 + 1e-12))
    }),
  )
  for (const luminance of [0.06, 1, 10, 100, 2000]) {
    const [small, normal, large] = SIZES.map((size) => contrastReserve({ contrast: 0.9, luminance, age: 50, size }))
    expect(small).toBeLessThan(normal!)
    expect(normal).toBeLessThan(large!)
  }
})

test('what cannot be a reading is refused by name', () => {
  const legal = { contrast: 0.9, luminance: 10, age: 50, size: 4.8 }
  expect(() => contrastReserve({ ...legal, contrast: 1.01 })).toThrow(/Contrast must be from 0 to 1/)
  expect(() => contrastReserve({ ...legal, contrast: Number.NaN })).toThrow(RangeError)
  expect(() => contrastReserve({ ...legal, luminance: -1 })).toThrow(/Luminance must be 0/)
  expect(() => contrastReserve({ ...legal, luminance: Infinity })).toThrow(RangeError)
  expect(() => contrastReserve({ ...legal, age: 19 })).toThrow(/Age must be from 20 to 65/)
  expect(() => contrastReserve({ ...legal, age: 66 })).toThrow(RangeError)
  expect(() => contrastReserve({ ...legal, size: 0 })).toThrow(/Size must be above 0/)
})
