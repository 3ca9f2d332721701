import { expect, test } from 'vitest'
import { completeRequest } from '@/lib/contract/complete-request'

// Method 1, section 0, typed again here rather than read from the code.
test('an empty question takes every default of the method and names each', () => {
  expect(completeRequest({})).toEqual({
    answers: {
      spots: [
        { lux: 80, hours: 5, frontLight: true },
        { lux: 200, hours: 2, frontLight: false },
      ],
      lightNeed: 'usual',
      text: 'normal',
      preferredWhite: 'neutral',
      aims: [['clarity', 'whiteness', 'tint', 'handling']],
      weights: null,
      reads: { novels: 3, articles: 1 },
      hold: 'two-hands',
      limits: {},
    },
    assumed: ['edition', 'spots', 'lightNeed', 'text', 'preferredWhite', 'aims', 'reads', 'hold', 'limits'],
  })
})

test('weights set by hand stand in for the aims, so the aims are not missed', () => {
  const { answers, assumed } = completeRequest({ weights: { clarity: 1, whiteness: 0, tint: 0, handling: 0 } })
  expect(assumed).not.toContain('aims')
  expect(answers.weights).toEqual({ clarity: 1, whiteness: 0, tint: 0, handling: 0 })
})

test('a budget without a currency is in pounds, and the answer says that this was assumed', () => {
  const { answers, assumed } = completeRequest({ edition: 1, limits: { budget: 20_000 } })
  expect(answers.limits).toEqual({ budget: 20_000, currency: 'GBP' })
  expect(assumed).toContain('limits.currency')
  expect(assumed).not.toContain('limits')
  expect(assumed).not.toContain('edition')
})

test('a budget in another currency keeps it', () => {
  const { answers, assumed } = completeRequest({ limits: { budget: 20_000, currency: 'EUR' } })
  expect(answers.limits.currency).toBe('EUR')
  expect(assumed).not.toContain('limits.currency')
})
