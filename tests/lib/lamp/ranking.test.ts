import { describe, expect, test } from 'vitest'
import { lampAnswers } from '@/lib/lamp/question'
import { rankUnderLamp } from '@/lib/lamp/ranking'
import { rankByFit } from '@/lib/method/ranking'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const u = { L: 0.4, a: 0.1, b: 0.1 }
const devices = [
  makeDevice({ slug: 'lit', frontLight: { max: 90, min: 1 }, page: { L: 66, a: -2, b: 3, u } }),
  makeDevice({ slug: 'light-unlit', frontLight: false, page: { L: 75, a: -0.5, b: 0.5, u } }),
  makeDevice({ slug: 'unknown', frontLight: null, page: { L: 70, a: -1, b: 1, u } }),
]

test.each([0.1, 5, 80, 99.9, 100, 400, 80_000])('at %s lux the order and the fits are those of the method', (lux) => {
  const { ranked } = rankByFit(makeEdition(devices), lampAnswers(lux))
  expect(rankUnderLamp(devices, lux).map(({ device, fit }) => [device.slug, fit])).toEqual(
    ranked.map(({ slug, fit }) => [slug, fit]),
  )
})

describe('in the dark', () => {
  const [first, ...others] = rankUnderLamp(devices, 0.1)

  test('only a page with a light of its own can be read, and it is drawn lit', () => {
    expect(first).toMatchObject({ device: { slug: 'lit' }, readable: true, frontLight: 'on', gloom: 0 })
    for (const row of others) expect(row).toMatchObject({ readable: false, fit: 0 })
    expect(others.map((row) => row.frontLight)).toEqual(['none', 'unstated'])
  })

  // At 0.1 lux a page of L* 75 (Y 48.3) gives back 0.1·48.3/314 = 0.0154 cd/m²: under the picture's black of 0.02.
  test('a page without one is drawn black', () => {
    expect(others.find(({ device }) => device.slug === 'light-unlit')?.gloom).toBe(1)
  })
})

test('from 100 lux up no front light is turned on', () => {
  expect(rankUnderLamp(devices, 99).some(({ frontLight }) => frontLight === 'on')).toBe(true)
  expect(rankUnderLamp(devices, 100).some(({ frontLight }) => frontLight === 'on')).toBe(false)
})

test('without any front light the dark leaves nothing readable', () => {
  const unlit = devices.map((device) => ({ ...device, frontLight: false as const }))
  expect(rankUnderLamp(unlit, 0.1).some(({ readable }) => readable)).toBe(false)
})
