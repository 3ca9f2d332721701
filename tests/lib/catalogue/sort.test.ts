import { describe, expect, test } from 'vitest'
import { catalogueHref, readCatalogue } from '@/lib/catalogue/address'
import { type DeviceRow, nextSort, SORTS, type Sort, type SortKey, sortFor, sortRows } from '@/lib/catalogue/sort'
import { publishedFigures } from '@/lib/findings/published'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const u = { L: 0.4, a: 0.1, b: 0.1 }
const devices = [
  makeDevice({
    slug: 'amber',
    name: 'Amber',
    page: { L: 70, a: -1, b: 1, u },
    price: { amount: 20_000, currency: 'GBP' },
  }),
  makeDevice({
    slug: 'birch',
    weight: null,
    name: 'Birch',
    page: { L: 74, a: -2, b: 3, u },
    price: null,
    frontLight: false,
    diagonal: 10.3,
  }),
  makeDevice({
    slug: 'cedar',
    weight: 120,
    name: 'Cedar',
    page: { L: 66, a: 0, b: 0.5, u },
    price: { amount: 9_900, currency: 'GBP' },
  }),
  makeDevice({
    slug: 'dogwood',
    name: 'Dogwood',
    page: { L: 66, a: 0, b: 4, u },
    price: { amount: 5_000, currency: 'EUR' },
    frontLight: null,
    diagonal: null,
  }),
]
const edition = makeEdition(devices)
const rows: DeviceRow[] = devices.map((device) => ({ device, figures: publishedFigures(edition, device) }))
const sortOf = (address: Record<string, string>): Sort => sortFor(readCatalogue(Object.entries(address)).query)
const slugs = (address: Record<string, string>) => sortRows(rows, sortOf(address)).map(({ device }) => device.slug)

describe('the list of devices is ordered', () => {
  test.each([
    ['by lightness unless asked', {}, ['birch', 'amber', 'cedar', 'dogwood']],
    [
      'by lightness for an order nobody offers',
      { sort: 'whiteness; drop table' },
      ['birch', 'amber', 'cedar', 'dogwood'],
    ],
    ['by lightness for a name every object has', { sort: 'constructor' }, ['birch', 'amber', 'cedar', 'dogwood']],
    ['by name', { sort: 'name' }, ['amber', 'birch', 'cedar', 'dogwood']],
    ['by name backwards', { sort: 'name', order: 'descending' }, ['dogwood', 'cedar', 'birch', 'amber']],
    ['by price, what has none we can compare last', { sort: 'price' }, ['cedar', 'amber', 'birch', 'dogwood']],
    [
      'and last the other way round too',
      { sort: 'price', order: 'descending' },
      ['amber', 'cedar', 'birch', 'dogwood'],
    ],
    [
      'by weight, the lightest first and what is not stated last',
      { sort: 'weight' },
      ['cedar', 'amber', 'dogwood', 'birch'],
    ],
    ['by front light, none before not stated', { sort: 'front-light' }, ['amber', 'cedar', 'birch', 'dogwood']],
    ['by chroma, the least first', { sort: 'chroma' }, ['cedar', 'amber', 'birch', 'dogwood']],
  ])('%s', (_, address, order) => {
    expect(slugs(address as Record<string, string>)).toEqual(order)
  })
})

test('every order leads to itself the other way round, and keeps every device', () => {
  for (const by of Object.keys(SORTS) as SortKey[]) {
    const sort = sortFor({ sort: by })
    const href = catalogueHref({ sort: by, order: nextSort(sort, by).order })
    const other = sortOf(Object.fromEntries(new URL(href, 'http://bench.example').searchParams))
    expect(other.by).toBe(by)
    expect(other.order).not.toBe(sort.order)
    expect(sortRows(rows, other)).toHaveLength(rows.length)
  }
})

test('the list is never ordered by whiteness unless one asks for it', () => {
  expect(sortFor({}).by).toBe('lightness')
})
