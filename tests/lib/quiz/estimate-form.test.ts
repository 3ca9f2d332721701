import { expect, test } from 'vitest'
import { readEstimate } from '@/lib/quiz/estimate-form'

const read = (query: string) => readEstimate(new URLSearchParams(query))

test('nothing is estimated before a form is sent', () => {
  expect(read('estimate=desk&lumens=470')).toEqual({ way: null, estimate: null, problem: null })
  expect(read('way=constructor').way).toBeNull()
})

test.each([
  ['way=see&see=4', { lux: 200, low: 100, high: 500 }],
  ['way=lamp&lamp=470&distance=40', { lux: 230, low: 120, high: 470 }],
  ['way=lamp&lamp=470&lumens=806&distance=1e9&distance=40', null],
  ['way=lamp&lamp=250&lumens=470&distance=40', { lux: 230, low: 120, high: 470 }],
  ['way=camera&ev=8', { lux: 120, low: 59, high: 240 }],
])('%s is estimated', (query, estimate) => {
  expect(read(query).estimate).toEqual(estimate)
})

test.each([
  ['way=see', 'Choose what comes nearest'],
  ['way=see&see=99', 'Choose what comes nearest'],
  ['way=lamp&lamp=470', 'number of centimetres from 5 to 1,000'],
  ['way=lamp&lamp=470&distance=0', 'number of centimetres from 5 to 1,000'],
  ['way=lamp&lumens=lots&distance=40', 'lumens must be a number from 1 to 20,000'],
  ['way=camera&ev=99', 'exposure value must be a number from −4 to 18'],
])('%s is told what is missing', (query, words) => {
  const { estimate, problem } = read(query)
  expect(estimate).toBeNull()
  expect(problem).toContain(words)
})
