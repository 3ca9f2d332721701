import { problem } from '@/lib/contract/problem'
import { TooBusy } from '@/lib/server/match'
import { isOutage } from '@/lib/server/outage'
import { readableAnywhere } from './cors'

const OUTAGE_RETRY_SECONDS = 10

/**
 * A handler whose failures have the one shape, too: an outage is 503 with Retry-After, too many waiting rankings
 * likewise, and a bug is logged and told as 500 without its words. What is read may be read from any site's pages.
 */
export function answering<A extends unknown[]>(handler: (request: Request, ...rest: A) => Promise<Response>) {
  return async (request: Request, ...rest: A): Promise<Response> =>
    readableAnywhere(request, await settled(handler, request, rest))
}

async function settled<A extends unknown[]>(
  handler: (request: Request, ...rest: A) => Promise<Response>,
  request: Request,
  rest: A,
): Promise<Response> {
  try {
    return await handler(request, ...rest)
  } catch (error) {
    if (error instanceof TooBusy) return away('Too many rankings are waiting; try again soon', error.retryAfterSeconds)
    if (isOutage(error)) return away('The database is away; try again soon', OUTAGE_RETRY_SECONDS)
    console.error(error)
    return problem(500, 'Something went wrong on our side')
  }
}

const away = (title: string, seconds: number) => problem(503, title, [], { 'retry-after': String(seconds) })
