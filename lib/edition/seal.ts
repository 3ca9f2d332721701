import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import type { Edition } from '@/lib/method/types'

/**
 * SHA-256, hex, of a document's RFC 8785 canonical JSON, its own `sha256` field left out: anybody with the document and
 * a canonicaliser can work it out again.
 */
export function documentHash(document: Omit<Edition, 'sha256'> | Edition): string {
  const { sha256: _, ...rest } = document as Edition
  const text = canonicalize(rest)
  if (text === undefined) throw new Error('An edition document must be JSON')
  return createHash('sha256').update(text).digest('hex')
}
