import { escapeXml } from './feeds/escape-xml'
import type { PublicPage } from './public-pages'

/**
 * The pages as a site map; a page whose last change nobody can date has none.
 * @param origin the address people reach the site at, without a path
 * @see https://www.sitemaps.org/protocol.html
 */
export function siteMap(pages: readonly PublicPage[], origin: string): string {
  const urls = pages.map(({ path, changed }) => {
    const dated = changed === null ? '' : `<lastmod>${escapeXml(changed)}</lastmod>`
    return `<url><loc>${escapeXml(new URL(path, origin).href)}</loc>${dated}</url>`
  })
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    '<urlset xmlns="http://www.sitemaps.org/schemas/sitemap/0.9">',
    ...urls,
    '</urlset>',
    '',
  ].join('\n')
}
