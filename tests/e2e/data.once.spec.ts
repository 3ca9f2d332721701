import { createHash } from 'node:crypto'
import { type APIRequestContext, type APIResponse, expect, test } from '@playwright/test'
import Ajv2020 from 'ajv/dist/2020.js'
import addFormats from 'ajv-formats'
import fc from 'fast-check'
import { exampleRequest } from '@/lib/openapi/curl'
import type { OpenApi, Operation } from '@/lib/openapi/types'
import { readCsv } from '@/tests/dataset/read-csv'
import { recompute } from '@/tests/dataset/recompute'
import { fromAddress } from './site'

const DATA = '/data/3'

/** The files of an edition by name, as its checksums list them. */
async function download(request: APIRequestContext, edition: number): Promise<Map<string, Buffer>> {
  const sums = (await (await request.get(`/data/${edition}/SHA256SUMS.txt`)).text()).trimEnd().split('\n')
  const files = new Map<string, Buffer>()
  for (const line of sums) {
    const [, sha256, name] = /^([0-9a-f]{64}) {2}(\S+)$/.exec(line)!
    const answer = await request.get(`/data/${edition}/${name}`)
    expect(answer.status(), name).toBe(200)
    const bytes = await answer.body()
    expect(createHash('sha256').update(bytes).digest('hex'), name).toBe(sha256)
    expect(answer.headers().etag, name).toBe(`"${sha256}"`)
    files.set(name!, bytes)
  }
  return files
}

test.describe('the downloads', () => {
  for (const edition of [1, 2, 3]) {
    test(`of edition ${edition} are the files its checksums name, and give its published lightness again`, async ({
      request,
    }) => {
      const files = await download(request, edition)
      const { devices } = recompute((name) => files.get(name)!.toString('utf8'))
      const document = await (await request.get(`/api/v1/editions/${edition}`)).json()
      expect(devices).toHaveLength(document.devices.length)
      for (const { slug, page } of document.devices) {
        expect(devices.find(({ device }) => device === slug)!.values.page_l).toBeCloseTo(page.L, 9)
      }
    })
  }

  test('come with the right type, a safe name, and may be kept for ever', async ({ request }) => {
    for (const [name, type] of [
      ['figures.csv', 'text/csv; charset=utf-8; header=present'],
      ['figures.json', 'application/json; charset=utf-8'],
      ['datapackage.json', 'application/json; charset=utf-8'],
      ['csv-metadata.json', 'application/csvm+json; charset=utf-8'],
      ['SHA256SUMS.txt', 'text/plain; charset=utf-8'],
    ]) {
      const headers = (await request.get(`${DATA}/${name}`)).headers()
      expect(headers['content-type']).toBe(type)
      expect(headers['content-disposition']).toBe(`attachment; filename="lampleaf-edition-3-${name}"`)
      expect(headers['cache-control']).toBe('public, max-age=31536000, immutable, no-transform')
      expect(headers['x-content-type-options']).toBe('nosniff')
      expect(headers['set-cookie']).toBeUndefined()
      expect(headers['accept-ranges']).toBe('bytes')
    }
    const { link } = (await request.get(`${DATA}/figures.csv`)).headers()
    expect(link).toBe('<csv-metadata.json>; rel="describedby"; type="application/csvm+json"')
  })

  test('can be had in pieces, taken up again and asked for by what one has', async ({ request }) => {
    const address = `${DATA}/readings.csv`
    const whole = await request.get(address)
    const { etag, 'last-modified': modified } = whole.headers()
    const length = (await whole.body()).length
    const part = (range: string, more = {}) => request.get(address, { headers: { range, ...more } })

    const head = await part('bytes=0-999')
    expect([head.status(), head.headers()['content-range']]).toEqual([206, `bytes 0-999/${length}`])
    const rest = await part('bytes=1000-', { 'if-range': etag! })
    expect(rest.status()).toBe(206)
    expect(Buffer.concat([await head.body(), await rest.body()]).equals(await whole.body())).toBe(true)
    expect((await part('bytes=0-9', { 'if-range': '"another"' })).status()).toBe(200)
    const past = await part(`bytes=${length}-`)
    expect([past.status(), past.headers()['content-range']]).toEqual([416, `bytes */${length}`])

    const asked = (headers: Record<string, string>) => request.get(address, { headers })
    expect((await asked({ 'if-none-match': etag! })).status()).toBe(304)
    expect((await asked({ 'if-modified-since': modified! })).status()).toBe(304)
    expect((await asked({ 'if-match': '"another"' })).status()).toBe(412)
    expect((await asked({ 'if-match': etag! })).status()).toBe(200)
    const only = await request.head(address)
    expect([only.status(), only.headers().etag, (await only.body()).length]).toEqual([200, etag, 0])
  })

  test('that are not there are told so, whatever is asked for', async ({ request }) => {
    for (const path of [
      '/data/3/nope.csv',
      '/data/4/figures.csv',
      '/data/0/figures.csv',
      '/data/01/figures.csv',
      '/data/2147483648/figures.csv',
      '/data/x/figures.csv',
      '/data/3/..%2Ffigures.csv',
      '/data/3/figures.csv%00.txt',
      '/data/3/constructor.csv',
    ]) {
      const answer = await request.get(path)
      expect(answer.status(), path).toBe(404)
      expect(answer.headers()['cache-control'] ?? '', path).not.toContain('immutable')
    }
    const odd = fc.string({ unit: 'binary', minLength: 1, maxLength: 20 })
    for (const text of fc.sample(odd, { numRuns: 40, seed: 20_261_201 })) {
      for (const path of [
        `/data/3/${encodeURIComponent(text)}.csv`,
        `/data/${encodeURIComponent(text)}/figures.csv`,
        `/data/${encodeURIComponent(text)}`,
      ]) {
        expect((await request.get(path)).status(), path).toBeLessThan(500)
      }
    }
  })

  test('name the site in their citation, and none of their bytes', async ({ request }) => {
    const cff = await (await request.get(`${DATA}/CITATION.cff`)).text()
    expect(cff).toContain('license: "CC-BY-4.0"')
    expect(cff).toMatch(/url: "https?:\/\/[^"]+\/data\/3"/)
    for (const [name, bytes] of await download(request, 3)) {
      expect(bytes.toString('utf8').match(/https?:\/\/(localhost|127\.0\.0\.1)/), name).toBeNull()
    }
  })
})

