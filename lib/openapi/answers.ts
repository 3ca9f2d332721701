import { ref } from './schemas'
import type { Answer, JsonSchema } from './types'

const text: JsonSchema = { type: 'string' }
const ETAG = {
  ETag: { description: 'Strong validator: send it back as If-None-Match to be told 304.', schema: text },
  'Cache-Control': { description: 'How long the answer may be kept.', schema: text },
}
const LINK = {
  Link: {
    description: 'The first, last, previous and next page (RFC 8288), where there is more than one.',
    schema: text,
  },
}

/** What an answer that went well holds. */
export function good(description: string, schema: JsonSchema, { paged = false, stored = true } = {}): Answer {
  return {
    description,
    headers: { ...(stored && ETAG), ...(paged && LINK) },
    content: { 'application/json': { schema } },
  }
}

export const NOT_MODIFIED: Answer = { description: 'You have it already; no body.' }

export function refusal(description: string): Answer {
  return { description, content: { 'application/problem+json': { schema: ref('Problem') } } }
}

/** Refusals any address may give. */
export const ANY: Record<string, Answer> = {
  405: refusal('Another method; the Allow header names those the address answers.'),
  503: refusal('The database is away, or too many rankings wait; Retry-After says when to ask again.'),
}
