import { expect, test } from 'vitest'
import { listDevices, pageOf } from '@/lib/catalogue/list'
import { publishedFigures } from '@/lib/findings/published'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const u = { L: 0.4, a: 0.1, b: 0.1 }
const edition = makeEdition([
  makeDevice({ slug: 'dim', page: { L: 60, a: 0, b: 0, u }, pen: true }),
  makeDevice({ slug: 'light', page: { L: 75, a: 0, b: 0, u }, pen: null }),
  makeDevice({ slug: 'middling', page: { L: 68, a: 0, b: 0, u }, pen: true }),
  makeDevice({ slug: 'without', page: { L: 76, a: 0, b: 0, u }, pen: false }),
])

test('devices known to match come first, the lightest first, and those not ruled out stand apart', () => {
  const { known, open } = listDevices(edition, { pen: true })
  expect(known.map(({ device }) => device.slug)).toEqual(['middling', 'dim'])
  expect(open.map(({ device, notStated }) => [device.slug, notStated])).toEqual([['light', ['pen']]])
})

test('a list carries the figures as published', () => {
  const [first] = listDevices(edition, {}).known
  expect(first!.device.slug).toBe('without')
  expect(first!.figures).toEqual(publishedFigures(edition, first!.device))
})

test('numbered pages hold every item once, and past the last page stands the last', () => {
  const items = Array.from({ length: 17 }, (_, i) => i)
  expect([1, 2, 3].flatMap((page) => pageOf(items, page, 8).items)).toEqual(items)
  expect(pageOf(items, 99, 8)).toEqual({ items: [16], page: 3, pages: 3 })
  expect(pageOf([], 1, 8)).toEqual({ items: [], page: 1, pages: 1 })
})
