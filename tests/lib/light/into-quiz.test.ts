import { expect, test } from 'vitest'
import { completeRequest } from '@/lib/contract/complete-request'
import { type LightChoice, OPENING } from '@/lib/light/choice'
import { quizWithLight } from '@/lib/light/into-quiz'
import { readAddress } from '@/lib/quiz/address'
import { quizHref } from '@/lib/quiz/moves'
import { toRequest } from '@/lib/quiz/request'

const lights: Partial<LightChoice>[] = [
  {},
  { frontLight: true },
  { lux: 250, frontLight: true },
  { lux: 250 },
  { lux: 93 },
  { lux: 0.1, frontLight: true },
  { lux: 1.5, frontLight: true, lightNeed: 'much-more', text: 'small' },
]

test.each(lights)('the quiz takes %j as one reading spot, and its own address is the same', (part) => {
  const choice = { ...OPENING, ...part }
  const href = quizWithLight(choice)
  const address = readAddress([...new URLSearchParams(href.split('?')[1])].filter(([name]) => name !== 'step'))
  expect(address.problems).toEqual([])
  expect(address.unknown).toEqual([])
  expect(quizHref(2, address)).toBe(href)
  const { answers } = completeRequest(toRequest(address.answers))
  expect(answers.spots).toEqual([{ lux: choice.lux, hours: 7, frontLight: choice.frontLight }])
  expect(answers.lightNeed).toBe(choice.lightNeed)
  expect(answers.text).toBe(choice.text)
})
