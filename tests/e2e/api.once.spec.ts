import { createHash } from 'node:crypto'
import { type APIRequestContext, type APIResponse, expect, test } from '@playwright/test'
import canonicalize from 'canonicalize'
import fc from 'fast-check'
import { editionListSchema, editionSchema } from '@/lib/contract/edition'
import { matchAnswerSchema, problemSchema } from '@/lib/contract/match-answer'
import { fromAddress } from './site'

const EDITIONS = '/api/v1/editions'
const MATCH = '/api/v1/match'
/** The field named where the body as a whole is wrong. */
const WHOLE_BODY = ''
const SPOT = { lux: 80, hours: 5, frontLight: true }

/** A refusal in its one shape, with the status in the body, too; its fields. */
async function fieldsOf(answer: APIResponse, status: number): Promise<string[]> {
  expect(answer.status()).toBe(status)
  expect(answer.headers()['content-type']).toMatch(/^application\/problem\+json/)
  expect(answer.headers()['cache-control']).toBe('no-store')
  const problem = problemSchema.parse(await answer.json())
  expect(problem.status).toBe(status)
  return problem.errors.map(({ field }) => field)
}

const ask = (request: APIRequestContext, body: string, type = 'application/json') =>
  request.post(MATCH, { data: Buffer.from(body), headers: { 'content-type': type } })

test.describe('editions', () => {
  test('the list names every released edition, newest first, with the address of its document', async ({ request }) => {
    const answer = await request.get(EDITIONS)
    expect(answer.headers()['cache-control']).toContain('must-revalidate')
    const { editions } = editionListSchema.parse(await answer.json())
    expect(editions.map(({ number }) => number)).toEqual([3, 2, 1])
    for (const { href, number, sha256 } of editions) {
      const edition = editionSchema.parse(await (await request.get(href)).json())
      expect(edition).toMatchObject({ number, sha256 })
    }
  })

  // RFC 8785 by the canonicalize package, SHA-256 by Node: anyone can repeat it with the document alone.
  test('the fingerprint of an edition is that of its own text', async ({ request }) => {
    const { sha256, ...document } = await (await request.get(`${EDITIONS}/1`)).json()
    expect(createHash('sha256').update(canonicalize(document)!).digest('hex')).toBe(sha256)
  })

  test('the latest edition is the one with the highest number', async ({ request }) => {
    const latest = await request.get(`${EDITIONS}/latest`)
    const numbered = await request.get(`${EDITIONS}/3`)
    expect(await latest.text()).toBe(await numbered.text())
    expect(latest.headers()['cache-control']).toMatch(/^public, max-age=60, must-revalidate/)
    expect(numbered.headers()['cache-control']).toMatch(/^public, max-age=31536000, immutable/)
  })

  // RFC 9110, sections 8.8.3 and 13.1.2.
  test('a strong tag spares the second download', async ({ request }) => {
    for (const path of [EDITIONS, `${EDITIONS}/latest`, `${EDITIONS}/2`]) {
      const first = await request.get(path)
      const tag = first.headers().etag!
      expect(tag).toMatch(/^"[0-9a-f]{64}"$/)
      for (const known of [tag, `W/${tag}`, `"other", ${tag}`, '*']) {
        const again = await request.get(path, { headers: { 'if-none-match': known } })
        expect(again.status(), `${path} with ${known}`).toBe(304)
        expect(again.headers().etag).toBe(tag)
        expect(await again.text()).toBe('')
      }
      expect((await request.get(path, { headers: { 'if-none-match': '"other"' } })).status()).toBe(200)
    }
    const { sha256 } = await (await request.get(`${EDITIONS}/2`)).json()
    expect((await request.get(`${EDITIONS}/2`)).headers().etag).toBe(`"${sha256}"`)
  })

  test('HEAD answers as GET does, without the document', async ({ request }) => {
    const [head, get] = [await request.head(`${EDITIONS}/latest`), await request.get(`${EDITIONS}/latest`)]
    expect(head.status()).toBe(200)
    expect(head.headers().etag).toBe(get.headers().etag)
    expect(head.headers()['cache-control']).toBe(get.headers()['cache-control'])
    expect((await head.body()).length).toBe(0)
  })

  test('no cookie is set', async ({ request }) => {
    for (const path of [EDITIONS, `${EDITIONS}/latest`, `${EDITIONS}/1`]) {
      expect((await request.get(path)).headers()['set-cookie']).toBeUndefined()
    }
  })

  for (const name of [
    '0',
    '01',
    '-1',
    '1.0',
    '1e0',
    '4',
    '2147483648',
    '9'.repeat(400),
    'first',
    '%00',
    '%F0%9F%93%96',
    '1%20',
    "1'--",
  ]) {
    test(`there is no edition “${name.slice(0, 20)}”`, async ({ request }) => {
      await fieldsOf(await request.get(`${EDITIONS}/${name}`), 404)
    })
  }
})

