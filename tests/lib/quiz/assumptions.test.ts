import { expect, test } from 'vitest'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import { NO_ANSWERS } from '@/lib/quiz/answers'
import { ASSUMED, assumedOnSkipping, assumptionsOf } from '@/lib/quiz/assumptions'
import { namedSpots } from '@/lib/quiz/request'

// Method 1, section 0: what is assumed where a reader does not answer. The words beside are held to it here.
test('the words for what is assumed say what Method 1 assumes', () => {
  expect(DEFAULT_ANSWERS).toEqual({
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
  })
  expect(Object.fromEntries(Object.entries(ASSUMED).map(([field, { words }]) => [field, words]))).toEqual({
    spots: '5 hours a week in bed by a small lamp and 2 on a train or in a café by day',
    lightNeed: 'the usual need for light',
    text: 'type of normal size',
    preferredWhite: 'a neutral white',
    aims: 'four aims that matter alike',
    reads: 'mostly novels and a few articles',
    hold: 'a device held in two hands',
    limits: 'no limits',
  })
})

test('the spots that are assumed go by the names of the listed ones', () => {
  expect(namedSpots(NO_ANSWERS).map(({ slug, hours }) => [slug, hours])).toEqual([
    ['bed-lamp', 5],
    ['train', 2],
  ])
})

test('what is open and what one was not sure of are told apart, in the order of the steps', () => {
  expect(assumptionsOf(['edition', 'limits', 'text', 'hold'], { skipped: [3] })).toEqual({
    open: ['how you hold it', 'limits'],
    unsure: ['type size'],
    words: 'a device held in two hands, type of normal size and no limits',
  })
})

test('a step says what is assumed if it is passed over', () => {
  expect(assumedOnSkipping(3)).toBe('the usual need for light and type of normal size')
})
