import { expect, test } from 'vitest'
import { type EvidenceSet, evidenceOf } from '@/lib/findings/evidence'

const set = (unit: string, position: string, lightness: number[], more: Partial<EvidenceSet> = {}): EvidenceSet => ({
  unit,
  position,
  state: 'page',
  measuredOn: '2026-03-02',
  readings: lightness.map((L) => ({ L, a: 0, b: 0 })),
  ...more,
})

test('readings, sets, units, positions and days are counted over both states', () => {
  const evidence = evidenceOf([
    set('A', 'top', [70, 71]),
    set('A', 'middle', [70, 70], { measuredOn: '2026-01-15' }),
    set('B', 'top', [72, 72]),
    set('A', 'top', [20, 20, 20], { state: 'ink', measuredOn: '2026-05-01' }),
  ])
  expect(evidence).toMatchObject({ readings: 9, sets: 4, units: 2, positions: 2, from: '2026-01-15', to: '2026-05-01' })
})

// By hand: within sets Σd² = 0.5 + 0 over 2 degrees of freedom, s = 0.5; units 70.25 and 72, s = 1.75/√2.
test('repeatability is pooled within sets, the spread between units taken from their means; ink counts for neither', () => {
  const evidence = evidenceOf([
    set('A', 'top', [70, 71]),
    set('A', 'middle', [70, 70]),
    set('B', 'top', [72]),
    set('B', 'top', [10, 30], { state: 'ink' }),
  ])
  expect(evidence?.repeatability).toBeCloseTo(0.5, 12)
  expect(evidence?.betweenUnits).toBeCloseTo(1.75 / Math.SQRT2, 12)
})

test('one unit says nothing of the spread between units, single readings nothing of repeatability', () => {
  expect(evidenceOf([set('A', 'top', [70])])).toMatchObject({ repeatability: null, betweenUnits: null })
})

test('a device without sets has no evidence', () => {
  expect(evidenceOf([])).toBeNull()
})
