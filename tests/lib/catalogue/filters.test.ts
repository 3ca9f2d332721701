import { describe, expect, test } from 'vitest'
import { readCatalogue } from '@/lib/catalogue/address'
import { filterDevices, filtersIn, tolls, withoutFilter } from '@/lib/catalogue/filters'
import { makeDevice, syntheticEdition } from '../../fixtures/edition'

const devices = [
  makeDevice({ slug: 'amber', name: 'Amber 6', maker: 'Ostler', diagonal: 6, weight: 150, pen: false, water: 7 }),
  makeDevice({ slug: 'birch', name: 'Birch 10', maker: 'Quayle', diagonal: 10.3, weight: null, pen: true, water: 0 }),
  makeDevice({ slug: 'cedar', name: 'Cédar 8', maker: 'Quayle', diagonal: 8, weight: 240, pen: null, water: null }),
  makeDevice({
    slug: 'dogwood',
    name: 'Dogwood 7',
    maker: 'De la Rue',
    diagonal: null,
    weight: 200,
    pen: true,
    water: 8,
    frontLight: false,
    price: { amount: 9900, currency: 'EUR' },
    onSale: false,
  }),
]

const query = (address: string) => readCatalogue(new URLSearchParams(address)).query
function found(address: string) {
  const { known, open } = filterDevices(devices, query(address))
  return [known.map(({ slug }) => slug), open.map(({ device, notStated }) => `${device.slug}: ${notStated}`)]
}

describe('a filter leaves out only what is known to fail it', () => {
  test.each([
    ['nothing asked', '', ['amber', 'birch', 'cedar', 'dogwood'], []],
    ['a smallest size, met exactly', 'min-size=8', ['birch', 'cedar'], ['dogwood: diagonal']],
    ['a largest size', 'max-size=7.9', ['amber'], ['dogwood: diagonal']],
    ['a weight', 'max-weight=200', ['amber', 'dogwood'], ['birch: weight']],
    ['with a pen', 'pen=yes', ['birch', 'dogwood'], ['cedar: pen']],
    ['without a pen', 'pen=no', ['amber'], ['cedar: pen']],
    ['without a front light', 'front-light=no', ['dogwood'], []],
    ['on sale', 'on-sale=yes', ['amber', 'birch', 'cedar'], []],
    ['water, second digit of IEC 60529 at least', 'water=7', ['amber', 'dogwood'], ['cedar: water']],
    [
      'a price; one in another currency is not converted',
      'max-price=129',
      ['amber', 'birch', 'cedar'],
      ['dogwood: price'],
    ],
    ['a price a penny lower', 'max-price=128.99', [], ['dogwood: price']],
    ['two makers', 'maker=quayle,de-la-rue', ['birch', 'cedar', 'dogwood'], []],
    ['a maker twice over, however written', 'maker=Quayle&maker=QUAYLE', ['birch', 'cedar'], []],
    ['a maker nobody is', 'maker=nobody', [], []],
    ['words of name and maker in any order', 'q=quayle+10', ['birch'], []],
    ['a word without its accent', 'q=cedar', ['cedar'], []],
    ['a word with one it does not have', 'q=%C3%A1mber', ['amber'], []],
    ['two limits, one of them open', 'pen=yes&max-size=8', [], ['cedar: pen', 'dogwood: diagonal']],
  ])('%s', (_, address, known, open) => {
    expect(found(address)).toEqual([known, open])
  })
})

test('whatever is asked, every device is known to match, is open, or is known to fail', () => {
  const { devices: many } = syntheticEdition(60)
  for (const key of ['pen', 'colour', 'front-light', 'on-sale']) {
    const yes = filterDevices(many, query(`${key}=yes`))
    const no = filterDevices(many, query(`${key}=no`))
    expect(yes.open).toEqual(no.open)
    expect(yes.known.length + no.known.length + yes.open.length).toBe(many.length)
  }
})

test('each filter in force can be taken out by itself, each maker too, and the list begins anew', () => {
  const asked = query('q=reed&maker=ostler,tamber&pen=yes&sort=price&page=3')
  const filters = filtersIn(asked, ['Ostler', 'Tamber'])
  expect(filters.map(({ key, value }) => `${key} ${value}`)).toEqual([
    'q reed',
    'maker ostler',
    'maker tamber',
    'pen true',
  ])
  expect(withoutFilter(asked, filters[1]!)).toEqual({ q: 'reed', maker: ['tamber'], pen: true, sort: 'price' })
  expect(withoutFilter(asked, filters[3]!)).toEqual({ q: 'reed', maker: ['ostler', 'tamber'], sort: 'price' })
  expect(withoutFilter(query('maker=ostler'), filtersIn(query('maker=ostler'), [])[0]!)).toEqual({})
})

test('the filter that rules out most is named first, with what is left without it', () => {
  expect(tolls(devices, query('pen=no&max-weight=160&q=birch'))).toEqual([
    { key: 'q', ruledOut: 3, leftWithout: 1 },
    { key: 'max-weight', ruledOut: 2, leftWithout: 0 },
    { key: 'pen', ruledOut: 2, leftWithout: 1 },
  ])
})
