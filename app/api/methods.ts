import { problem } from '@/lib/contract/problem'
import { PREFLIGHT } from './cors'

type Method = 'GET' | 'HEAD' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

/**
 * Handlers for the methods an address has no other handler for: OPTIONS names those it answers, and the rest get 405,
 * which names them too (RFC 9110, sections 9.3.7 and 15.5.6). Where something is read, OPTIONS also answers a browser
 * that asks on behalf of another site's page.
 */
export function only(...methods: Method[]) {
  const allow = [...methods, 'OPTIONS'].join(', ')
  const headers = { allow, ...(methods.includes('GET') && PREFLIGHT) }
  return {
    options: async () => new Response(null, { status: 204, headers }),
    refused: async () => problem(405, `This address answers ${allow}`, [], { allow }),
  }
}
