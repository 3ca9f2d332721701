/** What a page of another site may read of an answer beside the few headers every browser shows. */
const EXPOSED = 'Accept-Ranges, Content-Disposition, Content-Range, ETag, Link, Retry-After'
/** What it may send: validators and ranges. Browsers let a few more through unasked. */
const ALLOWED = 'If-Match, If-Modified-Since, If-None-Match, If-Range, If-Unmodified-Since, Range'
const PREFLIGHT_SECONDS = 86_400

/**
 * Reads are anybody's: the data are open, hold nothing about who asks, and no cookie is looked at, so any page may read
 * them (ASVS 3.4.2). The wildcard also keeps credentials out: browsers refuse the two together. What is asked by POST
 * is not opened, though a ranking changes nothing: another site's pages could make its visitors' browsers spend our
 * ranking threads. Programs are not browsers and may ask.
 */
export function readableAnywhere(request: Request, response: Response): Response {
  if (request.method !== 'GET' && request.method !== 'HEAD') return response
  response.headers.set('access-control-allow-origin', '*')
  response.headers.set('access-control-expose-headers', EXPOSED)
  return response
}

/** What a browser is told that asks first whether it may read. */
export const PREFLIGHT = {
  'access-control-allow-origin': '*',
  'access-control-allow-methods': 'GET, HEAD',
  'access-control-allow-headers': ALLOWED,
  'access-control-max-age': String(PREFLIGHT_SECONDS),
}
