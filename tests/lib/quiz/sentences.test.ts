import { expect, test } from 'vitest'
import type { EditionDevice, RankedDevice, WouldChange } from '@/lib/method/types'
import { changeSentences } from '@/lib/quiz/changes'
import { MARGIN_WORDS, marginOf, rivalsSentence } from '@/lib/quiz/lead'
import { missWords, toll, whyExcluded } from '@/lib/quiz/limit-words'
import { notStatedByField } from '@/lib/quiz/not-stated'
import { makeDevice } from '../../fixtures/edition'

/** Thin spaces as plain ones, so that a sentence can be typed. */
const plain = (text: string | null) => text?.replaceAll('\u202f', ' ') ?? null
const nameOf = (slug: string) => slug.toUpperCase()

function ranked(slug: string, fit: number, first: number, tiedWith: string[] = []): RankedDevice {
  const each = { clarity: fit / 4, whiteness: fit / 4, tint: fit / 4, handling: fit / 4 }
  const scores = { clarity: 1, whiteness: 1, tint: 1, handling: 1 }
  return {
    slug,
    fit,
    first,
    tiedWith,
    sd: 1,
    rank95: [1, 2],
    scores,
    contributions: each,
    unreadable: 0,
    notStated: [],
  }
}

test.each([
  { name: 'the only one left', list: [ranked('a', 80, 1)], margin: 'alone' },
  { name: 'clear of the others', list: [ranked('a', 80, 1), ranked('b', 70, 0)], margin: 'clear' },
  {
    name: 'ahead by less than a point',
    list: [ranked('a', 80, 0.7, ['b']), ranked('b', 79.1, 0.3, ['a'])],
    margin: 'whisker',
  },
  {
    name: 'first in fewer than half of the draws',
    list: [ranked('a', 80, 0.4, ['b', 'c']), ranked('b', 78, 0.3, ['a']), ranked('c', 78, 0.3, ['a'])],
    margin: 'whisker',
  },
  {
    name: 'ahead by less than a point, yet in most draws',
    list: [ranked('a', 80, 0.88, ['b']), ranked('b', 79.3, 0.12, ['a'])],
    margin: 'little',
  },
  { name: 'ahead by a little', list: [ranked('a', 80, 0.9, ['b']), ranked('b', 78, 0.1, ['a'])], margin: 'little' },
] as const)('a first place is told as $margin where it is $name', ({ list, margin }) => {
  expect(marginOf(list)).toBe(margin)
})

test('only a lead within the doubt is qualified in the headline', () => {
  expect(MARGIN_WORDS).toEqual({ alone: '', whisker: 'by a whisker', little: 'by a little', clear: '' })
})

test('those that could also be first are named with their share of the draws', () => {
  const two = [ranked('a', 80, 0.62, ['b']), ranked('b', 79, 0.38, ['a']), ranked('c', 60, 0)]
  expect(plain(rivalsSentence(two, nameOf))).toBe(
    'Allowing for what we cannot measure better, B (38 %) could also be first. Between these, choose on price, size or feel.',
  )
  expect(rivalsSentence([ranked('a', 80, 1), ranked('b', 60, 0)], nameOf)).toBeNull()
})

test('of many that could be first five are named and the rest counted', () => {
  const slugs = ['b', 'c', 'd', 'e', 'f', 'g', 'h']
  const list = [ranked('a', 80, 0.2, slugs), ...slugs.map((slug) => ranked(slug, 79, 0.1, ['a']))]
  expect(plain(rivalsSentence(list, nameOf))).toContain('F (10 %) and 2 more could each be first.')
})

const nothing: WouldChange = {
  weights: [
    { aim: 'clarity', from: 0.49, to: null, first: null },
    { aim: 'whiteness', from: 0.15, to: null, first: null },
    { aim: 'tint', from: 0.29, to: null, first: null },
    { aim: 'handling', from: 0.07, to: null, first: null },
  ],
  hours: null,
  budget: null,
}
const spots = [{ name: 'In bed' }, { name: 'Train' }]

