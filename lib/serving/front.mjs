import { LRUCache } from 'lru-cache'
import { capture } from './capture.mjs'
import { outageSince } from './outage.mjs'
import { sendOutagePage } from './outage-page.mjs'
import { asksForPage, isPageAddress, storeKey } from './page-address.mjs'
import { isForEverybody, sendPage } from './page-store.mjs'
import { screen } from './screen.mjs'

/**
 * What stands before the site in its own process: it screens requests, gives out stored pages, and tells a reader
 * kindly when something behind the site is away.
 * @param {(request: import('node:http').IncomingMessage, response: import('node:http').ServerResponse) => void} site
 * @param {ReturnType<import('./page-store.mjs').createPageStore>} store
 */
export function frontOf(site, store) {
  // Addresses whose pages are made for one reader: looked at once, and not held back again.
  const personal = new LRUCache({ max: 2000 })

  return (request, response) => {
    if (screen(request, response)) return
    if (!isPageAddress(request)) return site(request, response)
    if (!asksForPage(request)) {
      capture(response, () => varyByLook(response))
      return site(request, response)
    }

    const key = storeKey(request)
    const { page, due } = key ? store.find(key) : { page: null, due: false }
    if (page && !due) return sendPage(page, request, response)

    const began = Date.now()
    const mayKeep = key !== null && request.method === 'GET' && !personal.has(request.url)
    // A stored page is squeezed once, here; it must reach us as it is.
    const encodings = request.headers['accept-encoding']
    if (mayKeep) delete request.headers['accept-encoding']
    const failed = (status) => status >= 500 && (page !== null || outageSince(began))
    const decide = (status, headers) => {
      varyByLook(response)
      if (failed(status)) return 'hold'
      if (mayKeep && isForEverybody(status, headers)) return 'hold'
      if (mayKeep && status === 200) personal.set(request.url, true)
      return 'pass'
    }
    capture(response, decide, async (answer) => {
      if (encodings !== undefined) request.headers['accept-encoding'] = encodings
      if (failed(answer.status)) return page ? sendPage(page, request, response) : sendOutagePage(response)
      sendPage(await store.keep(key, answer), request, response)
    })
    site(request, response)
  }
}

/** A page differs by the cookie that holds the look, and whoever stores it on the way must know. */
function varyByLook(response) {
  const varies = [response.getHeader('Vary') ?? []].flat().join(', ')
  if (!/\bcookie\b/i.test(varies)) response.setHeader('Vary', varies ? `${varies}, Cookie` : 'Cookie')
  return 'pass'
}
