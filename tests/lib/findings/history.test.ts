import { describe, expect, test } from 'vitest'
import { type Entry, historyOf } from '@/lib/findings/history'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'

const { uncertainty, control } = makeEdition([])
const entry = (edition: number, L: number, fields: Partial<Entry> = {}): Entry => ({
  edition,
  revision: 'A',
  device: makeDevice({ slug: 'example', page: { L, a: -1.5, b: 1, u: { L: 0.4, a: 0.15, b: 0.2 } } }),
  setIds: [1, 2],
  uncertainty,
  control,
  ...fields,
})

describe('a device’s history', () => {
  // Calibration and sessions are shared, so U is that of two own parts: 2·√(0.4² + 0.4²) = 1.1314.
  test('gives each change with its doubt, and whether it is more than that', () => {
    const [newest, first] = historyOf([entry(2, 72, { setIds: [1, 3] }), entry(1, 70)], [])
    expect(first?.change).toEqual({ kind: 'first' })
    if (newest?.change.kind !== 'readings') throw new Error('the readings are others')
    expect(newest.change.since).toBe(1)
    const lightness = newest.change.moved.find(({ figure }) => figure === 'lightness')
    expect(lightness).toMatchObject({ before: 70, after: 72, beyond: true })
    expect(lightness?.doubt).toBeCloseTo(2 * Math.hypot(0.4, 0.4), 4)
  })

  test('knows figures from the same sets, in whatever order, from those of other readings', () => {
    const kinds = historyOf([entry(3, 70, { setIds: [2, 1] }), entry(2, 70), entry(1, 70, { setIds: [1] })], [])
    expect(kinds.map(({ change }) => change.kind)).toEqual(['same', 'readings', 'first'])
  })

  test('never takes another revision for a change', () => {
    const [newest] = historyOf([entry(2, 76, { revision: 'B', setIds: [9] }), entry(1, 70)], [])
    expect(newest?.change).toEqual({ kind: 'revision' })
  })

  test('has each edition’s figures by that edition’s own doubts', () => {
    const surer = { ...uncertainty, common: { L: 0, a: 0, b: 0 } }
    const [newest, first] = historyOf([entry(2, 70, { uncertainty: surer }), entry(1, 70)], [])
    expect(newest!.figures.lightness.doubt).toBeLessThan(first!.figures.lightness.doubt)
  })

  test('marks every edition a correction touches, and no other', () => {
    const editions = [5, 4, 3, 2, 1].map((number) => entry(number, 70))
    const marks = (wrongIn: number | null, rightIn: number | null) =>
      historyOf(editions, [{ id: 7, wrongIn, rightIn }]).map(
        ({ corrections }) => corrections.map((one) => one.as)[0] ?? '',
      )
    expect(marks(2, 4)).toEqual(['', 'corrected', 'wrong', 'wrong', ''])
    expect(marks(3, null)).toEqual(['wrong', 'wrong', 'wrong', '', ''])
    expect(marks(null, 3)).toEqual(['', '', 'corrected', '', ''])
    expect(marks(null, null)).toEqual(['', '', '', '', ''])
  })
})
