import fc from 'fast-check'
import { expect, test } from 'vitest'
import { ewma, individualsLimits, type Limits, runRules, xbarRLimits } from '@/lib/stats/control-chart'
import reference from '@/tests/reference/control-chart.json'

// The cases differ in shape; each test reads the fields its own kind carries.
// biome-ignore lint/suspicious/noExplicitAny: a reference file of many shapes
const cases: any[] = reference.cases
const find = (id: string) => cases.find((entry) => entry.id === id)!
const near = (actual: number, expected: number, tolerance: number) =>
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(tolerance)

/** Places, from 1, of the points outside limits. */
const outside = (points: number[], { lower, upper }: Limits) =>
  points.flatMap((point, i) => (point < lower || point > upper ? [i + 1] : []))

// ISO 7870-2, ASTM E2587, Montgomery Appendix VI (control-chart.json): A2 and D4 as printed, d2 and d3 by integration.
test.each(reference.constants.rows)('the constants for subgroups of $n are the printed ones', (row) => {
  // One subgroup with mean 0 and range 1 shows the constants themselves.
  const { mean, range } = xbarRLimits([[-0.5, 0.5, ...new Array(row.n - 2).fill(0)]])!
  const shown = { A2: mean.upper, D3: range.lower, D4: range.upper }
  for (const name of ['A2', 'D3', 'D4'] as const) {
    near(shown[name], row[name].published, reference.constants.tolerance)
    near(shown[name], row[name].computed, 5e-6)
  }
  near(1 / (mean.sigma * Math.sqrt(row.n)), row.d2.computed, 1e-9)
})

// Montgomery 1991, piston rings, samples 1–25 (control-chart.json).
test('the piston-ring samples give the limits of the book for means and ranges', () => {
  const { input, expected, tolerance, published } = find('xbar-r-piston-rings')
  const { mean, range } = xbarRLimits(input.subgroups)!
  near(mean.centre, expected.xbarbar, 1e-9)
  near(mean.sigma * Math.sqrt(5), expected.sigmaHat, tolerance.limit)
  near(mean.lower, expected.xbar.lcl, tolerance.limit)
  near(mean.upper, expected.xbar.ucl, tolerance.limit)
  near(range.centre, expected.rbar, 1e-9)
  near(range.lower, expected.range.lcl, tolerance.limit)
  near(range.upper, expected.range.ucl, tolerance.limit)
  expect([mean.lower, mean.upper].map((limit) => limit.toFixed(3))).toEqual(
    [published.xbarLcl, published.xbarUcl].map((limit: number) => limit.toFixed(3)),
  )
  const averages = input.subgroups.map((five: number[]) => five.reduce((a, b) => a + b, 0) / 5)
  expect(outside(averages, mean)).toEqual(expected.outOfControlXbar)
  const ranges = input.subgroups.map((five: number[]) => Math.max(...five) - Math.min(...five))
  expect(outside(ranges, range)).toEqual(expected.outOfControlRange)
})

// Montgomery 1991, samples 26–40 judged by the limits of 1–25 (control-chart.json).
test('later samples are judged by the limits of the first ones', () => {
  const { input, expected } = find('xbar-r-piston-rings-phase2')
  const { mean } = xbarRLimits(find(input.phase1).input.subgroups)!
  const averages: number[] = input.subgroups.map((five: number[]) => five.reduce((a, b) => a + b, 0) / 5)
  averages.forEach((average, i) => {
    near(average, expected.means[i], 1e-9)
  })
  const beyond = runRules(averages, mean)!.filter(({ rule }) => rule === 1)
  expect(beyond.map(({ index }) => index + 26)).toEqual(expected.beyondXbarLimits)
})

// NIST/SEMATECH e-Handbook 6.3.2.2, read (control-chart.json). The handbook rounds d2 to 1.128; we keep its digits.
test('the flow-rate batches give the handbook’s limits for single values', () => {
  const { input, expected, tolerance } = find('individuals-nist-flow')
  const { value, range } = individualsLimits(input.data)!
  const asRounded = 1.128379 / input.d2
  near(value.centre, expected.xbar, 1e-9)
  near(range.centre, expected.mrbar, tolerance.mrbar)
  near(value.centre + (value.upper - value.centre) * asRounded, expected.ucl, tolerance.limit)
  near(value.centre - (value.centre - value.lower) * asRounded, expected.lcl, tolerance.limit)
  near(value.upper, expected.ucl, 0.002)
  expect(outside(input.data, value)).toEqual(expected.outOfControl)
  // D4 for ranges of two, 3.267 in the tables.
  near(range.upper / range.centre, 3.267, 0.001)
  expect(range.lower).toBe(0)
})

test('no limits are drawn from too little, or from subgroups that differ', () => {
  expect(individualsLimits([])).toBeNull()
  expect(individualsLimits([70])).toBeNull()
  expect(xbarRLimits([])).toBeNull()
  expect(xbarRLimits([[70], [71]])).toBeNull()
  expect(
    xbarRLimits([
      [70, 71],
      [70, 71, 72],
    ]),
  ).toBeNull()
  expect(xbarRLimits([new Array(11).fill(70)])).toBeNull()
})

