import fc from 'fast-check'
import { expect, test } from 'vitest'
import { hasMoved, rankMoves } from '@/lib/edition/changes-ranks'

const ranking = (slugs: readonly string[]) =>
  slugs.map((slug, i) => ({ slug, fit: 90 - i, sd: 1, rank95: [i + 1, i + 1] as [number, number] }))
const anyRanking = fc.uniqueArray(fc.constantFrom(...'abcdefghij'), { maxLength: 10 })

test('every change of place is accounted for by who came, went, passed and was passed', () => {
  fc.assert(
    fc.property(anyRanking, anyRanking, (before, after) => {
      const moves = rankMoves(ranking(before), ranking(after))
      expect(new Set(moves.map(({ slug }) => slug))).toEqual(new Set([...before, ...after]))
      for (const move of moves) {
        if (!move.before || !move.after) continue
        const { addedAbove, withdrawnAbove, passed, passedBy } = move
        const step = addedAbove.length - withdrawnAbove.length + passedBy.length - passed.length
        expect(move.after.place - move.before.place).toBe(step)
      }
    }),
  )
})

test('moves are in the order of the newer ranking, with withdrawn devices last', () => {
  const moves = rankMoves(ranking(['a', 'b', 'c']), ranking(['c', 'd', 'a']))
  expect(moves.map(({ slug }) => slug)).toEqual(['c', 'd', 'a', 'b'])
  expect(moves.map(({ before, after }) => [before?.place ?? null, after?.place ?? null])).toEqual([
    [3, 1],
    [null, 2],
    [1, 3],
    [2, null],
  ])
  expect(moves[0]).toMatchObject({ passed: ['a'], withdrawnAbove: ['b'], addedAbove: [], passedBy: [] })
  expect(moves[2]).toMatchObject({ passed: [], withdrawnAbove: [], addedAbove: ['d'], passedBy: ['c'] })
})

test('a device has moved where its place or either end of its band did', () => {
  const [same] = rankMoves(ranking(['a']), ranking(['a']))
  expect(hasMoved(same!)).toBe(false)
  const [wider] = rankMoves(ranking(['a']), [{ slug: 'a', fit: 90, sd: 1, rank95: [1, 2] }])
  expect(hasMoved(wider!)).toBe(true)
  const [added] = rankMoves([], ranking(['a']))
  expect(hasMoved(added!)).toBe(true)
})
