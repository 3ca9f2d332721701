import { createHash } from 'node:crypto'

// Plain JavaScript: the server loads the page cache, which needs this, before anything of ours is compiled.

/** Everything but scripts: from this site alone. Sheets and charts carry their measured colours in style attributes. */
const REST = [
  "default-src 'none'",
  "style-src 'self' 'unsafe-inline'",
  "img-src 'self' data:",
  "font-src 'self'",
  "connect-src 'self'",
  "manifest-src 'self'",
  "worker-src 'self'",
  "form-action 'self'",
  "base-uri 'none'",
  "object-src 'none'",
  "frame-ancestors 'none'",
]

/**
 * The Content-Security-Policy of a page (W3C CSP Level 3).
 * @param {readonly string[]} scripts the sources inline scripts may have: `'nonce-…'` or `'sha256-…'`; none by default
 */
export function contentSecurityPolicy(scripts = []) {
  return [`script-src ${["'self'", ...scripts].join(' ')}`, ...REST].join('; ')
}

/**
 * Headers every answer carries. A page brings a policy that knows its scripts; whatever does not may run none inline.
 * @type {readonly { key: string, value: string }[]}
 */
export const SECURITY_HEADERS = [
  { key: 'Content-Security-Policy', value: contentSecurityPolicy() },
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=()' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
]

/** A data block, such as structured data, is never executed and needs no permission (HTML standard, 4.12.1). */
const isData = (attributes) => /\stype="(?!module"|text\/javascript")/.test(attributes)

/**
 * The hash sources of every inline script in a page, each once: the SHA-256 of the bytes between the tags.
 * @param {string} html a page as the renderer wrote it, which escapes `</script` inside scripts
 */
export function inlineScriptHashes(html) {
  const hashes = new Set()
  for (const [, attributes = '', body = ''] of html.matchAll(/<script\b([^>]*)>([\s\S]*?)<\/script>/g)) {
    if (/\ssrc=/.test(attributes) || isData(attributes) || body === '') continue
    hashes.add(`'sha256-${createHash('sha256').update(body).digest('base64')}'`)
  }
  return [...hashes]
}
