import type { z } from 'zod'
import { clip } from './shown'

/** One wrong field: its path in the request with dots, such as `spots.0.lux`, or an empty string for the whole. */
export type FieldError = { field: string; message: string }

// Tag URIs (RFC 4151) name the kinds of problem without promising a page behind each, as RFC 9457 section 4 suggests.
const KINDS: Record<number, string> = {
  400: 'invalid-request',
  404: 'not-found',
  405: 'method-not-allowed',
  408: 'too-slow',
  413: 'too-large',
  415: 'unsupported-media-type',
  500: 'failure',
  503: 'unavailable',
}
const kind = (status: number) => (KINDS[status] ? `tag:lampleaf.example,2026:problem/${KINDS[status]}` : 'about:blank')

/**
 * The one shape in which every handler fails: `application/problem+json` (RFC 9457), naming the fields.
 * Never stored by a cache, since the next try may go well.
 */
export function problem(status: number, title: string, errors: FieldError[] = [], headers: HeadersInit = {}): Response {
  const all = new Headers(headers)
  all.set('content-type', 'application/problem+json; charset=utf-8')
  all.set('cache-control', 'no-store')
  return new Response(JSON.stringify({ type: kind(status), title, status, errors }), { status, headers: all })
}

const MOST_ERRORS = 50

/** What a schema refused, as fields and whole sentences. At most 50: a thousand wrong spots need no thousand lines. */
export function fieldErrors(error: z.core.$ZodError): FieldError[] {
  const all = error.issues.flatMap((issue) =>
    issue.code === 'unrecognized_keys'
      ? issue.keys.slice(0, MOST_ERRORS).map((key) => sentence([...issue.path, key], issue.message))
      : [sentence(issue.path, issue.message)],
  )
  // Two rules of one field, such as whole and not too large, may be broken at once; it is told once.
  const once = new Map(all.map((one) => [`${one.field}\n${one.message}`, one]))
  return [...once.values()].slice(0, MOST_ERRORS)
}

function sentence(path: PropertyKey[], message: string): FieldError {
  const field = path.map((part) => clip(String(part))).join('.')
  return { field, message: `${field || 'The request'} ${message}.` }
}
