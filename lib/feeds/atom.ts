import { escapeXml } from './escape-xml'
import { type NewsItem, newsUpdated, tagOf } from './news'
import { FEED_AUTHOR, FEED_DESCRIPTION, FEED_LANGUAGE, FEED_TITLE } from './words'

export const ATOM_TYPE = 'application/atom+xml; charset=utf-8'
export const ATOM_PATH = '/feed.xml'

/**
 * The news as an Atom 1.0 document (RFC 4287).
 * @param origin the address people reach the site at, without a path
 */
export function atomFeed(items: readonly NewsItem[], origin: string): string {
  const url = (path: string) => escapeXml(new URL(path, origin).href)
  const tag = (name: string) => escapeXml(tagOf(new URL(origin).hostname, name))
  return [
    '<?xml version="1.0" encoding="utf-8"?>',
    `<feed xmlns="http://www.w3.org/2005/Atom" xml:lang="${FEED_LANGUAGE}">`,
    `<id>${tag('news')}</id>`,
    `<title>${escapeXml(FEED_TITLE)}</title>`,
    `<subtitle>${escapeXml(FEED_DESCRIPTION)}</subtitle>`,
    `<link rel="self" type="application/atom+xml" href="${url(ATOM_PATH)}"/>`,
    `<link rel="alternate" type="text/html" href="${url('/')}"/>`,
    `<icon>${url('/icons/mark-192.png')}</icon>`,
    `<updated>${newsUpdated(items).toISOString()}</updated>`,
    `<author><name>${escapeXml(FEED_AUTHOR)}</name><uri>${url('/about')}</uri></author>`,
    ...items.map((item) => entry(item, url, tag)),
    '</feed>',
    '',
  ].join('\n')
}

type Written = (value: string) => string

const entry = (item: NewsItem, url: Written, tag: Written) =>
  [
    '<entry>',
    `<id>${tag(item.name)}</id>`,
    `<title>${escapeXml(item.title)}</title>`,
    `<link rel="alternate" type="text/html" href="${url(item.path)}"/>`,
    `<published>${item.published.toISOString()}</published>`,
    `<updated>${item.updated.toISOString()}</updated>`,
    `<category term="${item.kind}"/>`,
    `<content type="text">${escapeXml(item.text)}</content>`,
    '</entry>',
  ].join('\n')
