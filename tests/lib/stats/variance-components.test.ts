import fc from 'fast-check'
import { expect, test } from 'vitest'
import { mean, pooledSd } from '@/lib/stats/describe'
import { nestedComponents } from '@/lib/stats/variance-components'
import precision from '@/tests/reference/precision.json'

type Design = number[][][][]

// ISO 5725-2:1994 Annex B.1 and ASTM E691 (precision.json): cells are the sets of one unit, so the position
// component is the between-laboratory one.
test.each(precision.cases)('$id: repeatability and the part between cells', ({ input, expected, tolerance }) => {
  const result = nestedComponents([[input.cells]])
  expect(Math.abs(result.sReading! - expected.s_r)).toBeLessThanOrEqual(tolerance.s)
  expect(Math.abs(result.variance.position! - expected.s_L2_raw)).toBeLessThanOrEqual(tolerance.s)
  expect(Math.abs(result.sPosition! - expected.s_L)).toBeLessThanOrEqual(tolerance.s)
  expect(Math.abs(Math.hypot(result.sReading!, result.sPosition!) - expected.s_R)).toBeLessThanOrEqual(tolerance.s)
  expect(result.df).toEqual({ reading: expected.N - expected.p, position: expected.p - 1, unit: 0 })
  expect(Math.abs(pooledSd(input.cells)! - expected.s_r)).toBeLessThanOrEqual(tolerance.s)
  if ('m' in tolerance) expect(Math.abs(mean(input.cells.flat()) - expected.m)).toBeLessThanOrEqual(tolerance.m!)
})

// precision.json, glucose A: the variance between laboratories is estimated at −0.009.
test('a negative component is reported as zero spread, its estimate kept beside it', () => {
  const { input } = precision.cases.find(({ id }) => id === 'astm-e691-glucose-A')!
  const result = nestedComponents([[input.cells]])
  expect(result.sPosition).toBe(0)
  expect(result.variance.position).toBeLessThan(0)
  expect(result.reason.position).toBeNull()
})

// Box, Hunter & Hunter, Statistics for Experimenters, 1978, Table 17.3: moisture of 15 batches of pigment paste, two
// samples each, two tests each. Data and mean squares from memory; the recalled mean squares, 86.495, 57.983 and
// 0.917 on 14, 15 and 30 degrees of freedom, agree with the recalled data. Printed: 7.1 (batches), 28.5, 0.92.
test('the pigment-paste study splits into its printed components', () => {
  const batches = [
    [40, 39, 30, 30],
    [26, 28, 25, 26],
    [29, 28, 14, 15],
    [30, 31, 24, 24],
    [19, 20, 17, 17],
    [33, 32, 26, 24],
    [23, 24, 32, 33],
    [34, 34, 29, 29],
    [27, 27, 31, 31],
    [13, 16, 27, 24],
    [25, 23, 25, 27],
    [29, 29, 31, 32],
    [19, 20, 29, 30],
    [23, 24, 25, 25],
    [39, 37, 26, 28],
  ].map((tests) => [tests.slice(0, 2), tests.slice(2)])
  const { variance, df } = nestedComponents([batches])
  expect(df).toEqual({ reading: 30, position: 15, unit: 14 })
  expect(variance.reading).toBeCloseTo(0.917, 3)
  expect(variance.reading! + 2 * variance.position!).toBeCloseTo(57.983, 3)
  expect(variance.reading! + 2 * variance.position! + 4 * variance.unit!).toBeCloseTo(86.495, 3)
  expect(variance.position!.toFixed(1)).toBe('28.5')
  expect(variance.unit!.toFixed(1)).toBe('7.1')
})

/** A design of any sizes, as the numbers of readings in each set of each unit of each model. */
const sizes = fc.array(
  fc.array(fc.array(fc.integer({ min: 1, max: 4 }), { minLength: 1, maxLength: 3 }), { minLength: 1, maxLength: 3 }),
  { minLength: 1, maxLength: 3 },
)

