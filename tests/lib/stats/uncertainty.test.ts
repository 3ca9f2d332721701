import fc from 'fast-check'
import { expect, test } from 'vitest'
import { tQuantile } from '@/lib/stats/student-t'
import { COVERAGE_FACTOR, expandedUncertainty, propagate } from '@/lib/stats/uncertainty'
import gum from '@/tests/reference/gum.json'

// The cases differ in shape; each test reads the fields its own kind carries.
// biome-ignore lint/suspicious/noExplicitAny: a reference file of many shapes
const cases: any[] = gum.cases
const find = (id: string) => cases.find((entry) => entry.id === id)!

type Component = { u: number; sensitivity?: number }

// JCGM 100:2008, H.1, read, and G.4.1, from memory (gum.json): the combined standard uncertainty, u_c = U/k.
test.each(['gum-h1-end-gauge', 'gum-g.4.1-welch-satterthwaite'])('the budget of %s combines to its u_c', (id) => {
  const { input, expected, tolerance } = find(id)
  const sensitivities = input.components.map(({ sensitivity = 1 }: Component) => sensitivity)
  const us: number[] = input.components.map(({ u }: Component) => u)
  const parts = us.map((u, i) => Math.abs(u * sensitivities[i]))
  expect(Math.abs(expandedUncertainty(parts, 1) - expected.u_c)).toBeLessThanOrEqual(tolerance.u_c)
  expect(expandedUncertainty(parts) / expected.u_c).toBeCloseTo(2, 9)
  const linear = (x: number[]) => x.reduce((total, value, i) => total + value * sensitivities[i], 0)
  expect(propagate(linear, new Array(us.length).fill(0), us) / expected.u_c).toBeCloseTo(1, 9)
})

// JCGM 101:2008, 9.2.2–9.2.4 (gum.json): first order gives the standard uncertainty exactly, the interval only for
// normal inputs; `gumHigh` is the interval the first-order method would print.
test.each(cases.filter(({ input }) => input.model === 'sum'))('the inputs of $id combine to the u stated', (entry) => {
  const us = entry.input.inputs.map(({ u, halfWidth: a }: { u?: number; halfWidth?: number }) => u ?? a! / Math.sqrt(3))
  const total = (x: number[]) => x.reduce((a, b) => a + b, 0)
  const u = propagate(total, [0, 0, 0, 0], us)
  expect(u).toBeCloseTo(entry.expected.u, 9)
  const interval = u * tQuantile(0.975, Number.POSITIVE_INFINITY)
  const normal = entry.expected.gumHigh ?? entry.published.gumHigh ?? entry.expected.high
  expect(Math.abs(interval - normal)).toBeLessThanOrEqual(entry.tolerance.endpoint)
})

// JCGM 101:2008, 9.3, inputs read, results from memory (gum.json): first order misses the buoyancy term, by 30 %.
test('first order stays first order: the mass calibration keeps its known shortfall', () => {
  const { input, expected } = find('jcgm101-9.3-mass')
  const [m, dm, rhoA, rhoW, rhoR] = ['mRc', 'dmRc', 'rhoA', 'rhoW', 'rhoR'].map((name) => input.inputs[name])
  const mass = ([a, b, air, weight, reference]: number[]) =>
    (a! + b!) * (1 + (air! - 1.2) * (1 / weight! - 1 / reference!)) - 100000
  const rectangular = [rhoA, rhoW, rhoR]
  const values = [m.mean, dm.mean, ...rectangular.map(({ low, high }) => (low + high) / 2)]
  const us = [m.u, dm.u, ...rectangular.map(({ low, high }) => (high - low) / Math.sqrt(12))]
  expect(propagate(mass, values, us)).toBeCloseTo(expected.firstOrderU, 6)
  expect(propagate(mass, values, us)).toBeLessThan(0.75 * expected.u)
})

/** The model of the ratio cases: page and ink share a scale k and an offset o. */
const ratio = ([page, ink, k, o]: number[]) => (k! * (page! + o!)) / (k! * (ink! + o!))

// gum.json, computed by the law of propagation and checked there by simulation.
test.each(cases.filter(({ kind }) => kind === 'correlated-ratio'))(
  '$id in a contrast ratio',
  ({ input, expected, tolerance }) => {
    const values = [input.Rw, input.Rb, 1, 0]
    const us = [input.u_Rw, input.u_Rb, input.u_k_relative, input.u_offset]
    expect(ratio(values)).toBeCloseTo(expected.C, 9)
    expect(Math.abs(propagate(ratio, values, us) - expected.u_C)).toBeLessThanOrEqual(tolerance.u_C)
    if (expected.u_C_ifTreatedIndependent) {
      const apart = ([page, ink, kPage, kInk]: number[]) => (kPage! * page!) / (kInk! * ink!)
      const u = propagate(
        apart,
        [input.Rw, input.Rb, 1, 1],
        [input.u_Rw, input.u_Rb, input.u_k_relative, input.u_k_relative],
      )
      expect(Math.abs(u - expected.u_C_ifTreatedIndependent)).toBeLessThanOrEqual(tolerance.u_C)
    }
  },
)

const amount = fc.double({ min: 0.5, max: 100, noNaN: true })
const doubt = fc.double({ min: 0.001, max: 2, noNaN: true })

// The slopes of a product and a power, by hand: u² = (y·z³·u_x)² + (x·z³·u_y)² + (3·x·y·z²·u_z)².
test('slopes found by differences agree with slopes found by hand', () => {
  fc.assert(
    fc.property(fc.tuple(amount, amount, amount), fc.tuple(doubt, doubt, doubt), ([x, y, z], [ux, uy, uz]) => {
      const byHand = Math.hypot(y * z ** 3 * ux, x * z ** 3 * uy, 3 * x * y * z ** 2 * uz)
      const u = propagate(([a, b, c]) => a! * b! * c! ** 3, [x, y, z], [ux, uy, uz])
      expect(u / byHand).toBeCloseTo(1, 4)
    }),
  )
})

test('doubt scales with the doubts, and an exact input adds none and is never moved', () => {
  const product = ([x, y]: number[]) => x! * y!
  expect(propagate(product, [3, 7], [0.2, 0.4])).toBeCloseTo(2 * propagate(product, [3, 7], [0.1, 0.2]), 6)
  const onlyAtSeven = ([x, y]: number[]) => (y === 7 ? x! * 7 : Number.NaN)
  expect(propagate(onlyAtSeven, [3, 7], [0.2, 0])).toBeCloseTo(1.4, 9)
  expect(propagate(product, [3, 7], [0, 0])).toBe(0)
})

test('published doubt is two standard uncertainties', () => {
  expect(COVERAGE_FACTOR).toBe(2)
  expect(expandedUncertainty([0.3, 0.4])).toBeCloseTo(1, 12)
})

test('a doubt that cannot be is refused, not passed on', () => {
  const identity = ([x]: number[]) => x!
  expect(() => propagate(identity, [1], [])).toThrow(RangeError)
  expect(() => propagate(identity, [1], [-0.1])).toThrow(RangeError)
  expect(() => propagate(identity, [1], [Number.NaN])).toThrow(RangeError)
  expect(() => propagate(() => Number.NaN, [1], [0.1])).toThrow(RangeError)
  expect(() => expandedUncertainty([])).toThrow(RangeError)
  expect(() => expandedUncertainty([0.1, Number.NaN])).toThrow(RangeError)
})
