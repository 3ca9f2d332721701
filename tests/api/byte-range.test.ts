import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { byteRange } from '@/app/api/byte-range'

// RFC 9110, sections 14.1.2 (its own examples: 0-499, 500-999, -500, 9500-) and 14.2, of a file of 10,000 bytes.
describe('a range of bytes', () => {
  test.each([
    { header: 'bytes=0-499', first: 0, last: 499 },
    { header: 'bytes=500-999', first: 500, last: 999 },
    { header: 'bytes=-500', first: 9500, last: 9999 },
    { header: 'bytes=9500-', first: 9500, last: 9999 },
    { header: 'bytes=0-0', first: 0, last: 0 },
    { header: 'bytes=-1', first: 9999, last: 9999 },
    { header: 'bytes=9999-20000', first: 9999, last: 9999 },
    { header: 'bytes=-20000', first: 0, last: 9999 },
    { header: 'BYTES=0-1', first: 0, last: 1 },
  ])('$header is $first to $last', ({ header, first, last }) => {
    expect(byteRange(header, 10_000)).toEqual({ first, last })
  })

  test.each(['bytes=10000-', 'bytes=10000-10001', 'bytes=-0', `bytes=${'9'.repeat(400)}-`])(
    '%s begins past the end',
    (header) => {
      expect(byteRange(header, 10_000)).toBe('unsatisfiable')
    },
  )

  test.each([
    null,
    '',
    'bytes',
    'bytes=',
    'bytes=-',
    'bytes=5-4',
    'bytes=a-b',
    'lines=0-1',
    'bytes=0-1,3-4',
    'bytes=0-1;',
    'bytes=+1-2',
  ])('%s asks for none, so the whole is sent', (header) => {
    expect(byteRange(header, 10_000)).toBeNull()
  })

  test('always lies in the file', () => {
    fc.assert(
      fc.property(fc.nat(), fc.nat(), fc.nat(5000), (from, to, length) => {
        const range = byteRange(`bytes=${from}-${to}`, length)
        if (range === null || range === 'unsatisfiable') return
        expect(range.first).toBeLessThanOrEqual(range.last)
        expect(range.last).toBeLessThan(length)
      }),
      { seed: 20_261_201 },
    )
  })
})
