import { expect, test } from 'vitest'
import { storedDocument } from '@/app/stored-document'

const CHANGED = new Date('2026-11-20T09:00:00.500Z')
const ask = (headers: HeadersInit = {}, changed: Date | null = CHANGED) =>
  storedDocument(new Request('http://bench.example/feed.xml', { headers }), {
    body: '<feed/>',
    type: 'application/atom+xml',
    changed,
    cacheControl: 'public, max-age=300',
  })

test('a document carries a weak tag and the date it last changed', async () => {
  const answer = ask()
  expect(answer.status).toBe(200)
  expect(await answer.text()).toBe('<feed/>')
  expect(answer.headers.get('etag')).toMatch(/^W\/"[\w-]{43}"$/)
  expect(answer.headers.get('last-modified')).toBe('Fri, 20 Nov 2026 09:00:00 GMT')
  expect(ask({}, null).headers.has('last-modified')).toBe(false)
})

// RFC 9110, 13.1.2, 13.1.3 and 13.2.2: the tag decides where both are sent; a date that is none does not count.
test('who has it already is told so without it', async () => {
  const tag = ask().headers.get('etag')!
  const date = 'Fri, 20 Nov 2026 09:00:00 GMT'
  for (const headers of [
    { 'if-none-match': tag },
    { 'if-none-match': `"other", ${tag}` },
    { 'if-modified-since': date },
    { 'if-modified-since': 'Fri, 20 Nov 2026 10:00:00 GMT' },
    { 'if-none-match': tag, 'if-modified-since': 'Thu, 19 Nov 2026 09:00:00 GMT' },
  ] as Record<string, string>[]) {
    const answer = ask(headers)
    expect(answer.status, JSON.stringify(headers)).toBe(304)
    expect(await answer.text()).toBe('')
    expect(answer.headers.get('etag')).toBe(tag)
    expect(answer.headers.get('cache-control')).toBe('public, max-age=300')
  }
  for (const headers of [
    { 'if-none-match': '"other"' },
    { 'if-none-match': '"other"', 'if-modified-since': date },
    { 'if-modified-since': 'Fri, 20 Nov 2026 08:59:59 GMT' },
    { 'if-modified-since': 'a while ago' },
  ] as Record<string, string>[])
    expect(ask(headers).status, JSON.stringify(headers)).toBe(200)
  expect(ask({ 'if-modified-since': date }, null).status).toBe(200)
})
