import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { catalogueHref, isWrittenAs, pairsFrom, readCatalogue } from '@/lib/catalogue/address'

const read = (address: string) => readCatalogue(new URLSearchParams(address))
const canonical = (address: string) => catalogueHref(read(address).query)

describe('an address of the catalogue is written in one way', () => {
  test.each([
    ['blank fields of the form ask nothing', 'q=&maker=&min-size=&pen=&water=&sort=', '/devices'],
    ['the usual order is understood', 'sort=lightness&order=descending', '/devices'],
    ['the usual way round of another order too', 'sort=price&order=ascending', '/devices?sort=price'],
    ['the other way round is said', 'sort=price&order=descending', '/devices?sort=price&order=descending'],
    ['the first page is understood', 'page=1', '/devices'],
    ['makers stand in the order of the alphabet', 'maker=Tamber&maker=ostler', '/devices?maker=ostler,tamber'],
    ['a maker named twice stands once', 'maker=tamber,Tamber', '/devices?maker=tamber'],
    ['numbers as people type them', 'max-price=%C2%A31%2C200.50&min-size=6.0', '/devices?min-size=6&max-price=1200.5'],
    ['filters in the order of the form', 'pen=yes&q=reed', '/devices?q=reed&pen=yes'],
    ['spaces of a search made single', 'q=++reed+++7+', '/devices?q=reed+7'],
    ['commas alone name no maker', 'maker=,,', '/devices'],
    ['unknown names are left out', 'utm_source=x&colour=no', '/devices?colour=no'],
  ])('%s', (_, address, href) => {
    expect(canonical(address)).toBe(href)
  })
})

test('whatever an address holds, its canonical form says the same and is canonical', () => {
  const name = fc.constantFrom(
    'q',
    'maker',
    'min-size',
    'max-price',
    'pen',
    'water',
    'sort',
    'order',
    'page',
    'x',
    '__proto__',
  )
  const text = fc.oneof(
    fc.constantFrom(
      '',
      'yes',
      'no',
      '6',
      '-1',
      '1e9',
      '8,000',
      'price',
      'constructor',
      'ascending',
      'a,b',
      'é',
      '\u0000',
      '%',
    ),
    fc.string({ unit: 'binary', maxLength: 100 }),
  )
  fc.assert(
    fc.property(fc.array(fc.tuple(name, text), { maxLength: 12 }), (pairs) => {
      const { query } = readCatalogue(pairs)
      const href = catalogueHref(query)
      const again = [...new URL(href, 'http://bench.example').searchParams]
      expect(readCatalogue(again).problems).toEqual([])
      expect(catalogueHref(readCatalogue(again).query)).toBe(href)
      expect(isWrittenAs(href, again)).toBe(true)
    }),
    { numRuns: 300 },
  )
})

describe('what is not understood is said in words, and the rest still counts', () => {
  test.each([
    ['a word for a size', 'min-size=big&pen=yes', ['Size from: "big" is not a number of inches from 0 to 100.']],
    ['a size no page has', 'max-size=101&pen=yes', ['Size up to: "101" is not a number of inches from 0 to 100.']],
    [
      'a size above the largest',
      'min-size=9&max-size=8&pen=yes',
      ['Size from: it is above the largest size, and no page is both larger and smaller.'],
    ],
    ['a field given twice', 'colour=yes&colour=no&pen=yes', ['Colour: it is given twice; give it once.']],
    ['half a page', 'page=1.5&pen=yes', ['Page: a fraction is not a whole number from 1 to 9999.']],
    [
      'an order nobody offers',
      'sort=constructor&pen=yes',
      [expect.stringContaining('Order by: "constructor" is not one of the choices')],
    ],
    [
      'a search of great length',
      `q=${'a'.repeat(81)}&pen=yes`,
      [expect.stringContaining('is not at most 80 letters on one line')],
    ],
  ])('%s', (_, address, messages) => {
    const { query, problems } = read(address)
    expect(problems.map(({ message }) => message)).toEqual(messages)
    expect(query.pen).toBe(true)
  })
})

test('a field given twice alike, as by two forms, is given once', () => {
  expect(read('pen=yes&pen=yes').problems).toEqual([])
})

test('the pairs of a page’s address are those of the address', () => {
  expect(pairsFrom({ a: '1', b: ['2', '3'], c: undefined })).toEqual([
    ['a', '1'],
    ['b', '2'],
    ['b', '3'],
    ['c', ''],
  ])
})