test.describe('methods', () => {
  for (const [path, allow] of [
    [EDITIONS, 'GET, HEAD, OPTIONS'],
    [`${EDITIONS}/latest`, 'GET, HEAD, OPTIONS'],
    [`${EDITIONS}/1`, 'GET, HEAD, OPTIONS'],
    [MATCH, 'POST, OPTIONS'],
  ] as const) {
    test(`${path} answers ${allow} and says so to the rest`, async ({ request }) => {
      for (const method of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE']) {
        if (allow.includes(method)) continue
        const answer = await request.fetch(path, { method })
        await fieldsOf(answer, 405)
        expect(answer.headers().allow).toBe(allow)
      }
      const options = await request.fetch(path, { method: 'OPTIONS' })
      expect([options.status(), options.headers().allow]).toEqual([204, allow])
    })
  }

  test('an address the API does not have is a problem, not a page', async ({ request }) => {
    for (const path of ['/api/v1', '/api/v1/makers', '/api/v1/match/1']) {
      await fieldsOf(await request.get(path), 404)
    }
  })
})

test.describe('a question', () => {
  test('the one printed in the method gets an answer that holds to the contract', async ({ request }) => {
    const answer = await request.post(MATCH, {
      data: {
        edition: 'latest',
        spots: [{ lux: 80, hours: 7, frontLight: true }],
        lightNeed: 'usual',
        text: 'normal',
        preferredWhite: 'neutral',
        aims: [['clarity'], ['whiteness', 'tint'], ['handling']],
        reads: { novels: 3, articles: 1 },
        hold: 'two-hands',
        limits: { budget: 60_000, currency: 'GBP', minDiagonal: 5, maxDiagonal: 14, frontLight: true },
      },
    })
    expect(answer.status()).toBe(200)
    expect(answer.headers()['cache-control']).toBe('no-store')
    expect(answer.headers()['content-type']).toMatch(/^application\/json/)
    expect(answer.headers()['set-cookie']).toBeUndefined()
    const body = matchAnswerSchema.parse(await answer.json())
    expect(body).toMatchObject({ edition: 3, method: 1, assumed: [] })
    expect(body.ranked.length).toBeGreaterThan(3)
    for (const { fit, contributions } of body.ranked) {
      expect(Object.values(contributions).reduce((sum, part) => sum + part, 0)).toBeCloseTo(fit, 9)
    }
    // Every device is either ranked or excluded, and never both.
    const { devices } = await (await request.get(`${EDITIONS}/latest`)).json()
    const named = [...body.ranked, ...body.excluded].map(({ slug }) => slug)
    expect(named.sort()).toEqual(devices.map(({ slug }: { slug: string }) => slug).sort())
  })

  test('an empty one is answered with every default, each named', async ({ request }) => {
    const body = matchAnswerSchema.parse(await (await request.post(MATCH, { data: {} })).json())
    expect(body.assumed).toEqual([
      'edition',
      'spots',
      'lightNeed',
      'text',
      'preferredWhite',
      'aims',
      'reads',
      'hold',
      'limits',
    ])
    expect(body.ranked).toHaveLength(16)
  })

  test('the same one has the same answer, whatever else was asked between', async ({ request }) => {
    const question = { spots: [{ ...SPOT, lux: 123 }], edition: 2 }
    const first = await (await request.post(MATCH, { data: question })).text()
    await request.post(MATCH, { data: { spots: [{ ...SPOT, lux: 124 }] } })
    expect(await (await request.post(MATCH, { data: question })).text()).toBe(first)
  })

  test('a budget without a currency is in pounds, and the answer says so', async ({ request }) => {
    const ask = async (limits: object) =>
      matchAnswerSchema.parse(await (await request.post(MATCH, { data: { limits } })).json())
    const assumed = await ask({ budget: 20_000 })
    expect(assumed.assumed).toContain('limits.currency')
    expect(assumed.excluded.length).toBeGreaterThan(0)
    expect(assumed.ranked).toEqual((await ask({ budget: 20_000, currency: 'GBP' })).ranked)
  })

  test('limits that no device meets have a truthful empty answer', async ({ request }) => {
    const answer = await request.post(MATCH, { data: { limits: { maxDiagonal: 1 } } })
    const body = matchAnswerSchema.parse(await answer.json())
    expect(body.ranked).toEqual([])
    expect(body.excluded).toHaveLength(16)
    expect(body.nearMisses).toHaveLength(16)
  })

  test('a place where nothing can be read has fits of 0, not an error', async ({ request }) => {
    const body = matchAnswerSchema.parse(
      await (await request.post(MATCH, { data: { spots: [{ lux: 0, hours: 1, frontLight: false }] } })).json(),
    )
    for (const { fit, unreadable } of body.ranked) expect([fit, unreadable]).toEqual([0, 1])
  })

  test('an edition that was never released is a problem that names the field', async ({ request }) => {
    expect(await fieldsOf(await request.post(MATCH, { data: { edition: 99 } }), 404)).toEqual(['edition'])
  })
})

