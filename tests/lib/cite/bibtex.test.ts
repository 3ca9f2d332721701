import { parse } from '@retorquere/bibtex-parser'
import { expect, test } from 'vitest'
import { citationBibtex } from '@/lib/cite/bibtex'
import { AWKWARD, EDITION } from './works'

// Read back by @retorquere/bibtex-parser, which turns TeX into the characters it stands for.
test('a parser of BibTeX reads the entry of an edition as we mean it', () => {
  const { entries, errors } = parse(citationBibtex(EDITION))
  expect(errors).toEqual([])
  expect(entries).toHaveLength(1)
  expect(entries[0]).toMatchObject({
    type: 'misc',
    key: 'lampleaf-3-page-figures-of-electronic-paper-devices',
    fields: {
      author: [{ name: 'Lampleaf' }],
      title: 'Page figures of electronic-paper devices',
      year: '2026',
      month: '11',
      note: 'Edition 3, released 2026-11-20, licence CC-BY-4.0',
      url: 'https://lampleaf.example/editions/3',
    },
  })
})

test('what means something to TeX comes out as the character it is, and every author is one name', () => {
  const { entries, errors } = parse(citationBibtex(AWKWARD))
  expect(errors).toEqual([])
  expect(entries).toHaveLength(1)
  expect(entries[0]?.fields).toMatchObject({
    title: AWKWARD.title.replace(/[\s\u0085]+/g, ' '),
    author: AWKWARD.authors.map((name) => ({ name })),
    // A brace in an address would end the field: it is percent-encoded, which leads to the same place.
    url: 'https://lampleaf.example/a_b?c=%20&d=%7Be%7D#f',
  })
})

test('a key holds nothing that would end it', () => {
  expect(citationBibtex(AWKWARD)).toMatch(/^@misc\{[a-z0-9-]+,\n/)
})
