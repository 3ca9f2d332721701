import { describe, expect, test } from 'vitest'
import { listAnswer } from '@/app/api/v1/devices/list-answer'
import { DEVICE_LIST_PARAMETERS, deviceListQuery, deviceListSchema } from '@/lib/contract/device-list'
import { makeDevice, makeEdition, syntheticEdition } from '../fixtures/edition'

const edition = syntheticEdition(120)
const ask = (query = '', headers: HeadersInit = {}, of = edition) =>
  listAnswer(new Request(`http://bench.example/api/v1/devices${query}`, { headers }), of)
const answer = async (query = '', of = edition) => deviceListSchema.parse(await ask(query, {}, of).json())

test('the list keeps to its schema and is the lightest first', async () => {
  const { devices, total, matching, limit, pages } = await answer()
  expect([total, matching, limit, pages]).toEqual([120, 120, 50, 3])
  const lightness = devices.map(({ page }) => page.L)
  expect(lightness).toEqual(lightness.toSorted((a, b) => b - a))
})

test('its pages hold every device once, each naming the next by a link', async () => {
  const slugs: string[] = []
  let next: string | undefined = '?limit=33&sort=name'
  for (let hops = 0; next !== undefined && hops < 10; hops += 1) {
    const response = ask(next)
    const { devices } = deviceListSchema.parse(await response.json())
    slugs.push(...devices.map(({ slug }) => slug))
    // RFC 8288, section 3: <target>; rel="name", separated by commas.
    next = response.headers
      .get('link')
      ?.split(', ')
      .find((link) => link.endsWith('rel="next"'))
      ?.match(/^<\/api\/v1\/devices(\?[^>]*)>/)?.[1]
  }
  expect(slugs).toEqual(edition.devices.map(({ slug }) => slug))
})

test('the links of a page lead both ways and to both ends, and a single page has none', () => {
  const rels = (query: string) =>
    [...(ask(query).headers.get('link') ?? '').matchAll(/rel="(\w+)"/g)].map(([, rel]) => rel)
  expect(rels('?limit=50')).toEqual(['first', 'next', 'last'])
  expect(rels('?limit=50&page=2')).toEqual(['first', 'prev', 'next', 'last'])
  expect(rels('?limit=50&page=3')).toEqual(['first', 'prev', 'last'])
  expect(rels('?limit=50&page=99')).toEqual(['first', 'prev', 'last'])
  expect(rels('?q=example-0001')).toEqual([])
})

test('a page past the last is empty and says how many there are', async () => {
  expect(await answer('?page=99')).toMatchObject({ total: 120, page: 99, pages: 3, devices: [] })
})

test('a device silent on what is asked comes after those known to match, and says on what', async () => {
  const u = { L: 0.4, a: 0.1, b: 0.1 }
  const few = makeEdition([
    makeDevice({ slug: 'silent', page: { L: 76, a: 0, b: 0, u }, pen: null }),
    makeDevice({ slug: 'with', page: { L: 60, a: 0, b: 0, u }, pen: true }),
    makeDevice({ slug: 'without', pen: false }),
  ])
  const { devices, total, matching } = await answer('?pen=yes', few)
  expect([total, matching]).toEqual([2, 1])
  expect(devices.map(({ slug, notStated }) => [slug, notStated])).toEqual([
    ['with', []],
    ['silent', ['pen']],
  ])
})

describe('what is not understood is refused, naming the fields', () => {
  test.each([
    ['an unknown parameter', '?screen=6', ['screen'], 'is not known here; the parameters are q, maker'],
    ['a word for yes', '?pen=true', ['pen'], 'is not one of the choices (yes, no)'],
    ['a blank', '?pen=', ['pen'], '"" is not one of the choices'],
    ['a limit too large', '?limit=101', ['limit'], 'is not a whole number from 1 to 100'],
    ['half a page', '?page=1.5', ['page'], 'a fraction is not a whole number'],
    ['the zeroth page', '?page=0', ['page'], 'is not a whole number from 1'],
    ['a parameter given twice', '?sort=name&sort=price', ['sort'], 'is given twice; give it once'],
    ['sizes that disagree', '?min-size=8&max-size=6', ['min-size'], 'is above the largest size'],
    ['several at once', '?colour=blue&water=x&__proto__=1', ['colour', 'water', '__proto__'], ''],
  ])('%s', async (_, query, fields, words) => {
    const response = ask(query)
    expect(response.status).toBe(400)
    expect(response.headers.get('content-type')).toMatch(/^application\/problem\+json/)
    const { errors } = await response.json()
    expect(errors.map(({ field }: { field: string }) => field)).toEqual(fields)
    expect(errors[0].message).toContain(words)
  })
})

test('makers may be named one by one or together', async () => {
  const makers = makeEdition([
    makeDevice({ slug: 'a', maker: 'Ostler' }),
    makeDevice({ slug: 'b', maker: 'Tamber' }),
    makeDevice({ slug: 'c', maker: 'Wexby' }),
  ])
  const together = await answer('?maker=ostler,tamber&sort=name', makers)
  expect(together.devices.map(({ slug }) => slug)).toEqual(['a', 'b'])
  expect(await answer('?maker=Ostler&maker=Tamber&sort=name', makers)).toEqual(together)
})

// RFC 9110, section 13.1.2.
test('who has the list already is told so', () => {
  const tag = ask('?sort=price').headers.get('etag')!
  expect(tag).toMatch(/^"[0-9a-f]{64}"$/)
  expect(ask('?sort=price', { 'if-none-match': tag }).status).toBe(304)
  expect(ask('?sort=name', { 'if-none-match': tag }).status).toBe(200)
})

test('every parameter is described with a value that works', () => {
  const shape = deviceListQuery._zod.def.shape
  expect(Object.keys(DEVICE_LIST_PARAMETERS).sort()).toEqual(Object.keys(shape).sort())
  for (const [name, { example }] of Object.entries(DEVICE_LIST_PARAMETERS)) {
    expect(ask(`?${name}=${example}`).status, name).toBe(200)
  }
})
