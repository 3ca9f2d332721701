import { describe, expect, test } from 'vitest'
import { applyLimits, limitsSet, limitWarnings } from '@/lib/method/limits'
import type { EditionDevice, Limits } from '@/lib/method/types'
import { makeDevice } from '@/tests/fixtures/edition'

type Case = { name: string; limits: Limits; device: Partial<EditionDevice>; field: keyof EditionDevice }

// Method 1, section 7: budget and maxX pass at ≤, minX and water at ≥; true must have, false must not. Each row meets the
// limit just so; `failing` is the nearest that does not, and by how much.
const rows: (Case & { failing: Partial<EditionDevice>; by: number | null })[] = [
  {
    name: 'budget',
    limits: { budget: 30_000, currency: 'GBP' },
    device: { price: { amount: 30_000, currency: 'GBP' } },
    failing: { price: { amount: 30_001, currency: 'GBP' } },
    by: 1,
    field: 'price',
  },
  {
    name: 'least size',
    limits: { minDiagonal: 7 },
    device: { diagonal: 7 },
    failing: { diagonal: 6.8 },
    by: 0.2,
    field: 'diagonal',
  },
  {
    name: 'greatest size',
    limits: { maxDiagonal: 8 },
    device: { diagonal: 8 },
    failing: { diagonal: 10.3 },
    by: 2.3,
    field: 'diagonal',
  },
  {
    name: 'weight',
    limits: { maxWeight: 300 },
    device: { weight: 300 },
    failing: { weight: 345 },
    by: 45,
    field: 'weight',
  },
  { name: 'water', limits: { water: 7 }, device: { water: 7 }, failing: { water: 5 }, by: 2, field: 'water' },
  { name: 'pen', limits: { pen: true }, device: { pen: true }, failing: { pen: false }, by: null, field: 'pen' },
  { name: 'no pen', limits: { pen: false }, device: { pen: false }, failing: { pen: true }, by: null, field: 'pen' },
  {
    name: 'colour',
    limits: { colour: false },
    device: { colour: false },
    failing: { colour: true },
    by: null,
    field: 'colour',
  },
  {
    name: 'front light',
    limits: { frontLight: true },
    device: { frontLight: { max: 1, min: null } },
    failing: { frontLight: { max: 0, min: null } },
    by: null,
    field: 'frontLight',
  },
  {
    name: 'no front light',
    limits: { frontLight: false },
    device: { frontLight: false },
    failing: { frontLight: { max: 1, min: null } },
    by: null,
    field: 'frontLight',
  },
  {
    name: 'buttons',
    limits: { pageButtons: true },
    device: { pageButtons: true },
    failing: { pageButtons: false },
    by: null,
    field: 'pageButtons',
  },
  {
    name: 'on sale',
    limits: { onSale: true },
    device: { onSale: true },
    failing: { onSale: false },
    by: null,
    field: 'onSale',
  },
  {
    name: 'lending',
    limits: { lending: true },
    device: { lending: true },
    failing: { lending: false },
    by: null,
    field: 'lending',
  },
  {
    name: 'speech',
    limits: { speech: true },
    device: { speech: true },
    failing: { speech: false },
    by: null,
    field: 'speech',
  },
  {
    name: 'formats',
    limits: { formats: ['epub', 'PDF'] },
    device: { formats: ['PDF', 'EPUB'] },
    failing: { formats: ['EPUB'] },
    by: null,
    field: 'formats',
  },
]

describe('limits', () => {
  test.each(rows)('$name: met at the limit, and missed by as much as is said', ({ limits, device, failing, by }) => {
    const [limit] = limitsSet(limits)
    expect(applyLimits([makeDevice({ slug: 'a', ...device })], limits)).toMatchObject({
      left: [{ notStated: [] }],
      excluded: [],
      nearMisses: [],
    })
    expect(applyLimits([makeDevice({ slug: 'a', ...failing })], limits)).toEqual({
      left: [],
      excluded: [{ slug: 'a', failed: [limit] }],
      nearMisses: [{ slug: 'a', limit, by }],
    })
  })

  test.each(rows)('$name not stated keeps the device, and is named', ({ limits, field }) => {
    const device = makeDevice({ slug: 'a', [field]: null })
    expect(applyLimits([device], limits)).toEqual({
      left: [{ device, notStated: [field] }],
      excluded: [],
      nearMisses: [],
    })
  })

  test('a price in another currency is not stated, however high', () => {
    const device = makeDevice({ slug: 'a', price: { amount: 99_999, currency: 'EUR' } })
    expect(applyLimits([device], { budget: 100, currency: 'GBP' }).left).toEqual([{ device, notStated: ['price'] }])
  })

  test('a device that fails two limits is no near miss; what is not stated beside one failure does not matter', () => {
    const device = makeDevice({ slug: 'a', pen: false, colour: false, water: null })
    expect(applyLimits([device], { pen: true, colour: true, water: 7 })).toEqual({
      left: [],
      excluded: [{ slug: 'a', failed: ['pen', 'colour'] }],
      nearMisses: [],
    })
    expect(applyLimits([device], { pen: true, water: 7 }).nearMisses).toEqual([{ slug: 'a', limit: 'pen', by: null }])
  })

  test('no limit, and formats of which none is named, exclude nobody', () => {
    const device = makeDevice({ slug: 'a', formats: null, price: null })
    expect(applyLimits([device], {}).left).toEqual([{ device, notStated: [] }])
    expect(applyLimits([device], { formats: [] }).left).toEqual([{ device, notStated: [] }])
  })

  test('the order given is kept', () => {
    const devices = ['c', 'a', 'b'].map((slug) => makeDevice({ slug }))
    expect(applyLimits(devices, { pen: false }).left.map(({ device }) => device.slug)).toEqual(['c', 'a', 'b'])
  })

  test('more than three limits, or fewer than three devices left by them, draw a warning', () => {
    const three: Limits = { budget: 1, currency: 'GBP', pen: true, water: 1 }
    expect(limitWarnings(three, 3)).toEqual([])
    expect(limitWarnings({ ...three, colour: false }, 3)).toEqual(['many-limits'])
    expect(limitWarnings(three, 2)).toEqual(['few-devices'])
    expect(limitWarnings({}, 1)).toEqual([])
  })
})
