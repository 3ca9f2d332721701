import { expect, test } from 'vitest'
import { ladderPoints } from '@/lib/findings/ladder'

const points = ladderPoints({ yPage: 45, yInk: 4.5 })

test('a ladder runs from 1 to 100,000 lux and never falls with more light', () => {
  expect(points[0]?.lux).toBe(1)
  expect(points.at(-1)?.lux).toBeCloseTo(100_000, 6)
  points.reduce((before, point) => {
    expect(point.reserve).toBeGreaterThanOrEqual(before)
    return point.reserve
  }, 0)
})

// Rea & Ouellette's model at age 25, ω 4.8, worked apart from the code: at 1 lux the page gives 45/(100·π) = 0.1432 cd/m².
test('its first rung is the model’s', () => {
  const L = 45 / (100 * Math.PI)
  const r = 2.3859 - 1.2204 * Math.tanh(0.3 * Math.log10(L))
  const I = L * Math.PI * r * r * (1 - 0.017 * 5)
  const p1 = Math.log10(Math.tanh(20_000 * 4.8e-6))
  const p2 = Math.log10(Math.log10((10 * I) / Math.PI))
  const log = -1.36415 - 0.178589 * p1 - 0.81285 * p2 + 0.225998 * p1 ** 2 - 0.077169 * p2 ** 2 + 0.169252 * p1 * p2
  expect(points[0]?.reserve).toBeCloseTo(0.9 / ((1 + (0.113 / 45) * 5) * 10 ** log), 9)
})
