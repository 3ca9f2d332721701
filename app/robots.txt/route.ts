import { siteUrl } from '@/lib/server/site-url'

export const dynamic = 'force-dynamic'

/**
 * All is open but what answers questions rather than shows pages (RFC 9309). Results are left open on purpose: they say
 * `noindex` themselves, and only a page that may be fetched can be heard saying it.
 */
export function GET(): Response {
  const lines = [
    'User-agent: *',
    'Disallow: /api/v1/match',
    'Disallow: /look',
    '',
    `Sitemap: ${siteUrl('/sitemap.xml')}`,
  ]
  return new Response(`${lines.join('\n')}\n`, {
    headers: { 'content-type': 'text/plain; charset=utf-8', 'cache-control': 'public, max-age=86400' },
  })
}
