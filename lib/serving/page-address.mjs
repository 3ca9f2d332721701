import { LOOK_COOKIE_PATTERN } from './look-cookie.mjs'

/**
 * Whether a request asks for a page as a whole: by its path alone, for reading in a browser.
 * @param {import('node:http').IncomingMessage} request
 */
export function isPageRequest({ method, url = '', headers }) {
  if (method !== 'GET' && method !== 'HEAD') return false
  return headers.rsc === undefined && isPagePath(url.split('?')[0] ?? '')
}

/** Pages have no dot in their path; the machine's addresses lie below `/api` and `/_next`. */
export function isPagePath(path) {
  return !path.includes('.') && !/^\/(api|_next)(\/|$)/.test(path)
}

/** What a stored page is kept under: its path in one look. Null for an address with a query, which is never stored. */
export function storeKey({ url = '', headers }) {
  if (url.includes('?')) return null
  return `${LOOK_COOKIE_PATTERN.exec(headers.cookie ?? '')?.[1] ?? ''} ${url}`
}
