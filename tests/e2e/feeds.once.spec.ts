import { type APIRequestContext, expect, test } from '@playwright/test'
import type { Edition } from '@/lib/method/types'
import { ogImage } from '@/lib/og/address'
import { jsonFeedErrors } from '@/tests/fixtures/json-feed-schema'
import { readPng } from '@/tests/fixtures/png'
import { schemaOrgErrors } from '@/tests/fixtures/schema-org'
import { xmlErrors } from '@/tests/fixtures/xml-schema'
import { each, listedPaths } from './crawl'
import { fromAddress } from './site'

const latest = async (request: APIRequestContext): Promise<Edition> =>
  (await request.get('/api/v1/editions/latest')).json()

test.describe('the feeds', () => {
  // RFC 4287, appendix B, by libxml2; JSON Feed 1.1 by the schema of the SchemaStore; both from tests/schemas.
  test('are valid, tell the same news, and lead to pages that are there', async ({ request }) => {
    const atom = await request.get('/feed.xml')
    expect(atom.headers()['content-type']).toBe('application/atom+xml; charset=utf-8')
    const xml = await atom.text()
    expect(await xmlErrors(xml, 'atom')).toEqual([])
    const json = await request.get('/feed.json')
    expect(json.headers()['content-type']).toBe('application/feed+json; charset=utf-8')
    const feed = await json.json()
    expect(jsonFeedErrors(feed)).toEqual([])

    const entries = xml.split('<entry>').slice(1)
    const first = (name: string) => entries.map((entry) => new RegExp(`<${name}>(.*?)</${name}>`).exec(entry)?.[1])
    expect(first('id')).toEqual(feed.items.map(({ id }: { id: string }) => id))
    expect(first('updated')).toEqual(feed.items.map((item: { date_modified: string }) => item.date_modified))
    // Three editions, one correction, sixteen devices.
    expect(feed.items).toHaveLength(20)
    for (const { url } of feed.items) expect((await request.get(url)).status(), url).toBe(200)
  })

  // RFC 9110, 13.1.2 and 13.1.3.
  test('are not sent twice to who has them', async ({ request }) => {
    for (const path of ['/feed.xml', '/feed.json', '/sitemap.xml']) {
      const { etag, 'last-modified': date } = (await request.get(path)).headers()
      expect(etag).toMatch(/^W\/"/)
      for (const headers of [{ 'if-none-match': etag! }, { 'if-modified-since': date! }] as Record<string, string>[])
        expect((await request.get(path, { headers })).status(), path).toBe(304)
      expect((await request.get(path, { headers: { 'if-none-match': '"other"' } })).status()).toBe(200)
    }
  })

  test('are empty and valid before the first release', async ({ request }) => {
    const empty = fromAddress('EMPTY_URL')
    expect(await xmlErrors(await (await request.get(`${empty}/feed.xml`)).text(), 'atom')).toEqual([])
    const feed = await (await request.get(`${empty}/feed.json`)).json()
    expect(jsonFeedErrors(feed)).toEqual([])
    expect(feed.items).toEqual([])
    expect(await xmlErrors(await (await request.get(`${empty}/sitemap.xml`)).text(), 'siteMap')).toEqual([])
    expect((await request.get(`${empty}/og/1/home.png`)).status()).toBe(404)
  })

  test('say when to come back while the database is away', async ({ request }) => {
    const down = fromAddress('DOWN_URL')
    for (const path of ['/feed.xml', '/feed.json', '/sitemap.xml', '/og/1/home.png']) {
      const answer = await request.get(`${down}${path}`)
      expect(answer.status(), path).toBe(503)
      expect(Number(answer.headers()['retry-after'])).toBeGreaterThan(0)
    }
    expect((await request.get(`${down}/robots.txt`)).status()).toBe(200)
  })
})

// The XSD of sitemaps.org, by libxml2.
test('the site map is valid, lists every page once, and dates what an edition shows by its release', async ({
  request,
}) => {
  const xml = await (await request.get('/sitemap.xml')).text()
  expect(await xmlErrors(xml, 'siteMap')).toEqual([])
  const { devices, publishedAt } = await latest(request)
  const paths = await listedPaths(request)
  expect(new Set(paths).size).toBe(paths.length)
  for (const { slug } of devices) expect(paths).toContain(`/devices/${slug}`)
  const released = new Date(publishedAt).toISOString()
  expect(xml).toMatch(new RegExp(`/devices</loc><lastmod>${released}</lastmod>`))
  // A correction of May 2026 (seed/scenario) is the last change of the first edition's page.
  expect(xml).toMatch(/\/editions\/1<\/loc><lastmod>2026-05-12T/)
})

// RFC 9309: one group for all, and where the site map is.
test('robots are told what to leave alone and where the list of pages is', async ({ request, baseURL }) => {
  const answer = await request.get('/robots.txt')
  expect(answer.headers()['content-type']).toMatch(/^text\/plain/)
  const text = await answer.text()
  expect(text).toMatch(/^User-agent: \*\nDisallow: /)
  expect(text).toContain(`Sitemap: ${new URL('/sitemap.xml', baseURL).href}`)
  expect(text).not.toMatch(/^Disallow: \/$/m)
})

// W3C, Web Application Manifest: icons of the sizes they claim, one of them maskable.
test('the manifest names icons that are there and as large as it says', async ({ request }) => {
  const answer = await request.get('/manifest.webmanifest')
  expect(answer.headers()['content-type']).toMatch(/^application\/manifest\+json/)
  const manifest = await answer.json()
  expect(manifest).toMatchObject({ name: 'Lampleaf', start_url: '/', display: 'browser' })
  expect(manifest.icons.some(({ purpose }: { purpose?: string }) => purpose === 'maskable')).toBe(true)
  for (const { src, sizes, type } of manifest.icons) {
    const icon = await request.get(src)
    expect(icon.headers()['content-type'], src).toContain(type)
    if (type !== 'image/png') continue
    const { width, height } = readPng(await icon.body())
    expect(`${width}x${height}`).toBe(sizes)
  }
})

test.describe('pictures for links', () => {
  test('every page names one that is there, in the size it says, to be kept for ever', async ({ request }) => {
    const edition = await latest(request)
    for (const path of ['/', '/devices/tamber-reed-7', '/for/dim-bedroom', `/editions/${edition.number}`, '/method']) {
      const html = await (await request.get(path)).text()
      const address = /<meta property="og:image" content="([^"]+)"/.exec(html)?.[1]
      expect(address, path).toBeDefined()
      expect(new URL(address!).pathname).toBe(ogImage(path, edition)[0]!.url)
      const answer = await request.get(address!)
      expect(answer.headers()['content-type']).toBe('image/png')
      expect(answer.headers()['cache-control']).toMatch(/^public, max-age=31536000, immutable/)
      const picture = readPng(await answer.body())
      expect([picture.width, picture.height]).toEqual([1200, 630])
    }
  })

  test('there is none of what is not there', async ({ request }) => {
    for (const path of ['99/home', '3/devices/nothing', '3/for/nobody', '3/unknown', '03/home', '3/devices/..%2Fhome'])
      expect((await request.get(`/og/${path}.png`)).status(), path).toBe(404)
  })
})

// The vocabulary schema.org publishes, tests/schemas/schema-org.ttl: types, domains and ranges.
test('every page’s structured data is right by the vocabulary of schema.org', async ({ request }) => {
  const kinds = new Set<string>()
  await each([...(await listedPaths(request)), '/quiz/result?bed-lamp=7&train=4'], async (path) => {
    const html = await (await request.get(path)).text()
    const texts = [...html.matchAll(/<script type="application\/ld\+json">(.*?)<\/script>/gs)].map(([, text]) => text!)
    const blocks = texts.map((text) => JSON.parse(text) as object)
    expect.soft(schemaOrgErrors(blocks), path).toEqual([])
    for (const [, kind] of texts.join().matchAll(/"@type":"(\w+)"/g)) kinds.add(kind!)
  })
  for (const kind of ['WebSite', 'Organization', 'Product', 'Review', 'ItemList', 'Dataset'])
    expect([...kinds]).toContain(kind)
  expect([...kinds]).not.toContain('AggregateRating')
  expect([...kinds]).not.toContain('Rating')
})
