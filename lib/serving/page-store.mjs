import { createHash } from 'node:crypto'
import { promisify } from 'node:util'
import { brotliCompress, constants, gzip } from 'node:zlib'
import { LRUCache } from 'lru-cache'
import Negotiator from 'negotiator'
import { matchesTag } from './match-tag.mjs'

/** House: how long a stored page is given out before the site is asked for it again, milliseconds. */
const FRESH_MS = 5000
/** Bytes of memory all stored pages may take together. */
const LARGEST_STORE = 96 * 1024 * 1024

const toGzip = promisify(gzip)
const toBrotli = promisify(brotliCompress)
const QUALITY = { params: { [constants.BROTLI_PARAM_QUALITY]: 5 } }

/** Headers that belong to one connection, or to Next's own layers, and not to the page. */
const NOT_THE_PAGES =
  /^(connection|keep-alive|date|transfer-encoding|content-length|content-encoding|etag|x-nextjs-.*)$/

/**
 * Finished pages as they go over the wire, in memory: read by path and look, squeezed once, with an entity tag. It
 * holds only what the site itself calls cacheable for everybody, and asks again every few seconds, so that it never
 * knows more than the site's own cache; where the site fails, the last good page is given out.
 */
export function createPageStore({ now = Date.now, freshMs = FRESH_MS } = {}) {
  const pages = new LRUCache({ maxSize: LARGEST_STORE, sizeCalculation: ({ bytes }) => bytes })
  return {
    /** The stored page; `due` when this request should fetch it anew, which one request at a time is told. */
    find(key) {
      const page = pages.get(key)
      if (!page) return { page: null, due: true }
      const due = now() - page.askedAt > freshMs
      if (due) page.askedAt = now()
      return { page, due }
    },
    /** Keeps an answer that is for everybody, squeezed, and gives it back as a stored page. */
    async keep(key, { status, headers, body }) {
      const [gz, br] = await Promise.all([toGzip(body), toBrotli(body, QUALITY)])
      const page = {
        status,
        headers: Object.fromEntries(Object.entries(headers).filter(([name]) => !NOT_THE_PAGES.test(name))),
        bodies: { identity: body, gzip: gz, br },
        tag: `"${createHash('sha256').update(body).digest('base64url').slice(0, 27)}"`,
        bytes: body.length + gz.length + br.length,
        /** When the site was last asked for it. */
        askedAt: now(),
      }
      pages.set(key, page)
      return page
    },
    clear: () => pages.clear(),
  }
}

/** Whether an answer is the same for every reader of one look: shared caches may keep it, and it sets no cookie. */
export function isForEverybody(status, headers) {
  const control = String(headers['cache-control'] ?? '')
  return (status === 200 || status === 404) && /\bs-maxage=\d/.test(control) && headers['set-cookie'] === undefined
}

/** Answers with a stored page: 304 where the reader has it already, else in the encoding the reader prefers. */
export function sendPage(page, request, response) {
  const encoding =
    new Negotiator(request).encoding(['br', 'gzip', 'identity'], { preferred: ['br', 'gzip'] }) ?? 'identity'
  for (const [name, value] of Object.entries(page.headers)) response.setHeader(name, value)
  // Weak: each encoding has other bytes of the same page.
  response.setHeader('ETag', `W/${page.tag}`)
  if (page.status === 200 && matchesTag(request.headers['if-none-match'], page.tag)) {
    response.writeHead(304)
    return response.end()
  }
  const body = page.bodies[encoding]
  if (encoding !== 'identity') response.setHeader('Content-Encoding', encoding)
  response.writeHead(page.status, { 'Content-Length': body.length })
  return response.end(request.method === 'HEAD' ? undefined : body)
}
