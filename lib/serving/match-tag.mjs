/**
 * Whether an If-None-Match header names an entity tag, by the weak comparison the header calls for: a `W/` before the
 * quoted part does not count, and `*` names every tag (RFC 9110, sections 8.8.3.2 and 13.1.2).
 * @param {string | null | undefined} header
 * @param {string} tag the document's own strong tag with its quotes
 */
export function matchesTag(header, tag) {
  if (header === null || header === undefined) return false
  if (header.trim() === '*') return true
  return [...header.matchAll(/(?:W\/)?("[^"]*")/g)].some(([, quoted]) => quoted === tag)
}
