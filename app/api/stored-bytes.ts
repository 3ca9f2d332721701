import { problem } from '@/lib/contract/problem'
import { byteRange } from './byte-range'
import { type Entity, notModified, preconditionFailed, rangeStillGood } from './conditions'

/**
 * A file with a strong validator, answered by what the asker has already: 412 and 304, then one byte range (206, 416),
 * else the whole, in the order of RFC 9110, section 13.2.2. Several ranges at once are answered with the whole file,
 * as section 14.2 allows. `no-transform` keeps the bytes the tag vouches for.
 */
export function storedBytes(
  request: Request,
  { bytes, ...entity }: Entity & { bytes: Uint8Array<ArrayBuffer> },
  more: Record<string, string>,
): Response {
  const validators = { etag: entity.tag, 'last-modified': entity.modified.toUTCString() }
  const { 'cache-control': cacheControl = 'no-cache', ...rest } = more
  const headers = { ...rest, ...validators, 'accept-ranges': 'bytes', 'cache-control': `${cacheControl}, no-transform` }

  if (preconditionFailed(request.headers, entity)) return problem(412, 'The file is not the one you hold')
  if (notModified(request.headers, entity)) {
    const { 'content-type': _, 'content-disposition': __, ...short } = headers as Record<string, string>
    return new Response(null, { status: 304, headers: short })
  }
  const whole = () => new Response(bytes, { headers: { ...headers, 'content-length': String(bytes.length) } })
  // A range means something for GET alone; section 14.2.
  const range =
    request.method === 'GET' && rangeStillGood(request.headers, entity)
      ? byteRange(request.headers.get('range'), bytes.length)
      : null
  if (range === null) return whole()
  if (range === 'unsatisfiable')
    return problem(416, 'The file is shorter than that', [], { 'content-range': `bytes */${bytes.length}` })
  const part = bytes.slice(range.first, range.last + 1)
  return new Response(part, {
    status: 206,
    headers: {
      ...headers,
      'content-length': String(part.length),
      'content-range': `bytes ${range.first}-${range.last}/${bytes.length}`,
    },
  })
}