test('each change that would put another first is a sentence with its amount', () => {
  const change: WouldChange = {
    weights: [...nothing.weights.slice(0, 2), { aim: 'tint', from: 0.29, to: 0.36, first: 'b' }],
    hours: { from: 0, to: 1, hours: 2.5, first: 'c' },
    budget: { amount: 21_900, first: 'd' },
  }
  const limits = { budget: 20_000, currency: 'GBP' }
  expect(changeSentences(change, { spots, limits, devices: 5, nameOf }).map(plain)).toEqual([
    'If being free of tint counted 36 of 100 instead of 29, B would come first.',
    'If 2.5 h a week moved from “In bed” to “Train”, C would come first.',
    'With £19 more to spend (£219), D would come first.',
  ])
})

test('where nothing would change first place, that is said of each kind of change', () => {
  const limits = { budget: 20_000, currency: 'GBP' }
  expect(changeSentences(nothing, { spots, limits, devices: 5, nameOf })).toEqual([
    'No change in how much one aim counts puts the runner-up first.',
    'Moving hours from one of your spots to another would not change first place.',
    'No higher budget changes first place.',
  ])
})

test('with one device, one spot and no budget there is nothing to say about changes', () => {
  expect(changeSentences(nothing, { spots: spots.slice(0, 1), limits: {}, devices: 1, nameOf })).toEqual([])
})

test('a change of weight too small to show is told as the least there is', () => {
  const weights: WouldChange['weights'] = [
    { aim: 'tint', from: 0.29, to: 0.2912, first: 'b' },
    { aim: 'clarity', from: 0.25, to: 0.25, first: 'b' },
  ]
  expect(changeSentences({ ...nothing, weights }, { spots, limits: {}, devices: 2, nameOf }).slice(0, 2)).toEqual([
    'If being free of tint counted 29.1 of 100 instead of 29.0, B would come first.',
    'The least change in how much being clear in your light counts puts B first.',
  ])
})

const device: EditionDevice = makeDevice({
  slug: 'x',
  price: { amount: 36_900, currency: 'GBP' },
  diagonal: 5.2,
  weight: 235.5,
  water: 4,
  formats: ['epub', 'PDF'],
})

test.each([
  ['budget', { budget: 34_950, currency: 'GBP' }, 'costs £369, £19.50 over your budget'],
  ['minDiagonal', { minDiagonal: 6 }, 'is 0.8 in too small'],
  ['maxDiagonal', { maxDiagonal: 5 }, 'is 0.2 in too large'],
  ['maxWeight', { maxWeight: 200 }, 'is 36 g too heavy'],
  ['pen', { pen: true }, 'takes no pen'],
  ['colour', { colour: false }, 'is in colour'],
  ['frontLight', { frontLight: true }, 'has no front light'],
  ['water', { water: 7 }, 'is rated IPX4, and you asked for 7'],
  ['formats', { formats: ['EPUB', 'CBZ', 'DJVU'] }, 'does not open CBZ and DJVU'],
  ['onSale', { onSale: true }, 'is no longer on sale'],
] as const)('a device that misses %s is told by how much', (limit, limits, words) => {
  const given = 'formats' in limits ? { formats: [...limits.formats] } : limits
  expect(plain(missWords(limit, device, given))).toBe(words)
})

test('every limit a device fails is named, and each limit’s toll is counted', () => {
  expect(plain(whyExcluded(['maxWeight', 'pen'], device, { maxWeight: 200, pen: true }))).toBe(
    'is 36 g too heavy and takes no pen',
  )
  expect(toll([{ failed: ['pen'] }, { failed: ['pen', 'budget'] }, { failed: ['pen'] }])).toEqual([
    'the pen (3)',
    'your budget (1)',
  ])
})

test('what was not stated is gathered by field, and what we made of it is said', () => {
  const list = [
    { slug: 'a', notStated: ['weight'] },
    { slug: 'b', notStated: ['weight', 'speech'] },
  ]
  expect(notStatedByField(list)).toEqual([
    {
      field: 'weight',
      name: 'Weight',
      effect: 'left out of the score; no limit leaves it out',
      slugs: ['a', 'b'],
    },
    { field: 'speech', name: 'Reading aloud', effect: 'kept, though it may not meet your limit', slugs: ['b'] },
  ])
})
