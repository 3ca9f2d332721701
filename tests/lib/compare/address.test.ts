import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { chooseDevices, compareHref, inFindableOrder, pairsOf, readCompared } from '@/lib/compare/address'

const devices = ['a', 'b', 'c', 'd', 'e', 'f'].map((slug) => ({ slug }))
const slugs = (list: readonly { slug: string }[]) => list.map(({ slug }) => slug)

describe('the devices an address names', () => {
  test.each([
    ['none', undefined, []],
    ['a blank', '', []],
    ['two with a comma between', 'a,b', ['a', 'b']],
    ['each by itself, as a form sends them, blanks left out', ['a', '', 'b', ''], ['a', 'b']],
    ['spaces and commas too many', ' a ,, b,', ['a', 'b']],
  ])('%s', (_, given, named) => {
    expect(readCompared(given)).toEqual(named)
  })

  test('no more are read than any form sends, and none at any length', () => {
    expect(readCompared(Array(5000).fill('a'.repeat(300))).length).toBe(100)
    expect(readCompared('a'.repeat(300))[0]!.length).toBeLessThan(100)
  })
})

test('whatever is named, its one address names the same', () => {
  fc.assert(
    fc.property(fc.array(fc.string({ unit: 'grapheme', maxLength: 30 }), { maxLength: 8 }), (given) => {
      const named = readCompared(given)
      const address = new URL(compareHref(named), 'http://bench.example')
      expect(readCompared(address.searchParams.get('with') ?? undefined)).toEqual(named)
    }),
  )
})

test('up to four are shown, each once, in the order named; the rest is told', () => {
  expect(chooseDevices(devices, ['b', 'a', 'b', 'nobody', 'constructor'])).toEqual({
    chosen: [{ slug: 'b' }, { slug: 'a' }],
    left: [],
    twice: [{ slug: 'b' }],
    unknown: ['nobody', 'constructor'],
  })
  const six = chooseDevices(devices, ['f', 'e', 'd', 'c', 'b', 'a'])
  expect([slugs(six.chosen), slugs(six.left)]).toEqual([
    ['f', 'e', 'd', 'c'],
    ['b', 'a'],
  ])
})

test('any order of the same devices has one address to be found by', () => {
  expect(inFindableOrder(['c', 'a', 'b'])).toEqual(inFindableOrder(['b', 'c', 'a']))
})

test('four devices make six pairs, each once', () => {
  const pairs = pairsOf(devices.slice(0, 4)).map(slugs)
  expect(pairs).toEqual([
    ['a', 'b'],
    ['a', 'c'],
    ['a', 'd'],
    ['b', 'c'],
    ['b', 'd'],
    ['c', 'd'],
  ])
  expect(pairsOf([1])).toEqual([])
})
