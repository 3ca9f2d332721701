import { matchesTag } from '@/lib/serving/match-tag.mjs'

/**
 * A JSON document with a strong validator, answered with 304 where the asker has it already (RFC 9110, 13.1.2).
 * `no-transform` keeps the bytes the tag vouches for: a compressed body would need a tag of its own.
 * @param tag what changes when the document does, such as its SHA-256
 */
export function storedJson(request: Request, body: string, tag: string, cacheControl: string): Response {
  const headers = { etag: `"${tag}"`, 'cache-control': `${cacheControl}, no-transform` }
  if (matchesTag(request.headers.get('if-none-match'), `"${tag}"`)) return new Response(null, { status: 304, headers })
  return new Response(body, { headers: { ...headers, 'content-type': 'application/json; charset=utf-8' } })
}

/** A numbered edition is frozen for good. */
export const FROZEN = 'public, max-age=31536000, immutable'
/** The newest edition and the list change at a release: ask again after a minute. */
export const CHANGING = 'public, max-age=60, must-revalidate'