test.describe('a question that is not one', () => {
  const spots = (spot: string) => `{"spots":[${spot}]}`
  for (const { name, body, status = 400, fields, type } of [
    { name: 'nothing', body: '' },
    { name: 'half a document', body: '{"spots":[' },
    { name: 'NaN', body: spots('{"lux":NaN,"hours":1,"frontLight":true}') },
    { name: 'a list', body: '[]', fields: [''] },
    { name: 'null', body: 'null', fields: [''] },
    { name: 'a word', body: '"clarity"', fields: [''] },
    { name: 'no spots', body: '{"spots":[]}', fields: ['spots'] },
    { name: 'all hours 0', body: spots('{"lux":80,"hours":0,"frontLight":true}'), fields: ['spots'] },
    { name: 'negative hours', body: spots('{"lux":80,"hours":-1,"frontLight":true}'), fields: ['spots.0.hours'] },
    { name: 'endless light', body: spots('{"lux":1e999,"hours":1,"frontLight":true}'), fields: ['spots.0.lux'] },
    { name: 'a light in words', body: spots('{"lux":"80","hours":1,"frontLight":true}'), fields: ['spots.0.lux'] },
    { name: 'a spot without its light', body: spots('{"hours":1,"frontLight":true}'), fields: ['spots.0.lux'] },
    {
      name: 'an unknown aim',
      body: '{"aims":[["speed"],["whiteness","tint","clarity","handling"]]}',
      fields: ['aims.0.0'],
    },
    {
      name: 'an aim twice',
      body: '{"aims":[["clarity"],["clarity","whiteness","tint","handling"]]}',
      fields: ['aims'],
    },
    { name: 'an aim left out', body: '{"aims":[["clarity"]]}', fields: ['aims'] },
    {
      name: 'weights that are all 0',
      body: '{"weights":{"clarity":0,"whiteness":0,"tint":0,"handling":0}}',
      fields: ['weights'],
    },
    { name: 'an unknown field', body: '{"role":"admin"}', fields: ['role'] },
    { name: 'a name of the prototype', body: '{"__proto__":{"lightNeed":"more"}}', fields: ['__proto__'] },
    { name: 'another', body: '{"constructor":{"prototype":{}}}', fields: ['constructor'] },
    { name: 'a name given twice', body: '{"lightNeed":"usual","lightNeed":"more"}', fields: ['lightNeed'] },
    { name: 'an edition larger than a database’s numbers', body: '{"edition":2147483648}', fields: ['edition'] },
    { name: 'U+0000', body: '{"limits":{"formats":["EP\\u0000UB"]}}', fields: ['limits.formats.0'] },
    { name: 'half a surrogate pair', body: '{"lightNeed":"\\ud800"}', fields: ['lightNeed'] },
    {
      name: 'lists in lists, 15,000 deep',
      body: `{"spots":${'['.repeat(15_000)}${']'.repeat(15_000)}}`,
      fields: ['spots.0'],
    },
    {
      name: 'objects in objects, 10,000 deep',
      body: `{"limits":${'{"a":'.repeat(10_000)}1${'}'.repeat(10_000)}}`,
      fields: ['limits.a'],
    },
    { name: 'a thousand spots', body: JSON.stringify({ spots: Array(1000).fill(SPOT) }), fields: ['spots'] },
    { name: 'a megabyte', body: `{"a":"${'x'.repeat(1_000_000)}"}`, status: 413 },
    { name: 'plain text', body: '{}', type: 'text/plain', status: 415 },
    { name: 'a form', body: 'lux=80', type: 'application/x-www-form-urlencoded', status: 415 },
  ] as { name: string; body: string; status?: number; fields?: string[]; type?: string }[]) {
    test(`${name} is refused with ${status}`, async ({ request }) => {
      expect(await fieldsOf(await ask(request, body, type), status)).toEqual(fields ?? [WHOLE_BODY])
    })
  }
})

