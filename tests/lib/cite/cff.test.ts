import Ajv from 'ajv'
import addFormats from 'ajv-formats'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { parse } from 'yaml'
import { citationCff } from '@/lib/cite/cff'
import schema from '@/tests/schemas/cff-1.2.0.json'
import { AWKWARD, EDITION } from './works'

// The schema the format's authors published; its source stands in tests/schemas/README.md.
const ajv = addFormats(new Ajv({ strict: false }))
const isCff = ajv.compile(schema)

test.each([
  { name: 'an edition', work: EDITION },
  { name: 'a work full of odd characters', work: { ...AWKWARD, url: 'https://lampleaf.example/a_b?c=%20&d=e#f' } },
])('the citation file of $name holds to the published schema', ({ work }) => {
  const file = parse(citationCff(work))
  expect(isCff(file), JSON.stringify(isCff.errors)).toBe(true)
  expect(file).toMatchObject({
    'cff-version': '1.2.0',
    type: 'dataset',
    title: work.title,
    version: String(work.edition),
    'date-released': work.publishedOn,
    url: work.url,
    authors: work.authors.map((name) => ({ name })),
  })
  expect(file.license).toBe(work.licence)
})

test('the schema refuses what the format does not allow, so the check above can fail', () => {
  expect(isCff({ ...parse(citationCff(EDITION)), 'date-released': '20 November 2026' })).toBe(false)
  expect(isCff({ ...parse(citationCff(EDITION)), license: 'our own' })).toBe(false)
})

test('whatever a title and a name hold, YAML gives it back unchanged', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme' }), fc.string({ unit: 'binary' }), (title, name) => {
      const file = parse(citationCff({ ...EDITION, title, authors: [name] }))
      expect(file.title).toBe(title)
      expect(file.authors).toEqual([{ name }])
    }),
  )
})
