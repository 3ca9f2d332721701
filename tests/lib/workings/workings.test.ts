import fc from 'fast-check'
import { expect, test } from 'vitest'
import { type Bench, workOut } from '@/lib/workings/workings'

const lab = (L: number, a: number, b: number) => ({ L, a, b })
const bench: Bench = {
  edition: 3,
  components: {
    page: { reading: lab(0.05, 0.02, 0.02), position: lab(0.14, 0.05, 0.08), unit: lab(0.36, 0.14, 0.14) },
    ink: { reading: lab(0.04, 0.02, 0.02), position: lab(0.11, 0.03, 0.05), unit: lab(0.24, 0.08, 0.15) },
  },
  session: lab(0.1, 0.03, 0.05),
  common: lab(0.25, 0.1, 0.12),
  degrees: { reading: 400, position: 60, unit: 16, session: 21 },
}
const light = { units: 1, positions: 1, lux: 80, frontLight: 0, age: 25, size: 4.8 }
const readings = [lab(70, -1.5, 2), lab(70.1, -1.4, 2.1), lab(69.9, -1.6, 1.9), lab(70, -1.5, 2)]

const colour = (least: number) =>
  fc.record({
    L: fc.double({ min: least, max: 100, noNaN: true }),
    a: fc.double({ min: -60, max: 60, noNaN: true }),
    b: fc.double({ min: -60, max: 60, noNaN: true }),
  })
const anything = fc.record({
  page: fc.array(colour(20), { minLength: 1, maxLength: 6 }),
  ink: fc.array(colour(0.1), { minLength: 1, maxLength: 6 }),
  units: fc.integer({ min: 1, max: 20 }),
  positions: fc.integer({ min: 1, max: 100 }),
  lux: fc.oneof(fc.constantFrom(0, 200_000), fc.double({ min: 0, max: 200_000, noNaN: true })),
  frontLight: fc.double({ min: 0, max: 1000, noNaN: true }),
  age: fc.double({ min: 20, max: 65, noNaN: true }),
  size: fc.constantFrom(2, 4.8, 10),
})

test('whatever is typed within the form’s ranges has workings, and every number in them is a number', () => {
  fc.assert(
    fc.property(anything, fc.boolean(), (example, withBench) => {
      const { steps } = workOut(example, withBench ? bench : null)
      const words = Object.values(steps)
        .flat()
        .map(({ formula, worked, result, note }) => [formula, worked, result, note ?? ''].join(' '))
        .join(' ')
      expect(words).not.toMatch(/NaN|Infinity|∞|undefined|null/)
    }),
    { numRuns: 300 },
  )
})

test('the scatter of several readings is their own, that of one the edition’s', () => {
  const several = workOut({ page: readings, ink: [lab(23, 0, 0)], ...light }, bench).budget!
  expect(several.ownScatter).toEqual({ page: true, ink: false })
  // s of 70, 70.1, 69.9, 70 by hand: √(0.02/3); over √4.
  expect(several.parts[0]?.u.page.L).toBeCloseTo(Math.sqrt(0.02 / 3) / 2, 9)
  expect(several.parts[0]?.u.ink.L).toBeCloseTo(0.04, 12)
  const one = workOut({ page: readings.slice(0, 1), ink: [lab(23, 0, 0)], ...light }, bench).budget!
  expect(one.parts[0]?.u.page.L).toBeCloseTo(0.05, 12)
})

test('more units and places make a figure surer, the calibration stays', () => {
  const doubt = (units: number, positions: number) =>
    workOut({ page: readings, ink: [lab(23, 0, 0)], ...light, units, positions }, bench).budget!.expanded.page.L
  expect(doubt(2, 6)).toBeLessThan(doubt(1, 1))
  expect(doubt(20, 100)).toBeGreaterThan(2 * 0.25)
})

test('the doubt worked step by step is the one printed beside the whiteness', () => {
  const { budget, steps, page } = workOut({ page: readings, ink: [lab(23, 0, 0)], ...light }, bench)
  const { combined, slopes, derived } = budget!
  const by = slopes.whiteness.page
  const hand = 2 * Math.hypot(by.L * combined.page.L, by.a * combined.page.a, by.b * combined.page.b)
  expect(derived!.whiteness).toBeCloseTo(hand, 3)
  expect(steps.doubt.at(-1)?.result).toBe(`U(W) ${hand.toFixed(2)}`)
  expect(page.L).toBeCloseTo(70, 12)
})

test('readings that scatter over the whole scale have no slope worth naming', () => {
  const wild = workOut({ page: [lab(20, 0, 0), lab(100, 0, 0)], ink: [lab(23, 0, 0)], ...light }, bench)
  expect(wild.budget?.derived).toBeNull()
  expect(wild.steps.doubt.at(-1)?.result).toBe('Not worked out')
})

test('without an edition there are figures and no doubts', () => {
  const { budget, figures, steps } = workOut({ page: readings, ink: [lab(23, 0, 0)], ...light }, null)
  expect(budget).toBeNull()
  expect(steps.doubt).toEqual([])
  expect(figures.whiteness).toBeGreaterThan(0)
  expect(steps.colour.map(({ result }) => result).join()).not.toContain('±')
})
