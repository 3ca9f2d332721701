import { describe, expect, test } from 'vitest'
import { SEEN, seenWords } from '@/lib/compare/seen'

const [alike, beside, apart] = SEEN.map(({ words }) => words)

// House thresholds, stated on the page: 1 and 3 ΔE00.
describe('a colour difference is said in words, and those the doubt allows with it', () => {
  test.each([
    ['none', 0, 0.2, alike, []],
    ['just under the first step, surely', 0.7, 0.2, alike, []],
    ['the first step itself', 1, 0, beside, []],
    ['just under the first step, perhaps over it', 0.9, 0.3, alike, [beside]],
    ['just over the first step, perhaps under it', 1.2, 0.4, beside, [alike]],
    ['between the steps', 2, 0.5, beside, []],
    ['over the second step', 3.4, 0.2, apart, []],
    ['anything, where the doubt is that large', 1.5, 2, beside, [alike, apart]],
  ])('%s', (_, deltaE00, doubt, words, orPerhaps) => {
    expect(seenWords(deltaE00, doubt)).toEqual({ words, orPerhaps })
  })
})
