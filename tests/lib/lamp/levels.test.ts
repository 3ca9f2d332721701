import { describe, expect, test } from 'vitest'
import { LAST_STEP, LEVELS, luxAt, nearestLevel, parseLux, stepOf } from '@/lib/lamp/levels'
import { SPOTS } from '@/lib/method/spots'

test('every light the lamp can name is one of the method’s reading spots', () => {
  const spots = SPOTS.map(({ lux }) => lux as number)
  for (const { lux } of LEVELS) expect(spots).toContain(lux)
})

test('the slider runs from lights off to full sun and never turns back', () => {
  const lights = Array.from({ length: LAST_STEP + 1 }, (_, step) => luxAt(step))
  expect(lights[0]).toBe(0.1)
  expect(lights.at(-1)).toBe(80_000)
  expect(lights).toEqual([...lights].sort((one, other) => one - other))
  expect(new Set(lights).size).toBe(lights.length)
})

test('each step of the slider is its own nearest step', () => {
  for (let step = 0; step <= LAST_STEP; step += 1) expect(stepOf(luxAt(step))).toBe(step)
})

describe('a light has the name that comes nearest by ratio', () => {
  test.each([
    [0, 'Lights off'],
    [0.1, 'Lights off'],
    [0.6, 'Lights off'],
    [0.8, 'Dim lamp far away'],
    [80, 'Bedside lamp'],
    [100, 'Bedside lamp'],
    [500, 'Desk'],
    [200_000, 'Full sun'],
  ])('%s lux → %s', (lux, name) => {
    expect(nearestLevel(lux).name).toBe(name)
  })
})

describe('a light typed by hand', () => {
  test.each([
    ['80', 80],
    [' 80 ', 80],
    ['8,000', 8000],
    ['0.5', 0.5],
    ['0', 0.1],
    ['999999', 80_000],
    ['', null],
    [undefined, null],
    ['-3', null],
    ['1e3', null],
    ['bright', null],
    ['8\u00000', null],
    ['9'.repeat(400), null],
  ])('%j → %s', (text, lux) => {
    expect(parseLux(text)).toBe(lux)
  })
})