test('no input makes a server error: 300 bodies and 120 addresses by chance', async ({ request }) => {
  test.setTimeout(120_000)
  const seed = 20_261_201
  const field = fc.constantFrom('spots', 'aims', 'weights', 'limits', 'reads', 'edition', 'hold', '__proto__', '\u0000')
  const bodies = fc.oneof(
    fc.jsonValue().map((value) => JSON.stringify(value)),
    fc.dictionary(field, fc.jsonValue()).map((value) => JSON.stringify(value)),
    fc.string({ unit: 'binary', maxLength: 200 }),
  )
  for (const body of fc.sample(bodies, { numRuns: 300, seed })) {
    expect((await ask(request, body)).status(), body).toBeLessThan(500)
  }
  // Whole code points only: half a surrogate pair cannot be in an address.
  const odd = fc.string({ unit: 'binary', minLength: 1, maxLength: 30 })
  const paths = fc.oneof(
    odd.map((text) => `/api/v1/editions/${encodeURIComponent(text)}`),
    odd.map((text) => `/devices/${encodeURIComponent(text)}`),
    odd.map((text) => `/devices?sort=${encodeURIComponent(text)}&order=${encodeURIComponent(text)}`),
    odd.map((text) => `/?lux=${encodeURIComponent(text)}`),
  )
  const some = fc.sample(paths, { numRuns: 120, seed })
  for (let i = 0; i < some.length; i += 8) {
    const answers = await Promise.all(some.slice(i, i + 8).map((path) => request.get(path)))
    for (const answer of answers) expect(answer.status(), answer.url()).toBeLessThan(500)
  }
})

test.describe('before the first release', () => {
  const empty = fromAddress('EMPTY_URL')

  test('the latest edition and a question are told that there is none yet, and the list is empty', async ({
    request,
  }) => {
    await fieldsOf(await request.get(`${empty}${EDITIONS}/latest`), 404)
    await fieldsOf(await request.post(`${empty}${MATCH}`, { data: {} }), 404)
    expect(await (await request.get(`${empty}${EDITIONS}`)).json()).toEqual({ editions: [] })
  })
})

test.describe('while the database is away', () => {
  const down = fromAddress('DOWN_URL')

  test('every address says so within its deadline, and when to come back', async ({ request }) => {
    for (const path of [EDITIONS, `${EDITIONS}/latest`, `${EDITIONS}/1`]) {
      const answer = await request.get(`${down}${path}`)
      await fieldsOf(answer, 503)
      expect(Number(answer.headers()['retry-after'])).toBeGreaterThan(0)
    }
    await fieldsOf(await request.post(`${down}${MATCH}`, { data: {} }), 503)
  })

  test('a wrong question is still told what is wrong', async ({ request }) => {
    expect(await fieldsOf(await request.post(`${down}${MATCH}`, { data: { spots: [] } }), 400)).toEqual(['spots'])
  })
})
