import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test } from 'vitest'
import { PointsTable } from '@/components/points-table'
import { groupTies } from '@/lib/method/groups'
import { AIMS, type EditionDevice, type RankedDevice } from '@/lib/method/types'

const device = (slug: string): EditionDevice => ({
  slug,
  name: `Device ${slug}`,
  maker: 'Ostler',
  revision: '1',
  provisional: slug === 'c',
  units: 2,
  page: { L: 73.4, a: -1.7, b: 0.9, u: { L: 0.3, a: 0.1, b: 0.2 } },
  ink: { L: 23.9, a: -0.5, b: -1, u: { L: 0.3, a: 0.1, b: 0.2 } },
  sessions: { one: 1 },
  whiteness: 41.2,
  tint: 3,
  withinLimits: false,
  contrast: 11,
  frontLight: false,
  diagonal: 7,
  ppi: 300,
  weight: 205,
  price: slug === 'b' ? null : { amount: 18_900, currency: 'GBP' },
  pen: false,
  colour: false,
  water: 0,
  pageButtons: false,
  onSale: true,
  lending: null,
  speech: null,
  formats: null,
})

const ranked = (slug: string, points: number[], tiedWith: string[]): RankedDevice => ({
  slug,
  fit: points.reduce((sum, point) => sum + point, 0),
  scores: { clarity: 0.5, whiteness: 0.5, tint: 0.5, handling: 0.5 },
  contributions: { clarity: points[0] ?? 0, whiteness: points[1] ?? 0, tint: points[2] ?? 0, handling: points[3] ?? 0 },
  unreadable: 0,
  notStated: [],
  sd: 1.1,
  first: 0.5,
  rank95: [1, 3],
  tiedWith,
})

const RANKED = [
  ranked('a', [42.4, 12.4, 18.7, 5.4], ['b']),
  ranked('b', [41.5, 12.5, 17.5, 5.5], ['a']),
  ranked('c', [20.1, 20.2, 10.3, 9.6], []),
  ranked('d', [20, 20, 10, 9], []),
]
const DEVICES = Object.fromEntries(['a', 'b', 'c', 'd'].map((slug) => [slug, device(slug)]))
const WEIGHTS = { clarity: 0.49, whiteness: 0.145, tint: 0.29, handling: 0.075 }

const render = (props: Partial<Parameters<typeof PointsTable>[0]> = {}) =>
  renderToStaticMarkup(<PointsTable groups={groupTies(RANKED)} devices={DEVICES} weights={WEIGHTS} {...props} />)

/** The words of each row's cells, tags taken out. */
function rows(html: string): string[][] {
  return [...html.matchAll(/<tr.*?<\/tr>/gs)].map(([row]) =>
    [...row.matchAll(/<t[hd].*?>(.*?)<\/t[hd]>/gs)].map(([, cell]) => (cell ?? '').replace(/<[^>]*>/g, '')),
  )
}

test('the points shown in a row add up to the fit shown in it', () => {
  const body = rows(render()).filter((cells) => cells.length > 10)
  expect(body).toHaveLength(5)
  for (const cells of body.slice(1)) {
    const points = cells.slice(1, 1 + AIMS.length).map(Number)
    const fit = Number(cells[5]?.split(' ')[0])
    expect(points.reduce((sum, point) => sum + point, 0)).toBe(fit)
  }
})

test('groups too close to call are rows, and devices that stand alone share one', () => {
  const titles = rows(render())
    .filter((cells) => cells.length === 1)
    .map(([title]) => title)
  expect(titles).toEqual(['Too close to call', 'Behind them', 'Behind those'].slice(0, titles.length))
  expect(titles).toHaveLength(2)
})

test('a page of the table keeps the heading its rows belong to and says where one is', () => {
  const html = render({ paging: { page: 2, perPage: 2, hrefFor: (page) => `?page=${page}` } })
  const names = [...html.matchAll(/Device [abcd]/g)].map(([name]) => name)
  expect(names).toEqual(['Device c', 'Device d'])
  expect(html).toContain('Behind them')
  expect(html).not.toContain('Too close to call')
  expect(html).toContain('Devices 3–4 of 4, page 2 of 2')
})

test('whiteness outside the limits of the formula carries its mark, and what is not stated says so', () => {
  const html = render()
  expect(html).toContain('41†')
  expect(html).toContain('not stated')
  expect(html).toContain('provisional, one unit')
})

test('the most points of the aims in the heads add up to a hundred', () => {
  const most = [...render().matchAll(/of (\d+)</g)].map(([, points]) => Number(points))
  expect(most).toHaveLength(4)
  expect(most.reduce((sum, points) => sum + points, 0)).toBe(100)
})
