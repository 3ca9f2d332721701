import 'server-only'
import type { Metadata } from 'next'
import type { Edition } from '@/lib/method/types'
import { ogImage } from '@/lib/og/address'
import { latestEdition } from './editions'

/**
 * How a page looks where it is passed on: its picture, and the title and description of the page itself.
 * @param path the public path, without a look or a query
 * @param edition the edition it shows; null: none is released, and there is no picture
 */
export function openGraphFor(path: `/${string}`, edition: Edition | null): Metadata['openGraph'] {
  // No url: the canonical link says it, and a page that only inherits the site's picture must not say the home page's.
  return { type: 'website', siteName: 'Lampleaf', locale: 'en_GB', images: ogImage(path, edition) }
}

/**
 * What a page says of itself: its title and description, its one address, and its picture.
 * @param index false keeps it out of search engines: somebody's own answers
 */
export async function pageMetadata({
  title,
  description,
  path,
  index = true,
}: {
  title: string
  description: string
  path: `/${string}`
  index?: boolean
}): Promise<Metadata> {
  return {
    title: path === '/' ? { absolute: title } : title,
    description,
    alternates: { canonical: path },
    openGraph: openGraphFor(path, await latestEdition()),
    robots: index ? undefined : { index: false },
  }
}
