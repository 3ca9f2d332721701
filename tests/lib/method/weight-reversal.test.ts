import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { weightReversal } from '@/lib/method/weight-reversal'
import reference from '@/tests/reference/sensitivity.json'

const total = (weights: number[], points: number[]) => weights.reduce((sum, weight, j) => sum + weight * points[j]!, 0)

const withMoved = (weights: number[], moved: number, to: number) =>
  weights.map((weight, j) => (j === moved ? to : (weight * (1 - to)) / (1 - weights[moved]!)))

describe('the smallest change of one weight that puts the runner-up first', () => {
  // tests/reference/sensitivity.json, closed form and grid scan, leader and runner-up alone; its last-but-one case only
  // ties at weight 1, which is no overtake.
  test.each(reference.cases)('$id, leader against runner-up', ({ input, expected }) => {
    const pair = [input.scores[expected.leader]!, input.scores[expected.runnerUp]!]
    for (const { attribute, breakEven } of expected.perWeight) {
      const to = weightReversal(input.weights, pair, attribute, 0, 1)
      if (breakEven === null) expect(to).toBeNull()
      else expect(to).toBeCloseTo(breakEven, 9)
    }
  })

  test.each(reference.cases)(
    '$id, the smallest of them and the weights it leads to, all rivals counted',
    ({ input, expected }) => {
      const changes = input.weights.flatMap((weight, i) => {
        const to = weightReversal(input.weights, input.scores, i, expected.leader, expected.runnerUp)
        return to === null ? [] : [{ attribute: i, to, change: to - weight }]
      })
      changes.sort((one, other) => Math.abs(one.change) - Math.abs(other.change))
      if (expected.smallest === null) {
        expect(changes).toEqual([])
        return
      }
      const [smallest] = changes
      expect(smallest!.attribute).toBe(expected.smallest.attribute)
      expect(smallest!.to).toBeCloseTo(expected.smallest.newWeight, 9)
      expect(smallest!.change).toBeCloseTo(expected.smallest.change, 9)
      for (const [j, weight] of withMoved(input.weights, smallest!.attribute, smallest!.to).entries()) {
        expect(weight).toBeCloseTo(expected.smallest.newWeights[j]!, 9)
      }
    },
  )

  // By hand. Runner over leader at weight v of the first: −2 + 4v, so from 0.5 on; over the third: 3 − 4v, so up to 0.75.
  test('a third option that overtakes sooner or later bounds the weights that do it', () => {
    const points = [
      [0, 2],
      [2, 0],
      [3, -3],
    ]
    expect(weightReversal([0.3, 0.7], points, 0, 0, 1)).toBeCloseTo(0.5, 12)
    // Over this third the runner is behind above 0.4 already, so no weight puts it ahead of both.
    expect(weightReversal([0.3, 0.7], [points[0]!, points[1]!, [8, -4]], 0, 0, 1)).toBeNull()
    // Two others that leave it weights above 0.7 and below 0.6 leave it none, though both lie beyond the leader's 0.5.
    const apart = [points[0]!, points[1]!, [1.4, 1.4], [2.4, -0.6]]
    expect(weightReversal([0.3, 0.7], apart, 0, 0, 1)).toBeNull()
    expect(weightReversal([0.3, 0.7], apart.slice(0, 3), 0, 0, 1)).toBeCloseTo(0.7, 12)
    // And with a third that meets it just where it meets the leader, they touch in one point only.
    expect(weightReversal([0.3, 0.7], [points[0]!, points[1]!, [4, -2]], 0, 0, 1)).toBeNull()
  })

  test('where the two are level, the present weight is where it turns', () => {
    expect(
      weightReversal(
        [0.5, 0.5],
        [
          [2, 0],
          [0, 2],
        ],
        0,
        0,
        1,
      ),
    ).toBe(0.5)
    expect(
      weightReversal(
        [0.5, 0.5],
        [
          [2, 2],
          [2, 2],
        ],
        0,
        0,
        1,
      ),
    ).toBeNull()
  })

  test('a weight of 1 gives what it loses to the others in equal parts', () => {
    // Runner over leader: at 1 it is −1; at 0 the mean of 1 and 2, 1.5: zero at v = 0.6.
    expect(
      weightReversal(
        [1, 0, 0],
        [
          [1, 0, 0],
          [0, 1, 2],
        ],
        0,
        0,
        1,
      ),
    ).toBeCloseTo(0.6, 12)
  })

  test('finds what a fine scan finds', () => {
    const points = fc.array(fc.integer({ min: 0, max: 20 }), { minLength: 4, maxLength: 4 })
    const weights = fc
      .array(fc.integer({ min: 1, max: 20 }), { minLength: 4, maxLength: 4 })
      .map((parts) => parts.map((part) => part / parts.reduce((sum, one) => sum + one, 0)))
    fc.assert(
      fc.property(weights, fc.array(points, { minLength: 2, maxLength: 6 }), fc.nat(3), (weights, options, moved) => {
        const order = [...options].sort((one, other) => total(weights, other) - total(weights, one))
        const steps = 2000
        const winning = Array.from({ length: steps + 1 }, (_, i) => i / steps).filter((v) => {
          const changed = withMoved(weights, moved, v)
          const runner = total(changed, order[1]!)
          return (
            runner > total(changed, order[0]!) + 1e-9 && order.every((other) => runner >= total(changed, other) - 1e-9)
          )
        })
        const to = weightReversal(weights, order, moved, 0, 1)
        const now = weights[moved]!
        const nearest = winning.sort((one, other) => Math.abs(one - now) - Math.abs(other - now))[0]
        // There, nobody is ahead of it; nearer, the scan finds no weight that does it (it may step over a narrow stretch).
        if (to !== null) {
          const runner = total(withMoved(weights, moved, to), order[1]!)
          for (const other of order) {
            expect(runner).toBeGreaterThanOrEqual(total(withMoved(weights, moved, to), other) - 1e-6)
          }
        }
        if (nearest !== undefined) {
          expect(to).not.toBeNull()
          expect(Math.abs(to! - now)).toBeLessThanOrEqual(Math.abs(nearest - now) + 1e-9)
        }
      }),
      { numRuns: 300 },
    )
  })
})
