import { expect, test } from 'vitest'
import type { EvidenceSet } from '@/lib/findings/evidence'
import { spreadBy } from '@/lib/findings/spread'

const set = (unit: string, position: string, lightnesses: number[], state: 'page' | 'ink' = 'page'): EvidenceSet => ({
  unit,
  position,
  state,
  measuredOn: '2026-03-01',
  readings: lightnesses.map((L) => ({ L, a: -1, b: 2 })),
})

const SETS = [
  set('one', 'centre', [70, 70.2]),
  set('one', 'edge', [71, 71.2]),
  set('two', 'centre', [72, 72.2]),
  set('two', 'centre', [22, 24], 'ink'),
]

// Worked by hand: unit one is (70.1 + 71.1)/2 = 70.6, unit two 72.1, their mean 71.35; s of a pair 0.2 apart is 0.1414.
test('a unit stands off the mean of the units, each counting once', () => {
  const [one, two] = spreadBy(SETS, 'unit')
  expect(one).toMatchObject({ name: 'one', sets: 2, readings: 4, ink: null })
  expect(one?.page?.L).toBeCloseTo(70.6, 10)
  expect(one?.offset).toBeCloseTo(-0.75, 10)
  expect(two?.offset).toBeCloseTo(0.75, 10)
  expect(two?.ink?.L).toBeCloseTo(23, 10)
  expect(one?.repeatability).toBeCloseTo(0.2 / Math.SQRT2, 10)
})

// Centre: (70.1 + 72.1)/2 = 71.1; edge 71.1.
test('a position is the mean of its sets over all units', () => {
  const rows = spreadBy(SETS, 'position')
  expect(rows.map(({ name }) => name)).toEqual(['centre', 'edge'])
  expect(rows[0]?.page?.L).toBeCloseTo(71.1, 10)
  expect(rows.map(({ offset }) => offset?.toFixed(6))).toEqual(['0.000000', '0.000000'])
})

test('where only the ink was read there is no page, and nothing is off', () => {
  expect(spreadBy([set('one', 'centre', [22], 'ink')], 'unit')).toMatchObject([
    { page: null, offset: null, repeatability: null, readings: 1 },
  ])
  expect(spreadBy([], 'unit')).toEqual([])
})