/** Lays the values out, in order, over a design. */
function lay(design: number[][][], values: number[]): Design {
  const left = [...values]
  return design.map((units) => units.map((sets) => sets.map((n) => left.splice(0, n))))
}

/** For every reading: which model, unit and set it belongs to, numbered through the whole design. */
function membership(design: number[][][]): { model: number; unit: number; set: number }[] {
  let [unit, set] = [0, 0]
  return design.flatMap((units, model) =>
    units.flatMap((sets) => {
      unit += 1
      return sets.flatMap((n) => {
        set += 1
        return Array.from({ length: n }, () => ({ model, unit, set }))
      })
    }),
  )
}

const LEVELS = ['reading', 'position', 'unit'] as const

// Second route, exact and without the coefficients of the code: an estimate is a quadratic form yᵀAy of the readings,
// A is found by feeding unit vectors, and its expectation is Σ A_ij V_ij with V the covariance that the true
// components give. It must be the true component, for every design, whatever the models' own means.
test('every component is estimated without bias, however unequal the numbers of readings, sets and units', () => {
  const truth = { reading: 1, position: 2.5, unit: 0.7 }
  const betweenModels = 1000
  const checked = { reading: 0, position: 0, unit: 0 }
  fc.assert(
    fc.property(sizes, (design) => {
      const members = membership(design)
      const n = members.length
      const at = (...places: number[]) =>
        nestedComponents(
          lay(
            design,
            members.map((_, i) => (places.includes(i) ? 1 : 0)),
          ),
        ).variance
      const single = members.map((_, i) => at(i))
      const expected = { reading: 0, position: 0, unit: 0 }
      for (let i = 0; i < n; i++) {
        for (let j = 0; j <= i; j++) {
          const [a, b] = [members[i]!, members[j]!]
          const covariance =
            (i === j ? truth.reading : 0) +
            (a.set === b.set ? truth.position : 0) +
            (a.unit === b.unit ? truth.unit : 0) +
            (a.model === b.model ? betweenModels : 0)
          const both = i === j ? null : at(i, j)
          for (const level of LEVELS) {
            // Twice the element off the diagonal, for both triangles.
            const element = both ? both[level]! - single[i]![level]! - single[j]![level]! : single[i]![level]!
            expected[level] += element * covariance
          }
        }
      }
      const { variance } = nestedComponents(lay(design, new Array(n).fill(0)))
      for (const level of LEVELS) {
        if (variance[level] === null) continue
        expect(expected[level]).toBeCloseTo(truth[level], 6)
        checked[level] += 1
      }
    }),
    { numRuns: 60 },
  )
  for (const level of LEVELS) expect(checked[level]).toBeGreaterThan(5)
})

/** Sum of squares of values about the mean of each group, by the shortcut Σx² − Σ(Σx)²/n. */
function totals(groups: number[][]): number {
  return groups.reduce((all, group) => all + group.reduce((a, b) => a + b, 0) ** 2 / group.length, 0)
}

// Balanced case by textbook: with r readings, p positions and k units, E[MS] = σr², σr² + rσp², σr² + rσp² + rpσu²
// (Montgomery, Design and Analysis of Experiments, nested designs, from memory).
test('equal numbers everywhere give the balanced closed form', () => {
  const [m, k, p, r] = [3, 4, 2, 5]
  const design = Array.from({ length: m }, () => Array.from({ length: k }, () => new Array(p).fill(r)))
  fc.assert(
    fc.property(
      fc.array(fc.integer({ min: -90, max: 90 }), { minLength: m * k * p * r, maxLength: m * k * p * r }),
      (y) => {
        const models = lay(design, y)
        const square = y.reduce((all, value) => all + value * value, 0)
        const sets = totals(models.flat(2))
        const units = totals(models.flat().map((unit) => unit.flat()))
        const whole = totals(models.map((model) => model.flat(2)))
        const msReading = (square - sets) / (m * k * p * (r - 1))
        const msPosition = (sets - units) / (m * k * (p - 1))
        const msUnit = (units - whole) / (m * (k - 1))
        const { variance, df, modelsWithTwoUnits } = nestedComponents(models)
        expect(variance.reading).toBeCloseTo(msReading, 6)
        expect(variance.position).toBeCloseTo((msPosition - msReading) / r, 6)
        expect(variance.unit).toBeCloseTo((msUnit - msPosition) / (r * p), 6)
        expect(df).toEqual({ reading: m * k * p * (r - 1), position: m * k * (p - 1), unit: m * (k - 1) })
        expect(modelsWithTwoUnits).toBe(m)
      },
    ),
  )
})

