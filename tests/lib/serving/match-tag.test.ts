import { describe, expect, test } from 'vitest'
import { matchesTag } from '@/lib/serving/match-tag.mjs'

// RFC 9110, section 13.1.2 (If-None-Match) and the table of section 8.8.3.2 (weak comparison).
describe('If-None-Match names the document', () => {
  test.each([
    [null, false],
    ['"abc"', true],
    ['W/"abc"', true],
    ['*', true],
    [' * ', true],
    ['"x", "abc"', true],
    ['"x",W/"abc" , "y"', true],
    ['"abcd"', false],
    ['abc', false],
    ['', false],
    ['"ABC"', false],
  ])('%s → %s', (header, answer) => {
    expect(matchesTag(header, '"abc"')).toBe(answer)
  })
})