test.describe('pages of other sites', () => {
  const origin = { origin: 'https://elsewhere.example' }

  test('may read the data and the API, and learn why not', async ({ request }) => {
    for (const path of [
      `${DATA}/figures.csv`,
      '/api/v1/editions',
      '/api/v1/editions/3',
      '/api/v1/devices',
      '/api/v1/devices/tamber-reed-7',
      '/api/v1/openapi.json',
      '/api/v1/nothing',
      '/data/9/figures.csv',
    ]) {
      const { 'access-control-allow-origin': allowed, 'access-control-allow-credentials': credentials } = (
        await request.get(path, { headers: origin })
      ).headers()
      expect([allowed, credentials], path).toEqual(['*', undefined])
    }
    const preflight = await request.fetch(`${DATA}/figures.csv`, {
      method: 'OPTIONS',
      headers: { ...origin, 'access-control-request-method': 'GET', 'access-control-request-headers': 'range' },
    })
    expect(preflight.status()).toBe(204)
    expect(preflight.headers()['access-control-allow-headers']).toContain('Range')
  })

  test('may not have rankings worked out in their visitors’ browsers', async ({ request }) => {
    const preflight = await request.fetch('/api/v1/match', {
      method: 'OPTIONS',
      headers: { ...origin, 'access-control-request-method': 'POST' },
    })
    expect(preflight.headers()['access-control-allow-origin']).toBeUndefined()
    const answer = await request.post('/api/v1/match', { data: {}, headers: origin })
    expect(answer.headers()['access-control-allow-origin']).toBeUndefined()
  })
})

