import fc from 'fast-check'
import { expect, test } from 'vitest'
import { readAddress } from '@/lib/quiz/address'
import { STEPS } from '@/lib/quiz/answers'
import { hrefAfter, quizHref, resultHref, stepIn, targetIn, withLux } from '@/lib/quiz/moves'
import { queryOfAnswers } from '@/lib/quiz/write-address'
import { anyQuizAnswers } from './arbitrary-answers'

const read = (query: string) => readAddress(new URLSearchParams(query))

test.each([
  ['next', 1, 'hold=table', '/quiz?step=2&hold=table'],
  ['next', 5, 'budget=£200', '/quiz/result?budget=200'],
  ['back', 2, 'train=4', '/quiz?train=4'],
  ['back', 1, '', '/quiz'],
  ['skip', 2, 'train=4&hold=table', '/quiz?step=3&hold=table&skipped=2'],
  ['skip', 5, 'skipped=2&pen=must', '/quiz/result?skipped=2,5'],
  ['here', 2, 'train=4.0', '/quiz?step=2&train=4'],
  ['estimate.desk', 2, 'desk=4', '/quiz?step=2&estimate=desk&desk=4'],
  ['next', 2, 'train=abc', null],
  ['here', 2, 'train=abc', null],
  ['back', 2, 'train=abc', '/quiz?train=abc'],
  ['skip', 2, 'train=abc', '/quiz?step=3&skipped=2'],
  ['next', 3, 'train=abc', '/quiz?step=4&train=abc'],
  ['no such button', 3, 'train=4', '/quiz?step=3&train=4'],
] as const)('“%s” on step %i with %s leads to %s', (go, step, query, href) => {
  expect(hrefAfter(go, step, read(query))).toBe(href)
})

test('no way through the quiz and back loses an answer', () => {
  fc.assert(
    fc.property(
      anyQuizAnswers,
      fc.constantFrom(...STEPS),
      fc.constantFrom('next', 'back', 'here'),
      (answers, step, go) => {
        const href = hrefAfter(go, step, read(queryOfAnswers(answers)))
        expect(read(href?.split('?')[1] ?? '').answers).toEqual(answers)
      },
    ),
  )
})

test('a step that does not exist is the first, and only spots can be estimated', () => {
  expect([stepIn('3'), stepIn('9'), stepIn('1.5'), stepIn(undefined), stepIn('__proto__')]).toEqual([3, 1, 1, 1, 1])
  expect([targetIn('desk'), targetIn('own3'), targetIn('own99'), targetIn('constructor')]).toEqual([
    'desk',
    'own3',
    null,
    null,
  ])
})

test('an estimated light goes to its spot, and makes one of the reader’s own', () => {
  expect(quizHref(2, withLux('desk', 230, read('desk=3')))).toBe('/quiz?step=2&desk=3&desk.lux=230')
  expect(quizHref(2, withLux('own1', 230, read('desk=3')))).toBe('/quiz?step=2&desk=3&own1.lux=230')
  expect(resultHref(withLux('desk', 400, read('desk=3&desk.lux=300')))).toBe('/quiz/result?desk=3')
})
