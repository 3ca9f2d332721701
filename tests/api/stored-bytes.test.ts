import { describe, expect, test } from 'vitest'
import { storedBytes } from '@/app/api/stored-bytes'

const bytes = new TextEncoder().encode('0123456789')
const file = { tag: '"abc"', modified: new Date('2026-11-20T09:00:00.400Z'), bytes }
const MODIFIED = 'Fri, 20 Nov 2026 09:00:00 GMT'
const LATER = 'Sat, 21 Nov 2026 09:00:00 GMT'
const EARLIER = 'Thu, 19 Nov 2026 09:00:00 GMT'

const ask = (headers: Record<string, string>, method = 'GET') =>
  storedBytes(new Request('http://guide.example/file', { method, headers }), file, {
    'content-type': 'text/csv',
    'content-disposition': 'attachment; filename="file.csv"',
    'cache-control': 'public, max-age=31536000, immutable',
  })

describe('a stored file', () => {
  test('is sent whole with its validators, and may be kept as it is', async () => {
    const answer = ask({})
    expect(answer.status).toBe(200)
    expect(Object.fromEntries(answer.headers)).toMatchObject({
      etag: '"abc"',
      'last-modified': MODIFIED,
      'accept-ranges': 'bytes',
      'content-length': '10',
      'content-disposition': 'attachment; filename="file.csv"',
      'cache-control': 'public, max-age=31536000, immutable, no-transform',
    })
    expect(await answer.text()).toBe('0123456789')
  })

  test('is sent in part where a range is asked for', async () => {
    const answer = ask({ range: 'bytes=2-4' })
    expect(answer.status).toBe(206)
    expect(answer.headers.get('content-range')).toBe('bytes 2-4/10')
    expect(answer.headers.get('content-length')).toBe('3')
    expect(answer.headers.get('etag')).toBe('"abc"')
    expect(await answer.text()).toBe('234')
  })

  test('says how long it is to who asks past its end', () => {
    const answer = ask({ range: 'bytes=10-' })
    expect(answer.status).toBe(416)
    expect(answer.headers.get('content-range')).toBe('bytes */10')
    expect(answer.headers.get('content-type')).toMatch(/^application\/problem\+json/)
  })

  // RFC 9110, sections 13.1 and 13.2.2: which condition is looked at, and what comes of it.
  test.each([
    { headers: { 'if-none-match': '"abc"' }, status: 304 },
    { headers: { 'if-none-match': 'W/"abc"' }, status: 304 },
    { headers: { 'if-none-match': '"x", "abc"' }, status: 304 },
    { headers: { 'if-none-match': '*' }, status: 304 },
    { headers: { 'if-none-match': '"x"' }, status: 200 },
    { headers: { 'if-modified-since': MODIFIED }, status: 304 },
    { headers: { 'if-modified-since': LATER }, status: 304 },
    { headers: { 'if-modified-since': EARLIER }, status: 200 },
    { headers: { 'if-modified-since': 'yesterday-ish' }, status: 200 },
    { headers: { 'if-none-match': '"x"', 'if-modified-since': LATER }, status: 200 },
    { headers: { 'if-match': '"abc"' }, status: 200 },
    { headers: { 'if-match': '*' }, status: 200 },
    { headers: { 'if-match': '"x"' }, status: 412 },
    { headers: { 'if-match': 'W/"abc"' }, status: 412 },
    { headers: { 'if-unmodified-since': MODIFIED }, status: 200 },
    { headers: { 'if-unmodified-since': EARLIER }, status: 412 },
    { headers: { 'if-match': '"abc"', 'if-unmodified-since': EARLIER }, status: 200 },
    { headers: { 'if-match': '"x"', 'if-none-match': '"abc"' }, status: 412 },
    { headers: { range: 'bytes=0-1', 'if-range': '"abc"' }, status: 206 },
    { headers: { range: 'bytes=0-1', 'if-range': '"x"' }, status: 200 },
    { headers: { range: 'bytes=0-1', 'if-range': 'W/"abc"' }, status: 200 },
    { headers: { range: 'bytes=0-1', 'if-range': MODIFIED }, status: 206 },
    { headers: { range: 'bytes=0-1', 'if-range': LATER }, status: 200 },
    { headers: { range: 'bytes=0-1', 'if-none-match': '"abc"' }, status: 304 },
    { headers: { range: 'bytes=0-1,3-4' }, status: 200 },
  ] as { headers: Record<string, string>; status: number }[])(
    'answers $headers with $status',
    ({ headers, status }) => {
      expect(ask(headers).status).toBe(status)
    },
  )

  test('a range means nothing to HEAD', () => {
    expect(ask({ range: 'bytes=0-1' }, 'HEAD').status).toBe(200)
  })

  test('a 304 carries its validators and no words about a body', () => {
    const { headers } = ask({ 'if-none-match': '"abc"' })
    expect([...headers.keys()].sort()).toEqual(['accept-ranges', 'cache-control', 'etag', 'last-modified'])
  })

  test('pieces put together are the file', async () => {
    const parts = await Promise.all(
      [0, 3, 6, 9].map((from) => ask({ range: `bytes=${from}-${from + 2}`, 'if-range': '"abc"' }).text()),
    )
    expect(parts.join('')).toBe('0123456789')
  })
})
