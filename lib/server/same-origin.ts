import 'server-only'
import { config } from './config'

/**
 * Whether a form was sent from a page of this site. Browsers say where a post comes from in Origin; where that is
 * missing Sec-Fetch-Site is asked, then Referer, which the browsers of old reading devices still send. Whoever says
 * nothing is refused, and so is `Origin: null`.
 */
export function isFromThisSite(headers: Headers): boolean {
  const origin = headers.get('origin')
  if (origin !== null) return isOurs(origin, headers)
  const site = headers.get('sec-fetch-site')
  if (site !== null) return site === 'same-origin'
  const referer = headers.get('referer')
  return referer !== null && isOurs(referer, headers)
}

/** The path and query of a page of this site that the reader came from; `/` for any other. */
export function ownReferer(headers: Headers): string {
  const referer = headers.get('referer')
  if (!referer || !isOurs(referer, headers)) return '/'
  const { pathname, search } = new URL(referer)
  // Two slashes at the start would name another host.
  return pathname.startsWith('//') ? '/' : pathname + search
}

/** A path and query on this site as a form gave it; null for anything that could lead elsewhere, or nowhere. */
export function ownPath(path: string | null): string | null {
  if (!path?.startsWith('/') || !URL.canParse(path, config().baseUrl)) return null
  const { origin, pathname, search } = new URL(path, config().baseUrl)
  return origin === config().baseUrl && !pathname.startsWith('//') ? pathname + search : null
}

/** Ours is the configured origin, or the very host this request was sent to: a page elsewhere can fake neither. */
function isOurs(address: string, headers: Headers): boolean {
  if (!URL.canParse(address)) return false
  const { origin, host, protocol } = new URL(address)
  return origin === config().baseUrl || (/^https?:$/.test(protocol) && host === headers.get('host'))
}
