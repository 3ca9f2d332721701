import { matchesTag } from '@/lib/serving/match-tag.mjs'

/** What is known of a file: its strong tag with quotes, and when it came to be. */
export type Entity = { tag: string; modified: Date }

/** If-Match by the strong comparison, or else If-Unmodified-Since: the file is not the one named (RFC 9110, 13.1.1, 13.1.4). */
export function preconditionFailed(headers: Headers, { tag, modified }: Entity): boolean {
  const match = headers.get('if-match')
  if (match !== null) return match.trim() !== '*' && !strongTags(match).includes(tag)
  const since = moment(headers.get('if-unmodified-since'))
  return since !== null && seconds(modified) > since
}

/** If-None-Match, or else If-Modified-Since: the asker has the file already (RFC 9110, 13.1.2, 13.1.3). */
export function notModified(headers: Headers, { tag, modified }: Entity): boolean {
  const noneMatch = headers.get('if-none-match')
  if (noneMatch !== null) return matchesTag(noneMatch, tag)
  const since = moment(headers.get('if-modified-since'))
  return since !== null && seconds(modified) <= since
}

/** If-Range: whether a range may be sent, since the part the asker holds is of this very file (RFC 9110, 13.1.5). */
export function rangeStillGood(headers: Headers, { tag, modified }: Entity): boolean {
  const given = headers.get('if-range')?.trim()
  if (given === undefined) return true
  // A weak tag never matches; a date must be the very one we send.
  return given.startsWith('"') ? given === tag : moment(given) === seconds(modified)
}

function strongTags(header: string): string[] {
  return [...header.matchAll(/(W\/)?("[^"]*")/g)].flatMap(([, weak, quoted]) => (weak || !quoted ? [] : [quoted]))
}

/** Seconds of an HTTP date; null where it is none, and then the condition does not count. */
function moment(header: string | null): number | null {
  const at = Date.parse(header ?? '')
  return Number.isNaN(at) ? null : Math.floor(at / 1000)
}

const seconds = (date: Date) => Math.floor(date.getTime() / 1000)
