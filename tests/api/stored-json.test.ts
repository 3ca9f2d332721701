import { expect, test } from 'vitest'
import { FROZEN, storedJson } from '@/app/api/stored-json'

const ask = (headers: HeadersInit = {}) =>
  storedJson(new Request('http://bench.example/', { headers }), '{"a":1}', 'f00d', FROZEN)

test('a document carries a strong tag, may be kept for ever, and its bytes may not be changed on the way', async () => {
  const answer = ask()
  expect(answer.status).toBe(200)
  expect(await answer.text()).toBe('{"a":1}')
  expect(answer.headers.get('etag')).toBe('"f00d"')
  expect(answer.headers.get('cache-control')).toBe('public, max-age=31536000, immutable, no-transform')
  expect(answer.headers.get('content-type')).toBe('application/json; charset=utf-8')
})

// RFC 9110, section 15.4.5: a 304 repeats ETag and Cache-Control and has no body.
test('one who has the document is told so without it', async () => {
  const answer = ask({ 'if-none-match': '"f00d"' })
  expect(answer.status).toBe(304)
  expect(await answer.text()).toBe('')
  expect(answer.headers.get('etag')).toBe('"f00d"')
  expect(answer.headers.get('cache-control')).toContain('immutable')
})
