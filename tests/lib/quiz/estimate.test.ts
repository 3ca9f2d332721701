import { expect, test } from 'vitest'
import { cameraEstimate, lampEstimate, SIGHTS } from '@/lib/quiz/estimate'

// Computed for a bare 470 lm bulb from E = Φ/(4π·d²): 234 lx at 0.4 m, 104 lx at 0.6 m, 37 lx at 1 m.
test.each([
  { metres: 0.4, lux: 230, low: 120, high: 470 },
  { metres: 0.6, lux: 100, low: 52, high: 210 },
  { metres: 1, lux: 37, low: 19, high: 75 },
])('a bare 470 lumen bulb $metres m away gives about $lux lux, in a band of a factor of two', ({ metres, ...band }) => {
  expect(lampEstimate(470, metres)).toEqual(band)
})

// E ≈ 0.46·2^EV at ISO 100 on white paper: EV 4 = 7, EV 6 = 29, EV 8 = 118, EV 10 = 470, EV 12 ≈ 1,900 lx.
test.each([
  [4, 7.4],
  [6, 30],
  [8, 120],
  [10, 470],
  [12, 1900],
])('a camera that shows EV %i off white paper sees about %d lux', (exposureValue, lux) => {
  expect(cameraEstimate(exposureValue).lux).toBe(lux)
})

test('no estimate leaves what a spot may have', () => {
  expect(lampEstimate(100_000, 0.01).high).toBe(200_000)
  expect(lampEstimate(1, 100)).toEqual({ lux: 0, low: 0, high: 0 })
})

test('what one can see stands in order, each in the middle of its band, and the bands leave no gap', () => {
  SIGHTS.forEach(({ lux, low, high }, i) => {
    expect(lux).toBeGreaterThan(low)
    expect(lux).toBeLessThan(high)
    const next = SIGHTS[i + 1]
    if (next) expect(next.lux).toBeGreaterThan(lux)
    if (next && high < 10_000) expect(next.low).toBeLessThanOrEqual(high)
  })
})
