import { expect, test } from 'vitest'
import { reserveFigures, reserveSteps, reserveWords } from '@/lib/workings/reserve'

const Y = 41
/** The light in which a matte page of Y 41 % has 10 cd/m²: E = 100·π·L/Y. */
const TEN = (100 * Math.PI * 10) / Y

// Check value of the threshold model: Method 1, section 3 (A 40, ω 4.8, L 10, C 0.9).
test('the model’s check value comes out, step by step', () => {
  const seen = { yPage: Y, yInk: Y / 10, lux: TEN, frontLight: 0, age: 40, size: 4.8 }
  const figures = reserveFigures(seen)
  expect(figures.luminance).toBeCloseTo(10, 9)
  expect(figures.pupil).toBeCloseTo(2.030382, 6)
  expect(figures.troland).toBeCloseTo(85.477016, 5)
  expect(figures.threshold).toBeCloseTo(0.04803076, 8)
  expect(figures.reserve).toBeCloseTo(18.738, 3)
  const steps = reserveSteps(seen)
  expect(steps.map(({ id }) => id)).toEqual(['luminance', 'ink-contrast', 'retina', 'threshold', 'reserve'])
  expect(steps.at(-1)).toMatchObject({ worked: 'R = 0.9000/0.04803' })
  expect(steps.at(-1)?.result).toContain('R 18.7 times')
})

// Method 1, section 2: the front light fills up to 15 cd/m², as far as it goes.
test.each([
  { lux: 0, frontLight: 100, luminance: 15 },
  { lux: 0, frontLight: 4, luminance: 4 },
  { lux: TEN, frontLight: 100, luminance: 15 },
  { lux: 2 * TEN, frontLight: 100, luminance: 20 },
])('a front light of $frontLight cd/m² in $lux lux gives $luminance cd/m²', ({ luminance, ...light }) => {
  expect(reserveFigures({ yPage: Y, yInk: 4, age: 25, size: 4.8, ...light }).luminance).toBeCloseTo(luminance, 9)
})

test('in the dark nothing can be read, and the steps say why', () => {
  const seen = { yPage: Y, yInk: 4, lux: 0.1, frontLight: 0, age: 25, size: 4.8 }
  expect(reserveFigures(seen)).toMatchObject({ pupil: null, troland: null, threshold: null, reserve: 0 })
  expect(reserveSteps(seen).at(-1)?.result).toContain('cannot be read')
})

test('more light than the model takes counts as its most', () => {
  const sun = reserveFigures({ yPage: Y, yInk: 4, lux: 80_000, frontLight: 0, age: 25, size: 4.8 })
  expect(sun.luminance).toBeGreaterThan(10_000)
  expect(sun.counted).toBe(2000)
})

// The anchors 3, 10 and 30 of Method 1, section 3.
test.each([
  [2.9, 'too little to read'],
  [3, 'short of fluent'],
  [10, 'enough to read fluently'],
  [30, 'all that the best reading rate asks for'],
])('a reserve of %d is “%s”', (reserve, words) => {
  expect(reserveWords(reserve)).toContain(words)
})
