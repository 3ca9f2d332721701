import { readdirSync, readFileSync } from 'node:fs'
import { Validator } from '@seriousme/openapi-schema-validator'
import Ajv2020 from 'ajv/dist/2020.js'
import addFormats from 'ajv-formats'
import { describe, expect, test } from 'vitest'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { curlLine, exampleRequest } from '@/lib/openapi/curl'
import { OPENAPI } from '@/lib/openapi/document'
import { fieldsOf } from '@/lib/openapi/fields'
import { QUESTIONS } from '@/lib/openapi/questions'
import { SCHEMAS } from '@/lib/openapi/schemas'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'

const operations = Object.entries(OPENAPI.paths).flatMap(([path, { get, post }]) => [
  ...(get ? [{ path, method: 'GET' as const, operation: get }] : []),
  ...(post ? [{ path, method: 'POST' as const, operation: post }] : []),
])
const ajv = new Ajv2020({ strict: false, allErrors: true })
addFormats(ajv)
const schemaOf = (name: string) => ajv.compile(SCHEMAS[name]!)

describe('the description of the API', () => {
  // The OpenAPI Initiative's own schema of 3.1, as the validator carries it.
  test('is OpenAPI 3.1', async () => {
    const validator = new Validator()
    const { valid, errors } = await validator.validate(structuredClone(OPENAPI) as never)
    expect(errors ?? []).toEqual([])
    expect(valid).toBe(true)
    expect(validator.version).toBe('3.1')
  })

  test('would be refused without a response, or with a parameter that is nowhere', async () => {
    const broken = structuredClone(OPENAPI) as unknown as { paths: Record<string, { get: Record<string, unknown> }> }
    broken.paths['/api/v1/devices']!.get.parameters = [{ name: 'q', in: 'somewhere' }]
    expect((await new Validator().validate(broken as never)).valid).toBe(false)
  })

  test('has every address and method there are, and no other', () => {
    const files = readdirSync('app/api/v1', { recursive: true, encoding: 'utf8' })
      .filter((file) => file.endsWith('/route.ts') && !file.includes('[[...rest]]'))
      .map((file) => `app/api/v1/${file}`)
    const found = files.flatMap((file) => {
      const path = `/${file
        .replace(/^app\//, '')
        .replace(/\/route\.ts$/, '')
        .replaceAll(/\[(\w+)\]/g, '{$1}')}`
      const source = readFileSync(file, 'utf8')
      return ['GET', 'POST', 'PUT', 'PATCH', 'DELETE']
        .filter((method) => new RegExp(`export (const|async function|function) ${method}\\b`).test(source))
        .map((method) => `${method} ${path}`)
    })
    expect(operations.map(({ path, method }) => `${method} ${path}`).sort()).toEqual(found.sort())
  })

  test('names each operation once and says of every parameter in its path what it is', () => {
    const ids = operations.map(({ operation }) => operation.operationId)
    expect(new Set(ids).size).toBe(ids.length)
    for (const { path, operation } of operations) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name)
      expect((operation.parameters ?? []).filter((one) => one.in === 'path').map(({ name }) => name)).toEqual(inPath)
      for (const { description, example } of operation.parameters ?? []) {
        expect(description).toMatch(/\.$/)
        expect(example).not.toBe('')
      }
    }
  })

  test('says of every field what it means and what it may be', () => {
    for (const [name, schema] of Object.entries(SCHEMAS)) {
      for (const { path, meaning, type } of fieldsOf(schema)) {
        expect(meaning, `${name} ${path}`).toMatch(/\.$/)
        expect(type, `${name} ${path}`).not.toMatch(/\bany\b/)
      }
    }
  })

  test('refers only to schemas it has', () => {
    for (const [, name] of JSON.stringify(OPENAPI.paths).matchAll(/#\/components\/schemas\/(\w+)/g))
      expect(SCHEMAS).toHaveProperty(name!)
  })
})

describe('its schemas judge as the product does', () => {
  test('the questions it prints are taken', () => {
    for (const { value } of Object.values(QUESTIONS)) {
      expect(matchRequestSchema.safeParse(value).success).toBe(true)
      expect(schemaOf('MatchRequest')(value)).toBe(true)
    }
  })

  test.each([
    { spots: [] },
    { spots: [{ lux: -1, hours: 1, frontLight: true }] },
    { lightNeed: 'a little' },
    { limits: { currency: 'pounds' } },
    { role: 'admin' },
    { edition: 'newest' },
  ])('%j is refused', (value) => {
    expect(matchRequestSchema.safeParse(value).success).toBe(false)
    expect(schemaOf('MatchRequest')(value)).toBe(false)
  })

  test('an edition document is one, and not with a field more', () => {
    const edition = makeEdition([
      makeDevice({ slug: 'a-7' }),
      makeDevice({ slug: 'b-7', frontLight: null, price: null }),
    ])
    expect(schemaOf('Edition')(edition)).toBe(true)
    expect(schemaOf('Edition')({ ...edition, more: 1 })).toBe(false)
  })
})

describe('an example', () => {
  test('fills in the path, asks what it is told to, and sends the last question printed', () => {
    const { get } = OPENAPI.paths['/api/v1/devices/{slug}/readings']!
    expect(exampleRequest('/api/v1/devices/{slug}/readings', 'GET', get!, ['limit']).path).toBe(
      '/api/v1/devices/tamber-reed-7/readings?limit=20',
    )
    const { post } = OPENAPI.paths['/api/v1/match']!
    expect(JSON.parse(exampleRequest('/api/v1/match', 'POST', post!).body!)).toEqual(QUESTIONS.bed.value)
  })

  test('is a line a shell can hold: no quote of its own inside the quotes', () => {
    for (const { path, method, operation } of operations) {
      const request = exampleRequest(path, method, operation)
      expect(`${request.path}${request.body ?? ''}`).not.toContain("'")
      expect(curlLine(request, 'https://guide.example/')).toContain(`'https://guide.example${request.path}'`)
    }
  })
})
