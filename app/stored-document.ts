import { createHash } from 'node:crypto'
import { matchesTag } from '@/lib/serving/match-tag.mjs'
import { notModified } from './api/conditions'

/**
 * A document that changes now and then, with both validators: who has it already is answered with 304. A tag decides
 * where one is sent, the date only without one (RFC 9110, 13.2.2). The tag is weak: a compressed body is as good.
 * @param changed when the document last changed; null where nobody can say
 */
export function storedDocument(
  request: Request,
  { body, type, changed, cacheControl }: { body: string; type: string; changed: Date | null; cacheControl: string },
): Response {
  const tag = `"${createHash('sha256').update(body).digest('base64url')}"`
  const headers = new Headers({ etag: `W/${tag}`, 'cache-control': cacheControl })
  if (changed) headers.set('last-modified', changed.toUTCString())
  const known = changed
    ? notModified(request.headers, { tag, modified: changed })
    : matchesTag(request.headers.get('if-none-match'), tag)
  if (known) return new Response(null, { status: 304, headers })
  headers.set('content-type', type)
  return new Response(body, { headers })
}

/** News and maps are good for five minutes, and for an hour more while a new copy is fetched. House. */
export const NOW_AND_THEN = 'public, max-age=300, stale-while-revalidate=3600'
