import { describe, expect, test } from 'vitest'
import { parseConfig } from '@/lib/config'

const database = { DATABASE_URL: 'postgres://lampleaf@127.0.0.1:54329/lampleaf' }

describe('the configuration', () => {
  test('names every variable that is missing, and the first line says the site cannot start', () => {
    expect(() => parseConfig({})).toThrow(/cannot start/)
    expect(() => parseConfig({})).toThrow(/DATABASE_URL: is missing/)
  })

  test('outside the demo a missing base URL refuses by name', () => {
    expect(() => parseConfig(database)).toThrow(/BASE_URL: is missing/)
    expect(() => parseConfig({ ...database, BASE_URL: '' })).toThrow(/BASE_URL: is missing/)
  })

  test('in the demo the base URL is the loopback port', () => {
    expect(parseConfig({ ...database, LAMPLEAF_DEMO: '1', PORT: '4100' }).baseUrl).toBe('http://127.0.0.1:4100')
  })

  test.each([
    ['a path', 'https://pages.example/guide'],
    ['a query', 'https://pages.example/?a=1'],
    ['another scheme', 'ftp://pages.example'],
    ['no scheme', 'pages.example'],
  ])('a base URL with %s is refused by name', (_, BASE_URL) => {
    expect(() => parseConfig({ ...database, BASE_URL })).toThrow(/BASE_URL/)
  })

  test.each(['0', '101', 'ten', 'NaN', '-1', '2.5'])('a pool of %s connections is refused by name', (DATABASE_POOL) => {
    expect(() => parseConfig({ ...database, LAMPLEAF_DEMO: '1', DATABASE_POOL })).toThrow(/DATABASE_POOL/)
  })

  test('never repeats the database password in a refusal', () => {
    expect(() => parseConfig({ DATABASE_URL: 'mysql://me:hunter2@x/y' })).toThrow(
      /^(?![\s\S]*hunter2)[\s\S]*DATABASE_URL/,
    )
  })
})
