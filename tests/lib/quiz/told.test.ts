import { expect, test } from 'vitest'
import { readAddress } from '@/lib/quiz/address'
import { toldBy } from '@/lib/quiz/told'

const told = (query: string) =>
  toldBy(readAddress(new URLSearchParams(query)).answers).map(({ topic, words }) => [
    topic,
    words.replaceAll('\u202f', ' '),
  ])

test('a reader’s answers are told back in words, and only those given', () => {
  expect(told('')).toEqual([])
  expect(
    told(
      'novels=3&comics=0&articles=1&hold=one-hand&bed-lamp=7&train=4.5&own1=2&own1.lux=150&own1.name=Kitchen&light-need=more&type-size=small&clarity=1&tint=2&whiteness=2&white=warm&budget=250&min-size=6&colour=must-not&pen=must&water=7&formats=EPUB,PDF',
    ),
  ).toEqual([
    ['You read', 'a lot: novels and other long prose; a little: articles and web pages'],
    ['You hold it', 'in one hand'],
    [
      'Where',
      '7 h In bed, small lamp at arm’s length (80 lux, front light allowed); 4.5 h Train, bus, café by day (200 lux); 2 h Kitchen (150 lux, front light allowed)',
    ],
    ['Light', 'more than others want'],
    ['Type', 'small'],
    [
      'What matters',
      '1st being clear in your light; 2nd being white, not grey and being free of tint; the other behind',
    ],
    ['White', 'warm white'],
    [
      'Limits',
      'at most £250; from 6 inches; must take a pen; must not be in colour; water code of 7 or better; opens EPUB and PDF',
    ],
  ])
})

test('weights set by hand are told in place of the order', () => {
  expect(told('clarity=1&weight.clarity=40&weight.tint=60')).toEqual([
    [
      'What matters',
      'weights by hand: being clear in your light 40, being white, not grey 0, being free of tint 60, size, weight and sharpness 0',
    ],
  ])
})
