import { describe, expect, test } from 'vitest'
import { completeAnswers } from '@/lib/method/answers'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import { makeAnswers } from '@/tests/fixtures/edition'

describe('what is assumed', () => {
  // Method 1, section 0.
  test('of a reader who answers nothing, everything, and each part is named', () => {
    expect(completeAnswers({})).toEqual({
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
      assumed: ['spots', 'lightNeed', 'text', 'preferredWhite', 'aims', 'reads', 'hold', 'limits'],
    })
  })

  test('what is answered is kept, a field left undefined is not an answer', () => {
    const { answers, assumed } = completeAnswers({ hold: 'table', text: undefined, limits: { pen: true } })
    expect(answers).toMatchObject({ hold: 'table', text: 'normal', limits: { pen: true } })
    expect(assumed).toEqual(['spots', 'lightNeed', 'text', 'preferredWhite', 'aims', 'reads'])
  })

  test('weights set by hand stand in for the aims', () => {
    const weights = { clarity: 1, whiteness: 1, tint: 1, handling: 1 }
    expect(completeAnswers({ ...makeAnswers({ weights }), aims: undefined }).assumed).toEqual([])
  })

  test('the defaults themselves cannot be altered through an answer', () => {
    completeAnswers({}).answers.spots[0]!.lux = 1
    expect(DEFAULT_ANSWERS.spots[0]!.lux).toBe(80)
  })
})
