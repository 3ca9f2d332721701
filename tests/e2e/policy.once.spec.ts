import { expect, test } from '@playwright/test'

// Headers by the W3C's Content Security Policy Level 3, RFC 9110 and RFC 9111.

const STORED = ['/', '/devices', '/devices/tamber-reed-7', '/method', '/no/such/page']
const MADE = ['/quiz', '/quiz/result', '/compare', '/light', '/devices?sort=price', '/?lux=5']

test('a stored page allows its own inline scripts by their hashes, and nothing else inline', async ({ request }) => {
  for (const path of STORED) {
    const answer = await request.get(path)
    const policies = answer.headersArray().filter(({ name }) => name.toLowerCase() === 'content-security-policy')
    expect(policies, path).toHaveLength(1)
    expect(policies[0]?.value, path).toMatch(/script-src 'self'( 'sha256-[A-Za-z0-9+/=]{44}')+;/)
    expect(answer.headers().vary, path).toContain('Cookie')
    expect(answer.headers()['set-cookie'], path).toBeUndefined()
  }
})

test('a page made for one request has a nonce of its own, once', async ({ request }) => {
  const seen = new Set<string>()
  for (const path of [...MADE, ...MADE]) {
    const answer = await request.get(path)
    const policies = answer.headersArray().filter(({ name }) => name.toLowerCase() === 'content-security-policy')
    expect(policies, path).toHaveLength(1)
    const nonce = /script-src 'self' 'nonce-([^']+)';/.exec(policies[0]?.value ?? '')?.[1]
    expect(nonce, path).toBeTruthy()
    expect(seen.has(nonce ?? ''), `${path} repeats a nonce`).toBe(false)
    seen.add(nonce ?? '')
    expect(answer.headers()['cache-control'], path).toContain('no-store')
  }
})

test('every answer carries the headers that keep browsers from guessing and framing', async ({ request }) => {
  for (const path of [...STORED, ...MADE, '/api/v1/editions/latest', '/feed.xml', '/look', '/robots.txt']) {
    const headers = (await request.get(path)).headers()
    expect(headers['x-content-type-options'], path).toBe('nosniff')
    expect(headers['x-frame-options'], path).toBe('DENY')
    expect(headers['referrer-policy'], path).toBe('strict-origin-when-cross-origin')
    expect(headers['permissions-policy'], path).toContain('camera=()')
    expect(headers['content-security-policy'], path).not.toMatch(/unsafe-eval|script-src[^;]*unsafe-inline/)
    expect(headers['x-powered-by'], path).toBeUndefined()
  }
})

test('a stored page is told apart by its look, answers 304 to whoever has it, and comes squeezed', async ({
  request,
}) => {
  const first = await request.get('/method')
  const etag = first.headers().etag ?? ''
  expect(etag).not.toBe('')
  expect((await request.get('/method', { headers: { 'if-none-match': etag } })).status()).toBe(304)
  const night = await request.get('/method', { headers: { cookie: 'look=night-metric', 'if-none-match': etag } })
  expect(night.status()).toBe(200)
  expect(await night.text()).toContain('data-theme="night"')
  expect((await request.get('/method', { headers: { 'accept-encoding': 'br' } })).headers()['content-encoding']).toBe(
    'br',
  )
})

test('a junk look is the common one, and the process’s own door is shut to everybody else', async ({ request }) => {
  const junk = await request.get('/method', { headers: { cookie: 'look=../../etc-passwd' } })
  expect(junk.status()).toBe(200)
  expect(await junk.text()).not.toMatch(/<html[^>]*data-theme/)
  for (const key of ['', 'guess'])
    expect((await request.post('/api/internal/refresh', { headers: { 'x-lampleaf-process': key } })).status()).toBe(404)
})
