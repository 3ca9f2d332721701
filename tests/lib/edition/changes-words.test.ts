import { describe, expect, test } from 'vitest'
import type { DeviceChange } from '@/lib/edition/changes'
import type { FactName } from '@/lib/edition/changes-facts'
import type { FigureName } from '@/lib/edition/changes-figures'
import { type Move, rankMoves } from '@/lib/edition/changes-ranks'
import { factWords, movedWords, moveReasons } from '@/lib/edition/changes-words'
import { editionNumber } from '@/lib/edition/number'
import { raisedBy } from '@/lib/edition/raised'
import { makeDevice } from '../../fixtures/edition'

/** Thin spaces as plain ones, so that words can be typed. */
const plain = (text: string) => text.replaceAll('\u202f', ' ')

test.each<{ figure: FigureName; before: number; after: number; doubt: number; words: string[] }>([
  { figure: 'lightness', before: 73.9774, after: 72.6142, doubt: 0.8643, words: ['74.0', '72.6', '−1.4', '± 0.9'] },
  { figure: 'lightness', before: 74.2045, after: 74.2112, doubt: 0.7645, words: ['74.20', '74.21', '+0.01', '± 0.76'] },
  { figure: 'ink', before: 21.9661, after: 21.9237, doubt: 0.4175, words: ['22.0', '21.9', '−0.04', '± 0.42'] },
  { figure: 'whiteness', before: 23.327, after: 31.892, doubt: 2.9, words: ['23', '32', '+8.6', '± 2.9'] },
  { figure: 'b', before: 0.1, after: -0.1, doubt: 0.1, words: ['0.1', '−0.1', '−0.2', '± 0.1'] },
])('$figure from $before to $after never reads as no change', ({ figure, before, after, doubt, words }) => {
  const told = movedWords({ figure, before, after, doubt, beyond: false })
  expect([told.before, told.after, told.difference, told.doubt].map(plain)).toEqual(words)
})

test.each<[FactName, Parameters<typeof makeDevice>[0], string]>([
  ['weight', { slug: 'a', weight: 180 }, '180 g'],
  ['weight', { slug: 'a', weight: null }, 'not stated'],
  ['price', { slug: 'a', price: { amount: 12900, currency: 'GBP' } }, '£129'],
  ['pen', { slug: 'a', pen: true }, 'yes'],
  ['colour', { slug: 'a', colour: false }, 'no'],
  ['frontLight', { slug: 'a', frontLight: false }, 'no'],
  ['frontLight', { slug: 'a', frontLight: { max: 95, min: 0.5 } }, 'at most 95.0 cd/m², least 0.50 cd/m²'],
  ['frontLight', { slug: 'a', frontLight: { max: 95, min: null } }, 'at most 95.0 cd/m², least not stated'],
  ['water', { slug: 'a', water: 0 }, 'none'],
  ['water', { slug: 'a', water: 8 }, 'IPX8'],
  ['formats', { slug: 'a', formats: ['EPUB', 'PDF'] }, 'EPUB, PDF'],
  ['formats', { slug: 'a', formats: [] }, 'none'],
  ['revision', { slug: 'a', revision: 'B' }, 'B'],
  ['units', { slug: 'a', units: 3 }, '3'],
  ['ppi', { slug: 'a', ppi: 300 }, '300 ppi'],
])('the fact %s of %o reads “%s”', (fact, device, words) => {
  expect(plain(factWords(makeDevice(device), fact, 'metric'))).toBe(words)
})

describe('why a device moved', () => {
  const at = (slug: string, fit: number) => ({ slug, fit, sd: 1, rank95: [1, 2] as [number, number] })
  const moves = rankMoves(
    [at('a', 80), at('b', 79), at('gone', 78), at('c', 77)],
    [at('b', 79), at('new', 78.5), at('a', 78), at('c', 77)],
  )
  const moveOf = (slug: string) => moves.find((move) => move.slug === slug) as Move
  const change = (parts: Partial<DeviceChange>): DeviceChange => ({
    slug: 'a',
    before: makeDevice({ slug: 'a' }),
    after: makeDevice({ slug: 'a' }),
    figures: [],
    facts: [],
    ...parts,
  })
  const moved = [{ figure: 'lightness' as const, before: 74, after: 72, doubt: 1, beyond: true }]
  const why = (slug: string, own?: DeviceChange, corrected = false) =>
    moveReasons(moveOf(slug), own, corrected, (one) => one.toUpperCase())

  test('begins with its own figures, corrected or not, and what they did to its fit', () => {
    expect(why('a', change({ figures: moved }), true)).toEqual([
      'Its figures were corrected. Its fit is 2.0 points lower.',
      'NEW is new above it.',
      'B passed it.',
    ])
    expect(why('a', change({ figures: moved }))[0]).toMatch(/^Readings added or withdrawn since moved its figures\./)
    expect(why('a', change({ figures: moved, facts: [{ fact: 'revision', ofTheFit: false }] }))[0]).toMatch(
      /^Another revision was measured\./,
    )
    expect(why('a', change({ facts: [{ fact: 'weight', ofTheFit: true }] }))[0]).toMatch(
      /^What is stated of it changed: weight\./,
    )
  })

  test('does not blame a change that left its fit alone', () => {
    expect(why('b', change({ facts: [{ fact: 'price', ofTheFit: false }] }))).toEqual(['It passed A.'])
  })

  test('names who came and who went', () => {
    expect(why('c')).toEqual(['NEW is new above it.', 'GONE stood above it and is no longer there.'])
    expect(why('new')).toEqual(['New in this edition.'])
    expect(why('gone')).toEqual(['No longer in the edition.'])
  })

  test('says so where only its band changed', () => {
    const [band] = rankMoves([at('a', 80)], [{ ...at('a', 80), rank95: [1, 1] }])
    expect(moveReasons(band!, undefined, false, String)).toEqual([
      'Its fit is the same; the doubts, or the devices next to it, changed.',
    ])
  })
})

test('who raised a correction is the first to have written before it was noted', () => {
  const reply = (from: string, repliedOn: string) => ({ from, repliedOn })
  const notedOn = '2026-05-12'
  const replies = [reply('The bench', '2026-05-12'), reply('A maker', '2026-05-01'), reply('An owner', '2026-04-29')]
  expect(raisedBy({ notedOn, replies })).toEqual(reply('An owner', '2026-04-29'))
  expect(raisedBy({ notedOn, replies: [reply('The bench', '2026-05-12')] })).toBeNull()
  expect(raisedBy({ notedOn, replies: [] })).toBeNull()
})

test.each([
  ['1', 1],
  ['27', 27],
  ['999999999', 999_999_999],
  ['0', null],
  ['01', null],
  ['-1', null],
  ['1.0', null],
  ['1e3', null],
  [' 1', null],
  ['x', null],
  ['', null],
  ['９', null],
  ['99999999999999999999', null],
])('the address “%s” names the edition %s', (text, number) => {
  expect(editionNumber(text)).toBe(number)
})