test.describe('the description of the API', () => {
  test('is kept to by every address: each example of each parameter is answered as it says', async ({ request }) => {
    const described = (await (await request.get('/api/v1/openapi.json')).json()) as OpenApi
    const ajv = new Ajv2020({ strict: false, allErrors: true })
    addFormats(ajv)
    ajv.addSchema({ $id: 'api', ...described })
    const check = async (path: string, method: 'GET' | 'POST', operation: Operation, asked: string[]) => {
      const { path: address, body } = exampleRequest(path, method, operation, asked)
      const answer = await request.fetch(address, {
        method,
        ...(body && { data: body, headers: { 'content-type': 'application/json' } }),
      })
      expect(answer.status(), address).toBe(200)
      const { schema } = operation.responses[200]!.content!['application/json']!
      const validate = ajv.compile(schema.$ref ? { $ref: `api${schema.$ref}` } : schema)
      if (!validate(await answer.json())) throw new Error(`${address}: ${ajv.errorsText(validate.errors)}`)
      for (const name of Object.keys(operation.responses[200]!.headers ?? {})) {
        // A list of one page names no other.
        if (name !== 'Link') expect(answer.headers()[name.toLowerCase()], `${address} ${name}`).toBeTruthy()
      }
    }
    for (const [path, { get, post }] of Object.entries(described.paths)) {
      if (post) await check(path, 'POST', post, [])
      if (!get) continue
      await check(path, 'GET', get, [])
      for (const { name, in: where } of get.parameters ?? [])
        if (where === 'query') await check(path, 'GET', get, [name])
    }
  })

  test('describes what goes wrong, too', async ({ request }) => {
    const described = (await (await request.get('/api/v1/openapi.json')).json()) as OpenApi
    const validate = new Ajv2020({ strict: false }).compile(described.components.schemas.Problem!)
    for (const [path, status] of [
      ['/api/v1/devices?sort=nonsense', 400],
      ['/api/v1/devices/no-such-device', 404],
      ['/api/v1/devices/tamber-reed-7?edition=99', 404],
      ['/api/v1/devices/tamber-reed-7/readings?limit=0', 400],
      ['/api/v1/editions/99', 404],
    ] as const) {
      const answer = await request.get(path)
      expect(answer.status(), path).toBe(status)
      expect(answer.headers()['content-type']).toBe('application/problem+json; charset=utf-8')
      expect(validate(await answer.json()), path).toBe(true)
    }
  })

  test('leads through the readings of a device page by page, and they are those of the download', async ({
    request,
  }) => {
    const found: string[] = []
    let address: string | undefined = '/api/v1/devices/tamber-reed-7/readings?edition=3&limit=20'
    while (address) {
      const answer: APIResponse = await request.get(address)
      const { readings } = await answer.json()
      found.push(...readings.map(({ set, ordinal, L }: Record<string, number>) => `${set} ${ordinal} ${L}`))
      address = /<([^>]+)>; rel="next"/.exec(answer.headers().link ?? '')?.[1]
    }
    const file = async (name: string) => readCsv(await (await request.get(`${DATA}/${name}.csv`)).text())
    const own = new Set((await file('sets')).filter(({ device }) => device === 'tamber-reed-7').map(({ set }) => set))
    const rows = (await file('readings')).filter(({ set }) => own.has(set))
    expect(found).toEqual(rows.map(({ set, ordinal, l }) => `${set} ${ordinal} ${Number(l)}`))
  })
})

test('before the first release there is nothing to load, and a device is not known', async ({ request }) => {
  const empty = fromAddress('EMPTY_URL')
  for (const path of [
    '/data/1/figures.csv',
    '/api/v1/devices/tamber-reed-7',
    '/api/v1/devices/tamber-reed-7/readings',
  ]) {
    expect((await request.get(`${empty}${path}`)).status(), path).toBe(404)
  }
  expect((await request.get(`${empty}/api/v1/openapi.json`)).status()).toBe(200)
})

test('while the database is away a download says so, and when to come back', async ({ request }) => {
  const answer = await request.get(`${fromAddress('DOWN_URL')}/data/1/figures.csv`)
  expect(answer.status()).toBe(503)
  expect(Number(answer.headers()['retry-after'])).toBeGreaterThan(0)
  expect(answer.headers()['cache-control']).toBe('no-store')
})