const integers = fc.infiniteStream(fc.integer({ min: -500, max: 500 }))

test('order does not matter, a model’s own level does not matter, and scale carries over', () => {
  fc.assert(
    fc.property(sizes, integers, fc.integer({ min: 1, max: 9 }), (design, stream, scale) => {
      const models = lay(design, [...stream.take(membership(design).length)])
      const plain = nestedComponents(models)
      const turned = models
        .map((units) => units.map((sets) => sets.map((readings) => readings.toReversed()).toReversed()).toReversed())
        .toReversed()
      const moved = models.map((units, i) => units.map((sets) => sets.map((set) => set.map((x) => x * scale + 70 * i))))
      for (const level of LEVELS) {
        const value = plain.variance[level]
        if (value === null) {
          expect(nestedComponents(turned).variance[level]).toBeNull()
          continue
        }
        expect(nestedComponents(turned).variance[level]).toBeCloseTo(value, 5)
        expect(nestedComponents(moved).variance[level]! / scale ** 2).toBeCloseTo(value, 5)
      }
      expect(nestedComponents(turned).df).toEqual(plain.df)
    }),
  )
})

test.each([
  { name: 'nothing was measured', models: [], reading: 'not-repeated', position: 'not-repeated', unit: 'not-repeated' },
  {
    name: 'each set is one reading',
    models: [
      [
        [[70], [71]],
        [[72], [70]],
      ],
    ],
    reading: 'not-repeated',
    position: 'inner-unknown',
    unit: 'inner-unknown',
  },
  {
    name: 'each unit has one position',
    models: [[[[70, 71]], [[72, 70]]]],
    reading: null,
    position: 'not-repeated',
    unit: 'inner-unknown',
  },
  {
    name: 'each model has one unit',
    models: [[[[70, 71], [72]]], [[[60, 61], [62]]]],
    reading: null,
    position: null,
    unit: 'not-repeated',
  },
])('where $name, what cannot be known is null with its reason', ({ models, reading, position, unit }) => {
  const result = nestedComponents(models)
  expect(result.reason).toEqual({ reading, position, unit })
  expect(result.sReading === null).toBe(reading !== null)
  expect(result.sPosition === null).toBe(position !== null)
  expect(result.sUnit === null).toBe(unit !== null)
  for (const level of LEVELS) expect(result.variance[level] === null).toBe(result.reason[level] !== null)
})

test('empty groups count for nothing, and only models with two measured units are counted as such', () => {
  const models: Design = [
    [
      [
        [70, 71],
        [72, 70.5],
      ],
      [[69, 70]],
    ],
    [
      [
        [60, 61],
        [62, 60],
      ],
    ],
  ]
  const gaps: Design = [[...models[0]!.map((sets) => [...sets, []]), []], [...models[1]!, [[]]], []]
  expect(nestedComponents(gaps)).toEqual(nestedComponents(models))
  expect(nestedComponents(gaps).modelsWithTwoUnits).toBe(1)
})

test('equal readings have no spread at any level', () => {
  const flat: Design = [
    [
      [
        [70.1, 70.1, 70.1],
        [70.1, 70.1],
      ],
      [[70.1], [70.1, 70.1]],
    ],
  ]
  const { sReading, sPosition, sUnit } = nestedComponents(flat)
  for (const s of [sReading, sPosition, sUnit]) expect(s).toBeCloseTo(0, 12)
})

test('a reading that is not a number is refused', () => {
  expect(() => nestedComponents([[[[70, Number.NaN]]]])).toThrow(RangeError)
})
