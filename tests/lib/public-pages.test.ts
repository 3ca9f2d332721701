import { readdirSync } from 'node:fs'
import { expect, test } from 'vitest'
import { type Changes, publicPages, publicPaths } from '@/lib/public-pages'
import { READERS } from '@/lib/readers/readers'
import { siteMap } from '@/lib/site-map'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'
import { xmlErrors } from '@/tests/fixtures/xml-schema'

const edition = makeEdition([makeDevice({ slug: 'example-7' }), makeDevice({ slug: 'example-8' })], {
  number: 2,
  publishedAt: '2026-07-03T09:00:00.000Z',
})
const changes: Changes = {
  editions: [
    { number: 2, publishedAt: '2026-07-03T09:00:00.000Z' },
    { number: 1, publishedAt: '2026-02-27T09:00:00.000Z' },
  ],
  devices: new Map([
    ['example-7', '2026-08-01T00:00:00.000Z'],
    ['example-8', '2026-01-01T00:00:00.000Z'],
  ]),
  corrections: '2026-05-12T00:00:00.000Z',
}
const pages = publicPages(edition, changes)
const changed = (path: string) => pages.find((page) => page.path === path)?.changed

test('every room, device, reader and edition is there once', () => {
  const paths = publicPaths(edition, changes.editions)
  expect(paths).toEqual(pages.map(({ path }) => path))
  expect(new Set(paths).size).toBe(paths.length)
  for (const path of ['/', '/quiz', '/devices', '/compare', '/light', '/method', '/glossary', '/about', '/corrections'])
    expect(paths).toContain(path)
  for (const path of ['/devices/example-7', '/devices/example-8', '/editions/1', '/editions/2', '/data', '/data/api'])
    expect(paths).toContain(path)
  for (const { slug } of READERS) expect(paths).toContain(`/for/${slug}`)
})

test('a page is dated by what it shows, and not at all where nobody can say', () => {
  expect(changed('/')).toBe('2026-07-03T09:00:00.000Z')
  expect(changed('/devices/example-7')).toBe('2026-08-01T00:00:00.000Z')
  expect(changed('/devices/example-8')).toBe('2026-07-03T09:00:00.000Z')
  expect(changed('/editions/1')).toBe('2026-05-12T00:00:00.000Z')
  expect(changed('/editions/2')).toBe('2026-07-03T09:00:00.000Z')
  expect(changed('/about')).toBeNull()
})

test('before the first release the rooms are there, without a date', () => {
  const early = publicPages(null, { editions: [], devices: new Map(), corrections: null })
  expect(early.map(({ path }) => path)).toContain('/devices')
  expect(early.every((page) => page.changed === null)).toBe(true)
})

// The same page asked otherwise, the later pages of a list, a result of one reader's own, and what is nobody's business.
const NOT_LISTED = [/^\/(?:lit|not-here|specimen|sign-|account|bench)/, /^\/quiz\/result$/, /\/found$/, /\/\[page\]$/]

test('every page the site has is in the list', () => {
  const listed = publicPaths(edition, changes.editions)
  const routes = readdirSync('app/[look]', { recursive: true, encoding: 'utf8' })
    .filter((file) => /(^|\/)page\.tsx$/.test(file))
    .map((file) => `/${file.replace(/\/?page\.tsx$/, '').replace(/\([^)]*\)\/?/g, '')}`)
    .filter((route) => !NOT_LISTED.some((pattern) => pattern.test(route)))
  expect(routes.length).toBeGreaterThan(3)
  for (const route of routes) {
    const pattern = new RegExp(`^${route.replace(/\[[^\]]*\]/g, '[^/]+')}$`)
    expect(
      listed.some((path) => pattern.test(path)),
      `${route} is missing from lib/public-pages.ts`,
    ).toBe(true)
  }
})

// The XSD of sitemaps.org, by libxml2.
test('the site map is valid, and the schema refuses one that is not', async () => {
  const map = siteMap(pages, 'https://guide.example')
  expect(await xmlErrors(map, 'siteMap')).toEqual([])
  expect(map).toContain('<url><loc>https://guide.example/about</loc></url>')
  expect(map).toContain('<loc>https://guide.example/devices/example-7</loc><lastmod>2026-08-01T00:00:00.000Z</lastmod>')
  for (const [from, to] of [
    [/<lastmod>.*?<\/lastmod>/, '<lastmod>yesterday</lastmod>'],
    [/<loc>.*?<\/loc>/, ''],
    ['<url>', '<url><title>Home</title>'],
  ] as const)
    expect(await xmlErrors(map.replace(from, to), 'siteMap'), String(from)).not.toEqual([])
})
