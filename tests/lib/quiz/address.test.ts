import fc from 'fast-check'
import { expect, test } from 'vitest'
import { completeRequest } from '@/lib/contract/complete-request'
import { matchRequestSchema } from '@/lib/contract/match-request'
import { MAX_SPOTS, SPOTS } from '@/lib/method/spots'
import { pairsFrom, readAddress } from '@/lib/quiz/address'
import { NO_ANSWERS, type QuizAnswers } from '@/lib/quiz/answers'
import { FIELD_NAMES } from '@/lib/quiz/fields'
import { toRequest } from '@/lib/quiz/request'
import { canonicalTexts, queryOf, queryOfAnswers } from '@/lib/quiz/write-address'
import { anyQuizAnswers } from './arbitrary-answers'

const read = (query: string) => readAddress(new URLSearchParams(query))
const problemsOf = (query: string) => read(query).problems

test('whatever a reader answered survives the address', () => {
  fc.assert(
    fc.property(anyQuizAnswers, (answers) => {
      const address = read(queryOfAnswers(answers))
      expect(address.problems).toEqual([])
      expect(address.unknown).toEqual([])
      expect(address.answers).toEqual(answers)
    }),
    { numRuns: 500 },
  )
})

test('every address the quiz writes asks the method a question it understands', () => {
  fc.assert(
    fc.property(anyQuizAnswers, (answers) => {
      const parsed = matchRequestSchema.safeParse(toRequest(answers))
      expect(parsed.error).toBeUndefined()
    }),
    { numRuns: 500 },
  )
})

test('the canonical address of any parameters is its own canonical address', () => {
  const value = fc.oneof(
    fc.string({ unit: 'binary', maxLength: 20 }),
    fc.constantFrom('1', '2', '0', 'on', 'off', 'must', '5', '1,000', ' 7 ', '£300', 'NaN', '-1', '1e999', 'EPUB,epub'),
  )
  const pairs = fc.uniqueArray(fc.tuple(fc.constantFrom(...FIELD_NAMES), value), {
    maxLength: 12,
    selector: ([name]) => name,
  })
  fc.assert(
    fc.property(pairs, (given) => {
      const once = canonicalTexts(readAddress(given))
      const again = canonicalTexts(read(queryOf(once)))
      expect([...again]).toEqual([...once])
    }),
    { numRuns: 1000 },
  )
})

test('an address holds only what was answered, in an order of its own, and reads well', () => {
  const address = read(
    'formats=PDF&formats=EPUB&train=4&bed-lamp.lux=60&bed-lamp=7.0&desk=0&desk.lux=400&desk.light=off&novels=&hold=one-hand&own1.name=Kitchen+table&own1.lux=150&own1=2&own1.light=on&budget=£299.99&skipped=3',
  )
  expect(address.problems).toEqual([])
  expect(queryOfAnswers(address.answers)).toBe(
    'hold=one-hand&bed-lamp=7&bed-lamp.lux=60&train=4&own1=2&own1.name=Kitchen+table&own1.lux=150&budget=299.99&formats=PDF,EPUB&skipped=3',
  )
})

test('nothing in the address is no answer at all, and the method assumes everything', () => {
  expect(read('').answers).toEqual(NO_ANSWERS)
  expect(toRequest(NO_ANSWERS)).toEqual({})
  expect(completeRequest({ ...toRequest(NO_ANSWERS), edition: 'latest' }).assumed).toEqual([
    'spots',
    'lightNeed',
    'text',
    'preferredWhite',
    'aims',
    'reads',
    'hold',
    'limits',
  ])
})

test('places with ties become groups, and an aim without a place comes last', () => {
  expect(toRequest(read('clarity=2&tint=1&whiteness=2&handling=4').answers).aims).toEqual([
    ['tint'],
    ['clarity', 'whiteness'],
    ['handling'],
  ])
  expect(toRequest(read('handling=4').answers).aims).toEqual([['handling'], ['clarity', 'whiteness', 'tint']])
})

test('weights set by hand stand in for the places, which the address keeps', () => {
  const { answers } = read('clarity=1&weight.clarity=40&weight.tint=60')
  expect(answers.places).toEqual({ clarity: 1 })
  const request = toRequest(answers)
  expect(request.aims).toBeUndefined()
  expect(request.weights).toEqual({ clarity: 40, whiteness: 0, tint: 60, handling: 0 })
})

test('a budget is in pounds, and the question says so', () => {
  expect(toRequest(read('budget=300').answers).limits).toEqual({ budget: 30_000, currency: 'GBP' })
})

test('a spot whose light is changed but has no hours is remembered and not ranked', () => {
  const { answers } = read('desk.lux=300')
  expect(answers.spots).toEqual({ desk: { lux: 300 } })
  expect(toRequest(answers).spots).toBeUndefined()
})

