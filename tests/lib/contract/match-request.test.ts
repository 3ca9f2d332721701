import { describe, expect, test } from 'vitest'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { fieldErrors } from '@/lib/contract/problem'

// The request printed in Method 1, section 8, word for word.
const PRINTED = {
  edition: 'latest',
  spots: [{ lux: 80, hours: 7, frontLight: true }],
  lightNeed: 'usual',
  text: 'normal',
  preferredWhite: 'neutral',
  aims: [['clarity'], ['whiteness', 'tint'], ['handling']],
  reads: { novels: 3, articles: 1 },
  hold: 'two-hands',
  limits: {
    budget: 30000,
    currency: 'GBP',
    minDiagonal: 6,
    maxDiagonal: 8,
    maxWeight: 300,
    pen: true,
    colour: false,
    frontLight: true,
    water: 7,
    pageButtons: true,
    onSale: true,
    lending: true,
    speech: true,
    formats: ['EPUB'],
  },
}

const spot = { lux: 80, hours: 5, frontLight: true }
const errors = (request: unknown) => {
  const parsed = matchRequestSchema.safeParse(request)
  return parsed.success ? [] : fieldErrors(parsed.error)
}

test('the request printed in the method is understood and comes back unchanged', () => {
  expect(matchRequestSchema.parse(PRINTED)).toEqual(PRINTED)
})

test('an empty request is a question: everything is then assumed', () => {
  expect(matchRequestSchema.parse({})).toEqual({})
})

describe('what is right at the edges', () => {
  test.each([
    { name: 'no light at all', request: { spots: [{ ...spot, lux: 0 }] } },
    { name: 'the strongest light', request: { spots: [{ ...spot, lux: 200_000 }] } },
    { name: 'a spot of no hours beside one with some', request: { spots: [{ ...spot, hours: 0 }, spot] } },
    { name: 'all hours of the week', request: { spots: [{ ...spot, hours: 168 }] } },
    { name: 'twelve spots', request: { spots: Array(12).fill(spot) } },
    { name: 'all aims level', request: { aims: [['clarity', 'whiteness', 'tint', 'handling']] } },
    { name: 'no kind of reading', request: { reads: {} } },
    { name: 'one weight alone above 0', request: { weights: { clarity: 0, whiteness: 0, tint: 1, handling: 0 } } },
    { name: 'an edition by its number', request: { edition: 2 } },
    { name: 'a budget of nothing', request: { limits: { budget: 0 } } },
  ])('$name', ({ request }) => {
    expect(errors(request)).toEqual([])
  })
})

