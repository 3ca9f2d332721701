import { describe, expect, test } from 'vitest'
import { match } from '@/lib/method/ranking'
import { picksOf, tieWords } from '@/lib/readers/picks'
import { picksList } from '@/lib/structured/picks'
import { makeAnswers, makeDevice, makeEdition, syntheticEdition } from '../../fixtures/edition'

describe('picks', () => {
  test('show leading groups whole, and as many as it takes for four devices', () => {
    const { ranked } = match(syntheticEdition(24), makeAnswers())
    const { readable, groups, shown } = picksOf(ranked)
    expect(shown).toEqual(groups.slice(0, shown.length))
    const count = shown.flat().length
    expect(count).toBeGreaterThanOrEqual(4)
    expect(count - shown.at(-1)!.length).toBeLessThan(4)
    expect(groups.flat()).toEqual(readable)
  })

  test('leave out what cannot be read in any of the reader’s spots', () => {
    const edition = makeEdition([makeDevice({ slug: 'lit' }), makeDevice({ slug: 'unlit', frontLight: false })])
    const { ranked } = match(edition, makeAnswers({ spots: [{ lux: 0.1, hours: 5, frontLight: true }] }))
    const picks = picksOf(ranked)
    expect(ranked).toHaveLength(2)
    expect(picks.readable.map(({ slug }) => slug)).toEqual(['lit'])
    expect(tieWords(picks)).toBe('The only device left')
  })

  test('are none where nothing is left', () => {
    expect(tieWords(picksOf([]))).toBe('No device can be read here')
    expect(picksOf([]).shown).toEqual([])
  })

  test('say how many are too close to call', () => {
    const edition = makeEdition([makeDevice({ slug: 'one' }), makeDevice({ slug: 'other' })])
    expect(tieWords(picksOf(match(edition, makeAnswers()).ranked))).toBe('2 devices are too close to call')
  })
})

// schema.org/ItemList, schema.org/ListItem: position is the order of an item; tied items have none.
test('the structured list gives a position only to devices that stand alone', () => {
  const at = (slug: string) => ({ slug })
  const list = picksList({
    name: 'Picks',
    description: 'For a test.',
    url: 'https://lampleaf.example/for/test',
    groups: [[at('a'), at('b')], [at('c')]],
    nameOf: (slug) => slug.toUpperCase(),
    urlOf: (slug) => `https://lampleaf.example/devices/${slug}`,
  })
  expect(list.numberOfItems).toBe(3)
  expect(list.itemListOrder).toBe('https://schema.org/ItemListUnordered')
  expect(list.itemListElement).toEqual([
    { '@type': 'ListItem', name: 'A', url: 'https://lampleaf.example/devices/a' },
    { '@type': 'ListItem', name: 'B', url: 'https://lampleaf.example/devices/b' },
    { '@type': 'ListItem', position: 3, name: 'C', url: 'https://lampleaf.example/devices/c' },
  ])
})

test('a list without ties is in order', () => {
  const list = picksList({
    name: 'Picks',
    description: 'For a test.',
    url: 'https://lampleaf.example/for/test',
    groups: [[{ slug: 'a' }], [{ slug: 'b' }]],
    nameOf: (slug) => slug,
    urlOf: (slug) => slug,
  })
  expect(list.itemListOrder).toBe('https://schema.org/ItemListOrderAscending')
  expect(list.itemListElement.map((item) => item.position)).toEqual([1, 2])
})
