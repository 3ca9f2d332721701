import { expect, test } from 'vitest'
import { PER_PAGE, requireLaterPage } from '@/lib/server/path-page'

test('the later pages of a long list are those from the second to the last', () => {
  const total = 2 * PER_PAGE + 1
  expect(requireLaterPage('2', total)).toBe(2)
  expect(requireLaterPage('3', total)).toBe(3)
})

test.each(['1', '0', '4', '02', '-2', '2.0', '2e0', ' 2', 'two', '', '99999999999999999999'])(
  'there is no later page at “%s” of a list of three',
  (text) => {
    expect(() => requireLaterPage(text, 3 * PER_PAGE)).toThrow(/NEXT_HTTP_ERROR_FALLBACK;404/)
  },
)

test('a list that fits on one page has no later one', () => {
  expect(() => requireLaterPage('2', PER_PAGE)).toThrow()
  expect(() => requireLaterPage('2', 0)).toThrow()
})
