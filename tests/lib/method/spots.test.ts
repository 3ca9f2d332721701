import { describe, expect, test } from 'vitest'
import { SPOTS } from '@/lib/method/spots'
import levels from '@/tests/reference/illuminance.json'

/** The published level or levels of a place, lux; see tests/reference/README.md for their sources. */
function level(id: string): [low: number, high: number] {
  const entry = levels.entries.find((one) => one.id === id)
  if (!entry) throw new Error(`There is no level ${id}`)
  const [low, high] = [entry.lux].flat() as [number, number?]
  return [low, high ?? low]
}

describe('the light assumed in a spot is near the published level of such a place', () => {
  // A single figure stands for a band; common practice, no source: half to twice of it. Ranges are taken as they are.
  test.each([
    ['sofa-evening', 'living-room'],
    ['bed-lamp', 'bedside'],
    ['train', 'cibse-some-detail'],
    ['desk', 'office'],
    ['window', 'window'],
    ['shade', 'overcast-range'],
    ['sun', 'sun'],
  ])('%s', (slug, id) => {
    const { lux } = SPOTS.find((spot) => spot.slug === slug)!
    const [low, high] = level(id)
    const room = low === high ? 2 : 1
    expect(lux).toBeGreaterThanOrEqual(low / room)
    expect(lux).toBeLessThanOrEqual(high * room)
  })
})

test('spots are listed darkest first, each once, and a front light is for dim places alone', () => {
  expect(SPOTS.map(({ lux }) => lux)).toEqual(SPOTS.map(({ lux }) => lux).toSorted((one, other) => one - other))
  expect(new Set(SPOTS.map(({ slug }) => slug)).size).toBe(SPOTS.length)
  for (const { lux, frontLight } of SPOTS) expect(frontLight).toBe(lux < 100)
})
