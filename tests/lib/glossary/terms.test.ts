import { describe, expect, test } from 'vitest'
import { QUANTITIES } from '@/app/[look]/method/quantities'
import { TERMS, termsByLetter } from '@/lib/glossary/terms'
import { READERS } from '@/lib/readers/readers'
import { termSet } from '@/lib/structured/glossary'

test.each(QUANTITIES)('the published quantity “$name” has a glossary entry', ({ id }) => {
  expect(TERMS.filter(({ quantities }) => quantities?.includes(id))).toHaveLength(1)
})

test('no entry explains a quantity that is not published', () => {
  const published = new Set(QUANTITIES.map(({ id }) => id))
  for (const { id, quantities = [] } of TERMS) for (const one of quantities) expect(published.has(one), id).toBe(true)
})

/** Words the site speaks in, by the list of the product's own words and the trade's. */
const WORDS = [
  'reading',
  'set',
  'session',
  'control',
  'calibration',
  'specular included',
  'illuminant',
  'observer',
  'lightness',
  'a* and b*',
  'chroma',
  'CIE whiteness',
  'tint',
  'contrast ratio',
  'repeatability',
  'expanded uncertainty',
  'coverage factor',
  'control chart',
  'edition',
  'correction',
  'page and ink',
  'reading spot',
  'contrast reserve',
  'fit',
  'too close to call',
  'ladder',
  'white map',
  'booth',
  'device',
  'provisional',
  'colour filter',
  'front light',
  'lux',
  'luminance',
  'ΔE00',
  'house',
  'seal',
  'not stated',
]
test.each(WORDS)('“%s” is explained', (word) => {
  expect(TERMS.map(({ name }) => name)).toContain(word)
})

describe.each(TERMS)('“$name”', ({ id, text, source, used }) => {
  test('is told in one to three whole sentences, with its source', () => {
    const sentences = text.split(/(?<=\.)\s+(?=\p{Lu})/u)
    expect(sentences.length).toBeLessThanOrEqual(3)
    expect(text).toMatch(/^\p{Lu}.*\.$/su)
    expect(source).not.toBe('')
    expect(id).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/)
  })

  test('leads to a place on the site that there is', () => {
    const { pathname, hash } = new URL(used.href, 'https://lampleaf.example')
    const sections = new Set(['spots', 'unknowns', ...QUANTITIES.map(({ section }) => section)])
    const known = {
      '/method': ['', ...[...sections].map((one) => `#${one}`), ...QUANTITIES.map((one) => `#q-${one.id}`)],
    }
    if (pathname === '/method') expect(known['/method']).toContain(hash)
    else {
      expect(hash).toBe('')
      const rooms = ['/devices', '/light', '/quiz', '/data', '/for', '/editions', '/corrections']
      expect([...rooms, ...READERS.map(({ slug }) => `/for/${slug}`)]).toContain(pathname)
    }
  })
})

test('every entry has an address of its own', () => {
  expect(new Set(TERMS.map(({ id }) => id)).size).toBe(TERMS.length)
  expect(new Set(TERMS.map(({ name }) => name)).size).toBe(TERMS.length)
})

test('the letters hold every entry once, in order, each under the letter it begins with', () => {
  const letters = termsByLetter()
  expect(letters.flatMap(({ terms }) => terms)).toEqual(TERMS)
  expect(letters.map(({ letter }) => letter)).toEqual([...new Set(letters.map(({ letter }) => letter))].sort())
  expect(letters.find(({ letter }) => letter === 'D')!.terms.map(({ name }) => name)).toContain('ΔE00')
})

// schema.org/DefinedTermSet and schema.org/DefinedTerm.
test('the structured set names every term with its own address', () => {
  const set = termSet(TERMS, 'https://lampleaf.example/glossary')
  expect(set.hasDefinedTerm).toHaveLength(TERMS.length)
  for (const term of set.hasDefinedTerm) {
    expect(term.inDefinedTermSet).toBe(set['@id'])
    expect(term['@id']).toMatch(/^https:\/\/lampleaf\.example\/glossary#[a-z0-9-]+$/)
  }
})
