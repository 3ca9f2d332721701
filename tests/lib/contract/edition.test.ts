import { describe, expect, test } from 'vitest'
import { editionSchema } from '@/lib/contract/edition'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const good = makeEdition([
  makeDevice({ slug: 'plain-6' }),
  makeDevice({ slug: 'plain-7', frontLight: null, price: null }),
])
const withDevice = (fields: object) => ({ ...good, devices: [{ ...good.devices[0], ...fields }] })

test('an edition as the code builds it holds to the contract', () => {
  expect(editionSchema.parse(good)).toEqual(good)
})

describe('an edition is refused', () => {
  test.each([
    ['with a field more', { ...good, draft: true }],
    ['with a device field more', withDevice({ serial: 'A1' })],
    ['with a fingerprint that is none', { ...good, sha256: 'abc' }],
    ['with a figure that is not a number', withDevice({ contrast: Number.NaN })],
    ['with L* above 100', withDevice({ page: { L: 101, a: 0, b: 0, u: { L: 0, a: 0, b: 0 } } })],
    ['with a doubt below 0', withDevice({ page: { L: 70, a: 0, b: 0, u: { L: -1, a: 0, b: 0 } } })],
    ['with session shares that do not sum to 1', withDevice({ sessions: { 'session-1': 0.5 } })],
    ['with undefined for “not stated”', withDevice({ weight: undefined })],
    ['with a price in parts of a penny', withDevice({ price: { amount: 99.5, currency: 'GBP' } })],
  ])('%s', (_, edition) => {
    expect(editionSchema.safeParse(edition).success).toBe(false)
  })
})
