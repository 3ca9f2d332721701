import fc from 'fast-check'
import { expect, test } from 'vitest'
import { LEVELS, stepOf } from '@/lib/lamp/levels'
import { readLight } from '@/lib/light/address'
import { type LightChoice, lightHref, OPENING } from '@/lib/light/choice'
import { LAMP_NAMES } from '@/lib/light/lamps'
import { LIGHT_NEEDS, TEXT_SIZES } from '@/lib/method/types'

const KNOWN = ['corrin-octavo-8', 'ostler-plain-6', 'ostler-plain-7', 'wexby-vesper-6']
const read = (search: Parameters<typeof readLight>[0]) => readLight(search, KNOWN)
const searchOf = (href: string) => Object.fromEntries(new URLSearchParams(href.split('?')[1] ?? ''))

test('an address that asks for nothing opens in daylight of 80 lux with all pages and front lights off', () => {
  expect(read({})).toEqual({ choice: OPENING, notes: [] })
  expect(lightHref(OPENING)).toBe('/light')
})

test('every part of a choice stands in the address by a short name', () => {
  const href =
    '/light?lux=250&lamp=LED-B1&front=on&light-need=more&type-size=small&with=ostler-plain-7,wexby-vesper-6&page=2'
  const { choice, notes } = read(searchOf(href))
  expect(notes).toEqual([])
  expect(choice).toEqual({
    lux: 250,
    lamp: 'LED-B1',
    frontLight: true,
    lightNeed: 'more',
    text: 'small',
    chosen: ['ostler-plain-7', 'wexby-vesper-6'],
    page: 2,
  })
  expect(lightHref(choice)).toBe(href)
})

const choices: fc.Arbitrary<LightChoice> = fc.record({
  lux: fc.oneof(fc.constantFrom(...LEVELS.map(({ lux }) => lux)), fc.integer({ min: 1, max: 80_000 })),
  lamp: fc.constantFrom(...LAMP_NAMES),
  frontLight: fc.boolean(),
  lightNeed: fc.constantFrom(...LIGHT_NEEDS),
  text: fc.constantFrom(...TEXT_SIZES),
  chosen: fc.subarray(KNOWN, { maxLength: KNOWN.length - 1 }),
  page: fc.integer({ min: 1, max: 9999 }),
})

test('a choice written into the address is read back as it was, without a word', () => {
  fc.assert(
    fc.property(choices, (choice) => {
      expect(read(searchOf(lightHref(choice)))).toEqual({ choice, notes: [] })
    }),
  )
})

test('pages come from a list or from ticked boxes, each once and in one order; all of them is the same as none', () => {
  expect(read({ with: ['wexby-vesper-6', 'ostler-plain-7', 'wexby-vesper-6'] }).choice.chosen).toEqual([
    'ostler-plain-7',
    'wexby-vesper-6',
  ])
  expect(read({ with: KNOWN }).choice.chosen).toEqual([])
  expect(read({ with: ['', ' , '] })).toEqual({ choice: OPENING, notes: [] })
})

test('the slider’s step counts where no lux is given', () => {
  expect(read({ step: String(stepOf(400)) }).choice.lux).toBe(400)
  expect(read({ step: '999' }).choice.lux).toBe(80_000)
  expect(read({ step: '3', lux: '250' }).choice.lux).toBe(250)
})

test.each([
  ['1000000', 80_000],
  ['0', 0.1],
  ['0.001', 0.1],
])('a light of %s lux takes the nearer end of the slider, and that is told', (lux, held) => {
  const { choice, notes } = read({ lux })
  expect(choice.lux).toBe(held)
  expect(notes).toHaveLength(1)
  expect(notes[0]).toMatch(/outside the lamp’s range/)
})

test.each([
  [{ lux: 'bright' }, '"bright" is not a number of lux from 0.1 to 80,000.'],
  [{ lux: '-3' }, '"-3" is not a number of lux from 0.1 to 80,000.'],
  [{ lamp: 'D75' }, '"D75" is not one of the lamps (D65, D50, LED-B3, FL11, A, LED-B1).'],
  [{ front: 'yes' }, '"yes" is not on or off.'],
  [{ 'light-need': 'none' }, '"none" is not one of usual, more, much-more.'],
  [{ 'type-size': '12' }, '"12" is not one of small, normal, large.'],
  [{ page: '0' }, '"0" is not a number of a page.'],
  [{ lux: ['5', '6'] }, '“lux” is given 2 times, so it is left as it opens.'],
  [{ with: 'no-such' }, 'There is no device "no-such" in this edition.'],
  [{ with: 'x,y,<script>' }, 'There is no device "x" in this edition, nor 2 more that were named.'],
])('what is not understood is told in words and left as it opens: %j', (search, note) => {
  expect(read(search as Parameters<typeof readLight>[0])).toEqual({ choice: OPENING, notes: [note] })
})

test('a device there is stays chosen beside one there is not', () => {
  const { choice, notes } = read({ with: 'ostler-plain-7,gone' })
  expect(choice.chosen).toEqual(['ostler-plain-7'])
  expect(notes).toHaveLength(1)
})

test('no address throws, whatever it holds, and what is shown can always be written and read again', () => {
  const names = ['lux', 'step', 'lamp', 'front', 'light-need', 'type-size', 'with', 'page', 'other', '__proto__']
  const texts = fc.oneof(fc.string({ unit: 'binary' }), fc.constantFrom('1e999', 'NaN', '%00', ',,,', '٣', '80'))
  fc.assert(
    fc.property(
      fc.dictionary(fc.constantFrom(...names), fc.oneof(texts, fc.array(texts, { maxLength: 4 }))),
      (search) => {
        const { choice } = read(search)
        expect(read(searchOf(lightHref(choice)))).toEqual({ choice, notes: [] })
      },
    ),
  )
})
