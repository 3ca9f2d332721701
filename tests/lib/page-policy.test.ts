import { createHash } from 'node:crypto'
import { describe, expect, test } from 'vitest'
import { contentSecurityPolicy, inlineScriptHashes } from '@/lib/page-policy.mjs'

describe('the policy of a page (W3C Content Security Policy Level 3)', () => {
  test('an inline script is allowed by the hash of what stands between its tags', () => {
    // The example of the specification, section 2.3.1 and its "Usage" text, from memory.
    const hash = "'sha256-qznLcsROx4GACP2dm0UCKCzCG+HiZ1guq6ZZDob/Tng='"
    expect(inlineScriptHashes("<p>a</p><script>alert('Hello, world.');</script>")).toEqual([hash])
    expect(contentSecurityPolicy([hash])).toContain(`script-src 'self' ${hash};`)
  })

  test('each script counts once, files and data blocks not at all', () => {
    const html = [
      '<script src="/a.js" async=""></script>',
      '<script type="application/ld+json">{"a":1}</script>',
      '<script id="x">one()\n</script>',
      '<script id="y">one()\n</script>',
      '<script type="module">two()</script>',
    ].join('')
    const of = (text: string) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`
    expect(inlineScriptHashes(html)).toEqual([of('one()\n'), of('two()')])
  })

  test('nothing may be loaded from elsewhere, framed, or run without a hash or a nonce', () => {
    const policy = contentSecurityPolicy()
    expect(policy).toContain("script-src 'self';")
    expect(policy).toContain("default-src 'none'")
    for (const wall of ["object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'", "form-action 'self'"])
      expect(policy).toContain(wall)
    expect(policy).not.toMatch(/script-src[^;]*unsafe|unsafe-eval|https?:|\*/)
  })
})
