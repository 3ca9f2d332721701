import { describe, expect, test } from 'vitest'
import { pageLinks } from '@/app/api/page-links'
import { readQuery } from '@/app/api/read-query'
import { deviceReadingsQuery } from '@/lib/contract/device'

const read = (search: string) => readQuery(new Request(`http://guide.example/${search}`), deviceReadingsQuery)

describe('the parameters of an address', () => {
  test('take their defaults where nothing is said', () => {
    expect(read('')).toMatchObject({ query: { page: 1, limit: 100 } })
    expect(read('?edition=2&page=3&limit=20')).toMatchObject({ query: { edition: 2, page: 3, limit: 20 } })
  })

  test.each([
    { search: '?limit=0', field: 'limit' },
    { search: '?limit=501', field: 'limit' },
    { search: '?limit=1.5', field: 'limit' },
    { search: '?page=', field: 'page' },
    { search: '?page=1e3', field: 'page' },
    { search: '?edition=latest', field: 'edition' },
    { search: '?edition=2147483648', field: 'edition' },
    { search: '?page=1&page=2', field: 'page' },
    { search: '?__proto__=1', field: '__proto__' },
    { search: '?other=1', field: 'other' },
  ])('$search is refused by the name of its field', async ({ search, field }) => {
    const found = read(search)
    if (!('refusal' in found)) throw new Error(`${search} was taken`)
    expect(found.refusal.status).toBe(400)
    expect((await found.refusal.json()).errors.map((one: { field: string }) => one.field)).toContain(field)
  })
})

// RFC 8288, section 3.3, and the relations of section 6.2.2 of HTML's registry: first, prev, next, last.
test('a list names its pages, with what else was asked', () => {
  const asked = new URLSearchParams('limit=20&page=2')
  expect(pageLinks('/x', asked, 2, 3)).toBe(
    '</x?limit=20&page=1>; rel="first", </x?limit=20&page=1>; rel="prev", </x?limit=20&page=3>; rel="next", </x?limit=20&page=3>; rel="last"',
  )
  expect(pageLinks('/x', new URLSearchParams(), 1, 1)).toBeNull()
  expect(pageLinks('/x', new URLSearchParams('page=9'), 9, 3)).toContain('</x?page=3>; rel="prev"')
})
