import { answerOurselves } from './answer-ourselves.mjs'
import { isPageAddress } from './page-address.mjs'

/** What our web process answers to; a handler may know fewer, and says so itself. */
const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']
/** Pages are read. Next would answer anything else with the whole page, as if it had done it. */
const METHODS_OF_PAGES = ['GET', 'HEAD']
/** No page: the form that chooses a look is posted here. */
const LOOK_FORM = '/look'

/** Headers that only our own layers may set: a request that brings them is trying something. */
const INTERNAL =
  /^(x-middleware-|x-invoke-|x-nextjs-|x-matched-path$|x-now-route-|x-prerender-|content-security-policy)/

/**
 * Refuses what no page or handler of ours could make sense of, and takes away headers no visitor may send.
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 * @returns {boolean} whether the request was answered here
 */
export function screen(request, response) {
  const methods = isPageAddress(request) && request.url !== LOOK_FORM ? METHODS_OF_PAGES : METHODS
  if (!methods.includes(request.method ?? '')) {
    refuse(response, 405, 'This method is not answered here.', { Allow: methods.join(', ') })
    return true
  }
  if (!isReadable(request.url ?? '')) {
    refuse(
      response,
      400,
      'This address cannot be read: a percent sign in it is not followed by two hexadecimal digits.',
    )
    return true
  }
  for (const name of Object.keys(request.headers)) if (INTERNAL.test(name)) delete request.headers[name]
  return false
}

const refuse = (response, status, message, headers = {}) =>
  answerOurselves(response, status, `${message}\n`, { 'Content-Type': 'text/plain; charset=utf-8', ...headers })

function isReadable(url) {
  try {
    decodeURIComponent(url.split('?')[0])
    return url.startsWith('/')
  } catch {
    return false
  }
}