// Nelson, Journal of Quality Technology 16(4), 1984, by exhaustive windows (control-chart.json): all eight rules run.
test.each(cases.filter(({ kind }) => kind === 'nelson'))(
  '$id trips that rule alone, where it should',
  ({ input, expected }) => {
    const found = runRules(input.z, { centre: input.mean, sigma: input.sigma })!
    expect([...new Set(found.map(({ rule }) => rule))]).toEqual(expected.tripped)
    expect(found.map(({ index }) => index)).toEqual(expected.windowEndIndexes)
  },
)

// Western Electric's four rules, by exhaustive windows (control-chart.json).
test.each(cases.filter(({ kind }) => kind === 'weco'))(
  '$id trips that rule alone, where it should',
  ({ input, expected }) => {
    const chart = { centre: input.mean, sigma: input.sigma }
    const found = runRules(input.z, chart, 'western-electric')!
    expect(found.map(({ rule }) => rule)).toEqual(expected.wecoTripped)
    expect(found.map(({ index }) => index)).toEqual(expected.windowEndIndexes)
    if (expected.nelsonTripped) expect(runRules(input.z, chart)).toEqual(expected.nelsonTripped)
  },
)

test('rules see the same pattern upside down, moved and stretched, and need a spread', () => {
  const z = fc.array(
    fc.integer({ min: -350, max: 350 }).map((n) => (2 * n + 1) / 200),
    { maxLength: 40 },
  )
  const set = fc.constantFrom('nelson' as const, 'western-electric' as const)
  fc.assert(
    fc.property(z, set, fc.integer({ min: -60, max: 60 }), (points, rules, centre) => {
      const found = runRules(points, { centre: 0, sigma: 1 }, rules)
      expect(
        runRules(
          points.map((point) => -point),
          { centre: 0, sigma: 1 },
          rules,
        ),
      ).toEqual(found)
      // Powers of two keep every digit, so no point crosses a zone's edge by rounding.
      expect(
        runRules(
          points.map((point) => point * 4),
          { centre: 0, sigma: 4 },
          rules,
        ),
      ).toEqual(found)
      const moved = points.map((point) => Math.round((point + centre) * 1024) / 1024)
      const same = points.map((point) => Math.round(point * 1024) / 1024)
      expect(runRules(moved, { centre, sigma: 1 }, rules)).toEqual(runRules(same, { centre: 0, sigma: 1 }, rules))
    }),
  )
  expect(runRules([70, 71], { centre: 70, sigma: 0 })).toBeNull()
  expect(runRules([70, 71], { centre: 70, sigma: Number.NaN })).toBeNull()
  expect(runRules([], { centre: 70, sigma: 1 })).toEqual([])
})

// NIST/SEMATECH e-Handbook 6.3.2.4, read, and its limits before the steady state, computed (control-chart.json).
test('the handbook’s moving average, its steady limits and its exact ones', () => {
  const { input, expected, tolerance, published } = find('ewma-nist')
  const { expected: exact, tolerance: exactTolerance } = find('ewma-nist-exact-limits')
  const options = { lambda: input.lambda_, width: input.L }
  const chart = ewma(input.data, { centre: input.ewma0, sigma: input.sigma }, options)!
  expect(chart.points).toHaveLength(input.data.length)
  chart.points.forEach((point, i) => {
    near(point.value, expected.ewma[i], tolerance.ewma)
    near(point.value, published.ewma[i], 0.0051)
    near(point.lower, exact.lcl[i], exactTolerance.limit)
    near(point.upper, exact.ucl[i], exactTolerance.limit)
  })
  near(chart.lower, expected.lcl, tolerance.limit)
  near(chart.upper, expected.ucl, tolerance.limit)
  expect(chart.points.filter(({ isOut }) => isOut)).toEqual(exact.outOfControl)
  expect(outside(expected.ewma, { ...chart, centre: 0, sigma: 1 })).toEqual(expected.outOfControl)
})

// By hand: λ 0.2, σ 1, a lasting shift of 1.5σ: z₅ = 1.5(1 − 0.8⁵) = 1.008 crosses 1.0·√(1 − 0.8¹⁰) = 0.945; z₄ = 0.886
// stays under 1.0·√(1 − 0.8⁸) = 0.912.
test('a lasting drift too small for single limits leaves the moving average’s limits at the fifth point', () => {
  const shifted = new Array(8).fill(1.5)
  const { points } = ewma(shifted, { centre: 0, sigma: 1 })!
  expect(points.findIndex(({ isOut }) => isOut)).toBe(4)
  expect(points[4]!.value).toBeCloseTo(1.5 * (1 - 0.8 ** 5), 12)
  expect(runRules(shifted, { centre: 0, sigma: 1 })!.filter(({ rule }) => rule === 1)).toEqual([])
})

test('with lambda 1 the moving average is the single-value chart', () => {
  const { points, lower, upper } = ewma([70, 74, 66.5], { centre: 70, sigma: 1 }, { lambda: 1 })!
  expect(points.map(({ value }) => value)).toEqual([70, 74, 66.5])
  expect(points.map(({ isOut }) => isOut)).toEqual([false, true, true])
  expect([lower, upper]).toEqual([67, 73])
})

test('a moving average needs a spread and a weight it can use', () => {
  expect(ewma([70], { centre: 70, sigma: 0 })).toBeNull()
  expect(() => ewma([70], { centre: 70, sigma: 1 }, { lambda: 0 })).toThrow(RangeError)
  expect(() => ewma([70], { centre: 70, sigma: 1 }, { lambda: 1.1 })).toThrow(RangeError)
})
