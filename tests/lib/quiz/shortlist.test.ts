import { expect, test } from 'vitest'
import { readAddress } from '@/lib/quiz/address'
import { shortlistOf } from '@/lib/quiz/shortlist'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const edition = makeEdition([
  makeDevice({ slug: 'lit', name: 'Lit', price: { amount: 20_000, currency: 'GBP' } }),
  makeDevice({ slug: 'unlit', name: 'Unlit', frontLight: false, price: { amount: 10_000, currency: 'GBP' } }),
  makeDevice({ slug: 'pen', name: 'Pen', pen: true, price: { amount: 50_000, currency: 'GBP' } }),
])
const listFor = (query: string) => shortlistOf(edition, readAddress(new URLSearchParams(query)).answers)

test('before any answer the shortlist stands on what is assumed, and says so', () => {
  const { rows, left, of, assumptions } = listFor('')
  expect(rows.map(({ slug }) => slug)).toEqual(['lit', 'pen', 'unlit'])
  expect([left, of]).toEqual([3, 3])
  expect(assumptions.open).toHaveLength(8)
})

test('a device the limits leave out is listed with the reason and the amount', () => {
  const { rows, excluded, left, warnings } = listFor('budget=300&pen=must-not')
  expect(rows).toHaveLength(2)
  expect(left).toBe(2)
  expect(excluded).toEqual([{ slug: 'pen', name: 'Pen', why: 'costs £500, £200 over your budget and takes a pen' }])
  expect(warnings).toEqual(['few-devices'])
})

test('a device that cannot be read anywhere is not ranked among those that can', () => {
  const { rows, unreadable } = listFor('bed-dark=7')
  expect(rows.map(({ slug }) => slug)).toEqual(['lit', 'pen'])
  expect(unreadable).toEqual([{ slug: 'unlit', name: 'Unlit' }])
})

test('where nothing can be read nothing is ranked', () => {
  const { rows, unreadable } = listFor('bed-dark=7&bed-dark.light=off')
  expect(rows).toEqual([])
  expect(unreadable).toHaveLength(3)
})

test('more than three limits draw a warning', () => {
  expect(listFor('budget=600&min-size=5&max-size=9&max-weight=400').warnings).toEqual(['many-limits'])
})
