import { clip } from './shown'

// Strings as wholes, so that braces and colons inside them do not count; then the marks that give JSON its shape.
const TOKENS = /"(?:[^"\\]|\\.)*"|[{}[\]:,]/gs

/**
 * The first name that stands twice in one object of a JSON text, as a path with dots; null where there is none.
 * JSON.parse would silently keep the last of the two, and a question that says two things has no answer (RFC 8259,
 * section 4; RFC 7493, section 2.3).
 * @param text well-formed JSON
 */
export function findRepeatedName(text: string): string | null {
  const open: { names: Set<string> | null; at: string; index: number }[] = []
  let previous = ''
  for (const [token] of text.matchAll(TOKENS)) {
    const inside = open.at(-1)
    if (token === '{' || token === '[') open.push({ names: token === '{' ? new Set() : null, at: '0', index: 0 })
    else if (token === '}' || token === ']') open.pop()
    else if (token === ',' && inside && !inside.names) {
      inside.index += 1
      inside.at = String(inside.index)
    } else if (token === ':' && inside?.names) {
      const name = JSON.parse(previous) as string
      inside.at = clip(name)
      if (inside.names.has(name)) return open.map(({ at }) => at).join('.')
      inside.names.add(name)
    }
    previous = token
  }
  return null
}
