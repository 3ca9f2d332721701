import { expect, test } from 'vitest'
import { jsonFeed } from '@/lib/feeds/json-feed'
import { newsItems } from '@/lib/feeds/news'
import { jsonFeedErrors } from '@/tests/fixtures/json-feed-schema'
import { PUBLISHED } from '@/tests/fixtures/news'

const ORIGIN = 'https://guide.example'
const written = () => JSON.parse(jsonFeed(newsItems(PUBLISHED), ORIGIN))

// The schema of JSON Feed 1.1 published in the SchemaStore, by Ajv.
test('the feed is a valid JSON Feed, with news and without', () => {
  expect(jsonFeedErrors(written())).toEqual([])
  expect(jsonFeedErrors(JSON.parse(jsonFeed([], ORIGIN)))).toEqual([])
})

test('the schema refuses what is not one', () => {
  for (const change of [
    { version: undefined },
    { items: {} },
    { items: [{ url: 'https://guide.example/' }] },
    { items: [{ id: 'a', content_text: 'a', date_modified: 'yesterday' }] },
    { feed_url: 'no address' },
    { colour: 'grey' },
  ])
    expect(jsonFeedErrors(JSON.parse(JSON.stringify({ ...written(), ...change })))).not.toEqual([])
})

// JSON Feed 1.1: top level and items.
test('it tells the same news as the other feed, with absolute addresses and its own', () => {
  const feed = written()
  expect(feed).toMatchObject({
    version: 'https://jsonfeed.org/version/1.1',
    feed_url: 'https://guide.example/feed.json',
    home_page_url: 'https://guide.example/',
  })
  expect(feed.items.map(({ id }: { id: string }) => id)).toEqual([
    'tag:guide.example,2026:corrections/7',
    'tag:guide.example,2026:editions/2',
    'tag:guide.example,2026:devices/example-reed',
    'tag:guide.example,2026:editions/1',
  ])
  for (const item of feed.items) expect(item.url).toMatch(/^https:\/\/guide\.example\//)
  expect(feed.items[0]).toMatchObject({
    date_published: '2026-05-12T00:00:00.000Z',
    date_modified: '2026-08-01T00:00:00.000Z',
    tags: ['correction'],
  })
})
