import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { lightnessToY } from '@/lib/colour/lab'
import { frontLightMax, inkContrast, pageLuminance } from '@/lib/method/light'
import { eyeOf, fluency, reserveIn } from '@/lib/method/reserve'
import { LIGHT_NEEDS, TEXT_SIZES } from '@/lib/method/types'

const eyes = LIGHT_NEEDS.flatMap((need) => TEXT_SIZES.map((text) => eyeOf(need, text)))
const anyEye = fc.constantFrom(...eyes)
const lux = fc.oneof(
  fc.double({ min: 0, max: 200_000, noNaN: true }),
  fc.double({ min: 0, max: 2, noNaN: true }),
  fc.double({ min: 0, max: 300, noNaN: true }),
)
const frontLight = fc.oneof(fc.constant(0), fc.double({ min: 0, max: 200, noNaN: true }))

describe('light on the page', () => {
  // L = E·Y/(100·π): a matte page of Y 100π/4 % in 40 lx sends back 10 cd/m². The front light fills up to 15.
  test.each([
    { name: 'no front light', lux: 40, max: 0, luminance: 10 },
    { name: 'front light fills up to 15', lux: 40, max: 80, luminance: 15 },
    { name: 'a weak front light gives what it has', lux: 40, max: 2, luminance: 12 },
    { name: 'in the dark', lux: 0, max: 80, luminance: 15 },
    { name: 'above 15 a front light adds nothing', lux: 80, max: 80, luminance: 20 },
  ])('$name', ({ lux, max, luminance }) => {
    expect(pageLuminance(lux, 25 * Math.PI, max)).toBeCloseTo(luminance, 12)
  })

  test('a front light of 0, none, and one not stated all give no light', () => {
    expect([{ max: 0, min: null }, false, null].map((light) => frontLightMax(light as never))).toEqual([0, 0, 0])
  })

  test('contrast is never below 0, nor broken by a page that sends nothing back', () => {
    expect(inkContrast(40, 4)).toBeCloseTo(0.9, 12)
    expect(inkContrast(4, 40)).toBe(0)
    expect(inkContrast(0, 0)).toBe(0)
  })
})

describe('contrast reserve of a page in a light', () => {
  // The check value of Method 1, section 3: A 40, ω 4.8 µsr, L 10 cd/m², C 0.9 gives R 18.738. Y 25π % in 40 lx is 10 cd/m².
  test('agrees with the method’s check value', () => {
    const surface = { yPage: 25 * Math.PI, yInk: 2.5 * Math.PI, frontLight: 0 }
    expect(reserveIn(surface, { lux: 40, frontLight: false }, { age: 40, size: 4.8 })).toBeCloseTo(18.738, 3)
  })

  test('ρ runs from the logarithm of 3 to that of 30, and a page one cannot read has the least', () => {
    expect(fluency(0)).toBe(Math.log10(3))
    expect(fluency(2)).toBe(Math.log10(3))
    expect(fluency(10)).toBe(1)
    expect(fluency(1000)).toBe(Math.log10(30))
  })

  test('more light never lowers it for a fixed page, with a front light and without', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        frontLight,
        fc.boolean(),
        anyEye,
        lux,
        lux,
        (page, ink, max, allowed, eye, one, other) => {
          const surface = { yPage: lightnessToY(page), yInk: lightnessToY(ink), frontLight: max }
          const [dim, bright] = [Math.min(one, other), Math.max(one, other)].map((lux) =>
            reserveIn(surface, { lux, frontLight: allowed }, eye),
          )
          // Rounding alone may lower it where the light is capped.
          expect(bright!).toBeGreaterThanOrEqual(dim! * (1 - 1e-12))
        },
      ),
      { numRuns: 2000 },
    )
  })

  test('a lighter page with the same ink never lowers it, with a front light and without', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 100, noNaN: true }),
        fc.double({ min: 20, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 100, noNaN: true }),
        frontLight,
        fc.boolean(),
        anyEye,
        lux,
        (one, other, ink, max, allowed, eye, lux) => {
          const [darker, lighter] = [Math.min(one, other), Math.max(one, other)].map((L) =>
            reserveIn(
              { yPage: lightnessToY(L), yInk: lightnessToY(ink), frontLight: max },
              { lux, frontLight: allowed },
              eye,
            ),
          )
          expect(lighter!).toBeGreaterThanOrEqual(darker! * (1 - 1e-12))
        },
      ),
      { numRuns: 2000 },
    )
  })

  // Method 1, section 3: outside the model below 0.05 cd/m²; at age 65 already below 0.0533.
  test('at the edges of the model it is a finite number, and 0 beyond', () => {
    const surface = { yPage: 50, yInk: 4, frontLight: 0 }
    const at = (luminance: number, age: number) =>
      reserveIn(surface, { lux: luminance * 2 * Math.PI, frontLight: false }, { age, size: 4.8 })
    expect(at(0.04999, 25)).toBe(0)
    expect(at(0.05001, 25)).toBeGreaterThan(0)
    expect(at(0.0532, 65)).toBe(0)
    expect(at(0.0534, 65)).toBeGreaterThan(0)
    for (const eye of eyes)
      for (const lux of [0, 0.3141, 0.3142, 200_000]) {
        expect(Number.isFinite(reserveIn(surface, { lux, frontLight: false }, eye))).toBe(true)
      }
  })
})
