import { type NextRequest, NextResponse } from 'next/server'
import { contentSecurityPolicy } from '@/lib/page-policy.mjs'

/**
 * Gives the pages that are made for each request a policy with a nonce of its own; Next reads it from the request and
 * puts the nonce on its scripts. Pages from the cache carry hashes instead (lib/page-cache.mjs). No page relies on this
 * for who may see it.
 */
export function proxy(request: NextRequest): NextResponse {
  // React's development build evaluates text, which the policy forbids.
  if (process.env.NODE_ENV === 'development') return NextResponse.next()
  const nonce = btoa(String.fromCharCode(...crypto.getRandomValues(new Uint8Array(16))))
  const policy = contentSecurityPolicy([`'nonce-${nonce}'`])
  const headers = new Headers(request.headers)
  headers.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('content-security-policy', policy)
  return response
}

export const config = {
  matcher: [
    '/quiz/:path*',
    '/compare',
    '/light',
    '/method/try',
    { source: '/', has: [{ type: 'query', key: 'lux' }] },
    { source: '/', has: [{ type: 'query', key: 'step' }] },
    { source: '/devices', has: [{ type: 'query', key: 'sort' }] },
    { source: '/devices', has: [{ type: 'query', key: 'order' }] },
    { source: '/devices', has: [{ type: 'query', key: 'q' }] },
    { source: '/devices', has: [{ type: 'query', key: 'maker' }] },
    { source: '/devices', has: [{ type: 'query', key: 'min-size' }] },
    { source: '/devices', has: [{ type: 'query', key: 'max-size' }] },
    { source: '/devices', has: [{ type: 'query', key: 'max-price' }] },
    { source: '/devices', has: [{ type: 'query', key: 'max-weight' }] },
    { source: '/devices', has: [{ type: 'query', key: 'pen' }] },
    { source: '/devices', has: [{ type: 'query', key: 'colour' }] },
    { source: '/devices', has: [{ type: 'query', key: 'front-light' }] },
    { source: '/devices', has: [{ type: 'query', key: 'water' }] },
    { source: '/devices', has: [{ type: 'query', key: 'on-sale' }] },
    { source: '/devices', has: [{ type: 'query', key: 'page' }] },
  ],
}