describe('what is wrong names the field, what was wrong and what would be right', () => {
  test.each([
    { request: [], field: '', message: 'The request is an empty list; give a JSON object.' },
    { request: null, field: '', message: 'The request is null; give a JSON object.' },
    {
      request: { spots: [{ ...spot, lux: -3 }] },
      field: 'spots.0.lux',
      message: 'spots.0.lux is −3; give a number from 0 to 200,000, in lux.',
    },
    {
      request: { spots: [spot, { hours: 1, frontLight: false }] },
      field: 'spots.1.lux',
      message: 'spots.1.lux is missing; give a number from 0 to 200,000, in lux.',
    },
    {
      request: { spots: [{ ...spot, hours: '5' }] },
      field: 'spots.0.hours',
      message: 'spots.0.hours is "5"; give a number of hours a week from 0 to 168.',
    },
    {
      request: { spots: Array(1000).fill(spot) },
      field: 'spots',
      message: 'spots has 1000 entries; give one to 12 spots, or leave the field out.',
    },
    {
      request: { spots: [] },
      field: 'spots',
      message: 'spots is an empty list; give one to 12 spots, or leave the field out.',
    },
    {
      request: { spots: [{ ...spot, hours: 0 }] },
      field: 'spots',
      message: 'spots has no hours; give at least one spot more than 0 hours a week.',
    },
    {
      request: { aims: [['clarity'], ['whiteness', 'clarity'], ['tint', 'handling']] },
      field: 'aims',
      message: 'aims names "clarity" twice; name each of clarity, whiteness, tint, handling once.',
    },
    {
      request: { aims: [['clarity', 'tint']] },
      field: 'aims',
      message: 'aims leaves out whiteness, handling; name each of clarity, whiteness, tint, handling once.',
    },
    { request: { aims: [['clarity'], []] }, field: 'aims.1' },
    { request: { aims: [['speed']] }, field: 'aims.0.0' },
    {
      request: { lightNeed: 'a lot' },
      field: 'lightNeed',
      message: 'lightNeed is "a lot"; give "usual" or "more" or "much-more".',
    },
    { request: { weights: { clarity: 0, whiteness: 0, tint: 0, handling: 0 } }, field: 'weights' },
    { request: { weights: { clarity: 1, whiteness: 1, tint: 1 } }, field: 'weights.handling' },
    {
      request: { weights: { clarity: 1, whiteness: 1, tint: 1, handling: 1 }, aims: PRINTED.aims },
      field: 'weights',
      message: 'weights stands beside aims; weights replace aims, so give one of the two.',
    },
    { request: { reads: { novels: -1 } }, field: 'reads.novels' },
    { request: { reads: { poems: 1 } }, field: 'reads.poems' },
    { request: { hold: null }, field: 'hold' },
    { request: { edition: 0 }, field: 'edition', message: 'edition is 0; give "latest" or the number of an edition.' },
    { request: { edition: 2_147_483_648 }, field: 'edition' },
    { request: { edition: 1.5 }, field: 'edition' },
    { request: { limits: { budget: 299.5 } }, field: 'limits.budget' },
    { request: { limits: { budget: 1e300 } }, field: 'limits.budget' },
    { request: { limits: { currency: 'gbp' } }, field: 'limits.currency' },
    { request: { limits: { water: 10 } }, field: 'limits.water' },
    { request: { limits: { pen: 'yes' } }, field: 'limits.pen' },
    { request: { limits: { formats: [] } }, field: 'limits.formats' },
    { request: { limits: { formats: ['EPUB', 'EPUB'] } }, field: 'limits.formats' },
    { request: { limits: { minDiagonal: 8, maxDiagonal: 6 } }, field: 'limits.minDiagonal' },
    { request: { limits: { price: 3 } }, field: 'limits.price' },
    { request: { role: 'admin' }, field: 'role' },
  ])('$request → $field', ({ request, field, message }) => {
    const [first] = errors(request)
    expect(first?.field).toBe(field)
    if (message) expect(first?.message).toBe(message)
    else expect(first?.message).toMatch(/; (give|name|the fields|no page)/)
  })
})

describe('values that JSON cannot hold or databases choke on are refused', () => {
  // ECMAScript: JSON.parse reads 1e999 as Infinity and keeps "__proto__" as an own name.
  test.each([
    ['an endless number', '{"spots":[{"lux":1e999,"hours":1,"frontLight":true}]}', 'spots.0.lux'],
    ['a name that would reach the prototype', '{"__proto__":{"lightNeed":"more"}}', '__proto__'],
    ['the same inside a spot', '{"spots":[{"lux":1,"hours":1,"frontLight":true,"__proto__":{}}]}', 'spots.0.__proto__'],
    ['U+0000 in a format', '{"limits":{"formats":["EP\\u0000UB"]}}', 'limits.formats.0'],
    ['half a surrogate pair in a currency', '{"limits":{"currency":"G\\ud800P"}}', 'limits.currency'],
    ['a line break after a currency', '{"limits":{"currency":"GBP\\n"}}', 'limits.currency'],
  ])('%s', (_, text, field) => {
    expect(errors(JSON.parse(text)).map((error) => error.field)).toContain(field)
  })

  test('NaN', () => {
    expect(errors({ spots: [{ ...spot, lux: Number.NaN }] })[0]?.field).toBe('spots.0.lux')
  })
})

test('a thousand wrong fields draw fifty complaints, not a thousand', () => {
  const request = Object.fromEntries(Array.from({ length: 1000 }, (_, index) => [`field${index}`, 1]))
  expect(errors(request)).toHaveLength(50)
})

test('a long name is cut in the answer', () => {
  expect(errors({ ['x'.repeat(5000)]: 1 })[0]?.field).toHaveLength(61)
})
