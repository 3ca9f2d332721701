import { describe, expect, test } from 'vitest'
import { MAX_BODY_BYTES, readJson } from '@/app/api/read-json'

const post = (body: BodyInit | null, type: string | null = 'application/json', headers: HeadersInit = {}) =>
  new Request('http://bench.example/', {
    method: 'POST',
    body,
    headers: { ...headers, ...(type === null ? {} : { 'content-type': type }) },
    // Node asks for this where a body is a stream.
    duplex: 'half',
  } as RequestInit)

async function outcome(request: Request) {
  const read = await readJson(request)
  return 'refusal' in read ? read.refusal.status : read.value
}

const bytes = (...values: number[]) => new Uint8Array(values)

describe('a body is read', () => {
  test.each([
    ['JSON', post('{"a":1}'), { a: 1 }],
    ['JSON with its charset', post('[]', 'application/json; charset=UTF-8'), []],
    ['JSON after a byte order mark', post('\uFEFF{}'), {}],
    ['JSON of exactly the longest length', post(`"${'x'.repeat(MAX_BODY_BYTES - 2)}"`), 'x'.repeat(MAX_BODY_BYTES - 2)],
  ])('%s', async (_, request, value) => {
    expect(await outcome(request)).toEqual(value)
  })
})

describe('a body is refused', () => {
  test.each([
    ['plain text', post('{}', 'text/plain'), 415],
    ['a form', post('a=1', 'application/x-www-form-urlencoded'), 415],
    ['JSON in another charset', post('{}', 'application/json; charset=latin1'), 415],
    ['a type that only begins right', post('{}', 'application/jsonp'), 415],
    ['no type', post(bytes(123, 125), null), 415],
    ['nothing', post(null), 400],
    ['half a document', post('{"a":'), 400],
    ['a comment', post('{} // sure'), 400],
    ['NaN', post('{"a":NaN}'), 400],
    ['a name given twice', post('{"a":1,"a":2}'), 400],
    // RFC 3629: C0 AF is an overlong form and FF never occurs.
    ['overlong UTF-8', post(bytes(0x22, 0xc0, 0xaf, 0x22)), 400],
    ['a byte that is not UTF-8', post(bytes(0x22, 0xff, 0x22)), 400],
    ['one byte too many', post(`"${'x'.repeat(MAX_BODY_BYTES - 1)}"`), 413],
    ['a length too large in the headers', post('{}', 'application/json', { 'content-length': '99999999' }), 413],
    ['lists in lists, 60,000 deep', post('['.repeat(60_000)), 400],
  ])('%s → %s', async (_, request, status) => {
    expect(await outcome(request)).toBe(status)
  })
})

test('an endless stream is cut off after 64 kB and told to stop', async () => {
  let pulled = 0
  let cancelled = false
  const endless = new ReadableStream<Uint8Array>({
    pull(controller) {
      pulled += 1
      controller.enqueue(new Uint8Array(4096).fill(0x20))
    },
    cancel() {
      cancelled = true
    },
  })
  expect(await outcome(post(endless))).toBe(413)
  expect(pulled).toBeLessThan(25)
  expect(cancelled).toBe(true)
})

test('lists in lists that are well-formed come back whole', async () => {
  const deep = await outcome(post(`${'['.repeat(30_000)}${']'.repeat(30_000)}`))
  expect(Array.isArray(deep)).toBe(true)
})
