import { expect, test } from 'vitest'
import { specRows } from '@/lib/compare/specs'
import { makeDevice } from '../../fixtures/edition'

const one = makeDevice({ slug: 'one', pen: null, weight: 200, formats: ['PDF', 'EPUB'] })
const other = makeDevice({ slug: 'other', pen: false, weight: 200, formats: ['EPUB', 'PDF'], frontLight: false })
const row = (rows: ReturnType<typeof specRows>['differ'], key: string) => rows.find((one) => one.key === key)?.values

test('what differs stands apart from what is the same, and not stated differs from no', () => {
  const { differ, same } = specRows([one, other], 'metric')
  expect(differ.map(({ key }) => key)).toEqual(['pen', 'frontLight'])
  expect(row(differ, 'pen')).toEqual([null, 'no'])
  expect(row(differ, 'frontLight')).toEqual(['1.2 to 95\u202fcd/m²', 'none'])
  expect(row(same, 'formats')).toEqual(['EPUB and PDF', 'EPUB and PDF'])
})

test('sizes and weights are in the reader’s units, prices in their own currency', () => {
  const abroad = makeDevice({ slug: 'abroad', price: { amount: 19900, currency: 'EUR' } })
  const { differ, same } = specRows([one, abroad], 'inch')
  expect(row(differ, 'price')).toEqual(['£129', '€199'])
  expect(row(differ, 'weight')).toEqual(['7.1\u202foz', '6.2\u202foz'])
  expect(row(same, 'diagonal')?.[0]).toBe('6.0\u202fin')
  const metric = specRows([one, abroad], 'metric')
  expect(row(metric.differ, 'weight')).toEqual(['200\u202fg', '175\u202fg'])
})

test('what is no longer on sale has no price, which is not the same as a price not stated', () => {
  const gone = makeDevice({ slug: 'gone', price: null, onSale: false })
  const silent = makeDevice({ slug: 'silent', price: null, onSale: null })
  expect(row(specRows([gone, silent], 'metric').differ, 'price')).toEqual(['none: no longer on sale', null])
})
