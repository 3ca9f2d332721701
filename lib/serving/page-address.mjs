/** The cookie that holds the reader's look (lib/look.ts), as a header brings it. */
const LOOK_COOKIE = /(?:^|;\s*)look=([a-z]{1,8}-[a-z]{1,8})(?=;|$)/

/**
 * Whether an address is a page's. Pages have no dot in their path; the machine's addresses lie below `/api` and
 * `/_next`.
 * @param {import('node:http').IncomingMessage} request
 */
export function isPageAddress({ url = '' }) {
  const path = url.split('?')[0] ?? ''
  return !path.includes('.') && !/^\/(api|_next)(\/|$)/.test(path)
}

/**
 * Whether a request to a page's address asks for the whole page, for reading in a browser.
 * @param {import('node:http').IncomingMessage} request
 */
export function asksForPage({ method, headers }) {
  return (method === 'GET' || method === 'HEAD') && headers.rsc === undefined
}

/**
 * What a stored page is kept under: its path in one look. Null for an address with a query, which is never stored.
 * @param {import('node:http').IncomingMessage} request
 */
export function storeKey({ url = '', headers }) {
  if (url.includes('?')) return null
  return `${LOOK_COOKIE.exec(headers.cookie ?? '')?.[1] ?? ''} ${url}`
}