test('a step with an answer is not one that was passed over', () => {
  expect(read('skipped=1,3,5&hold=table&budget=200').answers.skipped).toEqual([3])
})

test.each([
  ['train=abc', 'train', 'Hours in “Train, bus, café by day”: "abc" is not a number of hours a week from 0 to 168.'],
  ['train=169', 'train', 'Hours in “Train, bus, café by day”: "169" is not a number of hours a week from 0 to 168.'],
  ['train=NaN', 'train', 'Hours in “Train, bus, café by day”: "NaN" is not a number of hours a week from 0 to 168.'],
  ['desk.lux=1e9', 'desk.lux', 'Light in “Office or study desk”: "1e9" is not a number of lux from 0 to 200,000.'],
  ['desk.lux=999999999999999999', 'desk.lux', null],
  ['desk.lux=Infinity', 'desk.lux', null],
  ['desk.lux=0x10', 'desk.lux', null],
  ['train=-1', 'train', null],
  ['train=%E2%88%921', 'train', null],
  ['train=4&train=5', 'train', 'Hours in “Train, bus, café by day”: it is given twice; give it once.'],
  ['hold=three-hands', 'hold', null],
  ['hold=%00', 'hold', null],
  ['own1.lux=80&own1.name=%00', 'own1.name', null],
  ['own1.lux=80&own1.name=%E2%80%AEabc', 'own1.name', null],
  ['own1=3&own1.name=Kitchen', 'own1.lux', null],
  ['clarity=5', 'clarity', null],
  ['clarity=constructor', 'clarity', null],
  [
    'min-size=8&max-size=6',
    'min-size',
    'Smallest size: it is above the largest size, and no page is both larger and smaller.',
  ],
  ['weight.clarity=0&weight.tint=0', 'weight.clarity', null],
  ['formats=%3Cscript%3E', 'formats', null],
  ['skipped=9', 'skipped', null],
])('the address %s is told what is wrong with %s', (query, field, message) => {
  const problems = problemsOf(query)
  expect(problems.map((problem) => problem.field)).toEqual([field])
  expect(problems[0]?.message).toMatch(/^[A-Z].+: .+\.$/)
  if (message) expect(problems[0]?.message).toBe(message)
})

test('what is wrong takes nothing else with it', () => {
  const { answers, problems } = read('train=abc&desk=3&own1=2&own1.lux=x&hold=table')
  expect(problems.map(({ field }) => field)).toEqual(['train', 'own1.lux'])
  expect(answers).toEqual({ ...NO_ANSWERS, spots: { desk: { hours: 3 } }, hold: 'table' } satisfies QuizAnswers)
})

test('a step with a problem keeps what was typed, the others their canonical texts', () => {
  const address = read('train=abc&desk=3.0&budget=£200')
  expect(queryOf(canonicalTexts(address))).toBe('train=abc&desk=3.0&budget=200')
})

test('more spots than the method takes are refused by name', () => {
  const listed = SPOTS.map(({ slug }) => `${slug}=1`).join('&')
  expect(problemsOf(`${listed}&own1=1&own1.lux=5`)).toEqual([])
  expect(SPOTS.length + 1).toBe(MAX_SPOTS)
  const [problem] = problemsOf(`${listed}&own1=1&own1.lux=5&own2=1&own2.lux=5`)
  expect(problem?.field).toBe('own2')
})

test('names of the prototype, of trackers and of nobody are left out without harm', () => {
  const address = readAddress(
    pairsFrom(JSON.parse('{"__proto__":"1","constructor":"2","utm_source":"x","train":"4","toString":["a","b"]}')),
  )
  expect(address.problems).toEqual([])
  expect(address.answers.spots).toEqual({ train: { hours: 4 } })
  expect(address.unknown).toEqual(['__proto__', 'constructor', 'utm_source', 'toString'])
  expect(({} as Record<string, unknown>).train).toBeUndefined()
})

test('a thousand parameters are a problem in words', () => {
  const [problem] = problemsOf(Array.from({ length: 1000 }, (_, i) => `train=${i}`).join('&'))
  expect(problem?.field).toBeNull()
  expect(problem?.message).toContain('1000 parts')
})

test('no address throws, and every problem is a sentence', () => {
  const name = fc.oneof(fc.constantFrom(...FIELD_NAMES, '__proto__', 'step', 'go'), fc.string({ unit: 'binary' }))
  fc.assert(
    fc.property(fc.array(fc.tuple(name, fc.string({ unit: 'binary', maxLength: 700 })), { maxLength: 40 }), (pairs) => {
      const { answers, problems } = readAddress(pairs)
      for (const { message } of problems) expect(message).toMatch(/^[A-Z].+\.$/s)
      expect(matchRequestSchema.safeParse(toRequest(answers)).error).toBeUndefined()
    }),
    { numRuns: 1000 },
  )
})
