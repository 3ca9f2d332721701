import { type NewsItem, tagOf } from './news'
import { FEED_AUTHOR, FEED_DESCRIPTION, FEED_LANGUAGE, FEED_TITLE } from './words'

export const JSON_FEED_TYPE = 'application/feed+json; charset=utf-8'
export const JSON_FEED_PATH = '/feed.json'

/**
 * The news as a JSON Feed 1.1 document.
 * @param origin the address people reach the site at, without a path
 * @see https://www.jsonfeed.org/version/1.1/
 */
export function jsonFeed(items: readonly NewsItem[], origin: string): string {
  const url = (path: string) => new URL(path, origin).href
  const { hostname } = new URL(origin)
  return JSON.stringify({
    version: 'https://jsonfeed.org/version/1.1',
    title: FEED_TITLE,
    home_page_url: url('/'),
    feed_url: url(JSON_FEED_PATH),
    description: FEED_DESCRIPTION,
    icon: url('/icons/mark-512.png'),
    favicon: url('/icons/mark-192.png'),
    authors: [{ name: FEED_AUTHOR, url: url('/about') }],
    language: FEED_LANGUAGE,
    items: items.map((item) => ({
      id: tagOf(hostname, item.name),
      url: url(item.path),
      title: item.title,
      content_text: item.text,
      date_published: item.published.toISOString(),
      date_modified: item.updated.toISOString(),
      tags: [item.kind],
    })),
  })
}
