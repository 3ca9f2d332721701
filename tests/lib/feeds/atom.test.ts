import fc from 'fast-check'
import { expect, test } from 'vitest'
import { atomFeed } from '@/lib/feeds/atom'
import { newsItems } from '@/lib/feeds/news'
import { PUBLISHED } from '@/tests/fixtures/news'
import { xmlErrors } from '@/tests/fixtures/xml-schema'

const ORIGIN = 'https://guide.example'
const NOTHING = { editions: [], corrections: [], devices: [] }

// The RELAX NG grammar of RFC 4287, appendix B, by libxml2.
test('the feed is valid Atom, with news and without', async () => {
  expect(await xmlErrors(atomFeed(newsItems(PUBLISHED), ORIGIN), 'atom')).toEqual([])
  expect(await xmlErrors(atomFeed([], 'http://127.0.0.1:3000'), 'atom')).toEqual([])
})

test('the grammar refuses what is not Atom', async () => {
  const feed = atomFeed(newsItems(PUBLISHED), ORIGIN)
  for (const [from, to] of [
    [/<updated>.*?<\/updated>/, ''],
    [/<updated>.*?<\/updated>/, '<updated>yesterday</updated>'],
    [/<id>.*?<\/id>/, ''],
    ['<title>', '<heading/><title>'],
    ['href=', 'source='],
  ] as const)
    expect(await xmlErrors(feed.replace(from, to), 'atom'), String(from)).not.toEqual([])
})

// RFC 4287, 4.1.1 and 4.1.2, which its grammar states as Schematron: an author for the feed, an alternate link an entry.
test('the feed has its author and itself, and every entry an absolute link, its own tag and both dates', () => {
  const feed = atomFeed(newsItems(PUBLISHED), ORIGIN)
  const [head = '', ...entries] = feed.split('<entry>')
  expect(head).toContain('<author><name>Lampleaf</name>')
  expect(head).toContain('<link rel="self" type="application/atom+xml" href="https://guide.example/feed.xml"/>')
  expect(entries).toHaveLength(4)
  for (const entry of entries) {
    expect(entry).toMatch(/<link rel="alternate" type="text\/html" href="https:\/\/guide\.example\//)
    expect(entry).toMatch(/<published>\d{4}-\d\d-\d\dT[\d:.]+Z<\/published>\n<updated>/)
  }
  const tags = [...feed.matchAll(/<id>(.*?)<\/id>/g)].map(([, tag]) => tag)
  expect(new Set(tags).size).toBe(5)
  expect(feed).toContain('Corrects one page &amp; adds another.')
})

test('whatever an editor writes, the feed stays well formed and valid', async () => {
  const texts = fc.sample(fc.string({ unit: 'binary', maxLength: 60 }), { numRuns: 25, seed: 20_261_201 })
  const hostile = ['</title><script>', ']]>', '&amp;<', '\u0000\u0008\ufffe', '\ud800 half', 'a\u000bb', ...texts]
  const editions = hostile.map((text, i) => ({ ...PUBLISHED.editions[0]!, number: i + 1, title: text, note: text }))
  expect(await xmlErrors(atomFeed(newsItems({ ...NOTHING, editions }), ORIGIN), 'atom')).toEqual([])
})
