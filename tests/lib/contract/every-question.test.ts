import fc from 'fast-check'
import { expect, test } from 'vitest'
import { completeRequest } from '@/lib/contract/complete-request'
import { matchAnswerSchema } from '@/lib/contract/match-answer'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { fieldErrors } from '@/lib/contract/problem'
import { match } from '@/lib/method/ranking'
import { AIMS, HOLDS, LIGHT_NEEDS, READING_KINDS, TEXT_SIZES, WHITES } from '@/lib/method/types'
import { makeDevice, makeEdition } from '../../fixtures/edition'

const edition = makeEdition([
  makeDevice({ slug: 'plain' }),
  makeDevice({ slug: 'dark', frontLight: false, page: { L: 58, a: -2, b: 2, u: { L: 0.5, a: 0.2, b: 0.2 } } }),
  makeDevice({ slug: 'unknown', frontLight: null, diagonal: null, ppi: null, weight: null, price: null, pen: null }),
])

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const some = <T>(part: fc.Arbitrary<T>) => fc.option(part, { nil: undefined })
const spot = fc.record({ lux: number(0, 200_000), hours: number(0, 168), frontLight: fc.boolean() })
const spots = fc.array(spot, { minLength: 1, maxLength: 4 }).filter((list) => list.some(({ hours }) => hours > 0))
// Groups from any order of the aims, cut at any places.
const aims = fc
  .tuple(fc.shuffledSubarray([...AIMS], { minLength: 4 }), fc.array(fc.boolean(), { minLength: 4, maxLength: 4 }))
  .map(([order, cuts]) =>
    order.reduce<string[][]>((groups, aim, place) => {
      if (place === 0 || cuts[place]) groups.push([aim])
      else groups.at(-1)?.push(aim)
      return groups
    }, []),
  )
const weights = fc
  .record(Object.fromEntries(AIMS.map((aim) => [aim, number(0, 1e9)])))
  .filter((given) => Object.values(given).some((weight) => weight > 0))
const limits = fc.record(
  {
    budget: fc.integer({ min: 0, max: 1e9 }),
    currency: fc.constantFrom('GBP', 'EUR'),
    minDiagonal: number(0, 8),
    maxDiagonal: number(8, 100),
    maxWeight: number(0, 100_000),
    pen: fc.boolean(),
    frontLight: fc.boolean(),
    water: fc.integer({ min: 0, max: 9 }),
    formats: fc.uniqueArray(fc.constantFrom('EPUB', 'PDF', 'CBZ'), { minLength: 1 }),
  },
  { requiredKeys: [] },
)
const question = fc
  .record({
    spots: some(spots),
    lightNeed: some(fc.constantFrom(...LIGHT_NEEDS)),
    text: some(fc.constantFrom(...TEXT_SIZES)),
    preferredWhite: some(fc.constantFrom(...WHITES)),
    hold: some(fc.constantFrom(...HOLDS)),
    reads: some(fc.dictionary(fc.constantFrom(...READING_KINDS), number(0, 1e9), { noNullPrototype: true })),
    limits: some(limits),
    order: fc.oneof(
      fc.constant({}),
      aims.map((aims) => ({ aims })),
      weights.map((weights) => ({ weights })),
    ),
  })
  .map(({ order, ...rest }) => ({ ...rest, ...order }))

test('every question the contract lets in has an answer that holds to the contract', () => {
  fc.assert(
    fc.property(question, (given) => {
      const { answers, assumed } = completeRequest(matchRequestSchema.parse(given))
      const answer = { ...match(edition, answers, { draws: 40 }), assumed }
      // As a reader gets it: through JSON, which turns what is not a number into null.
      expect(matchAnswerSchema.safeParse(JSON.parse(JSON.stringify(answer))).error).toBeUndefined()
    }),
    { numRuns: 300 },
  )
})

test('anything at all is either a question or refused in whole sentences, and never an exception', () => {
  fc.assert(
    fc.property(fc.anything(), (given) => {
      const parsed = matchRequestSchema.safeParse(given)
      if (parsed.success) return
      for (const { message } of fieldErrors(parsed.error)) expect(message).toMatch(/ .+\.$/s)
    }),
    { numRuns: 2000 },
  )
})

test('a question with one value spoilt is refused', () => {
  const spoilt = fc.constantFrom(null, Number.NaN, -1, 'x', [], {}, 1e12)
  const field = fc.constantFrom('spots', 'lightNeed', 'text', 'preferredWhite', 'aims', 'weights', 'hold')
  fc.assert(
    fc.property(field, spoilt, (name, value) => {
      const parsed = matchRequestSchema.safeParse({ [name]: value })
      expect(parsed.success).toBe(false)
      if (!parsed.success) expect(fieldErrors(parsed.error)[0]?.field.split('.')[0]).toBe(name)
    }),
  )
})
