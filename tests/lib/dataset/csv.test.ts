import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { csvText, defendText, undefendText } from '@/lib/dataset/csv'
import type { Table } from '@/lib/dataset/table'
import { readCsv } from '@/tests/dataset/read-csv'

const table: Table = {
  name: 'sample',
  title: 'Sample',
  description: 'For the test.',
  key: ['n'],
  columns: [
    { name: 'n', type: 'number', meaning: 'A number.', empty: 'Not measured.' },
    { name: 't', type: 'text', meaning: 'A text.', empty: 'Not said.' },
    { name: 'yes', type: 'boolean', meaning: 'Whether.' },
  ],
}
const write = (n: number | null, t: string | null) => csvText(table, [{ n, t, yes: true }])

describe('a CSV file', () => {
  // RFC 4180, section 2: CRLF after every line, quotes round what holds a comma, a quote or a line end, quotes doubled.
  test.each([
    { t: 'plain', line: '1,plain,true\r\n' },
    { t: 'a, b', line: '1,"a, b",true\r\n' },
    { t: 'say "yes"', line: '1,"say ""yes""",true\r\n' },
    { t: 'two\nlines', line: '1,"two\nlines",true\r\n' },
    { t: null, line: '1,,true\r\n' },
    { t: '', line: '1,"",true\r\n' },
  ])('writes the text $t by RFC 4180', ({ t, line }) => {
    expect(write(1, t)).toBe(`n,t,yes\r\n${line}`)
  })

  test('gives back every number and every text it was given', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), fc.string({ unit: 'binary' }), (n, t) => {
        const [row] = readCsv(write(n, t))
        expect(Object.is(Number(row!.n), n)).toBe(true)
        expect(undefendText(row!.t!)).toBe(t)
      }),
      { numRuns: 500, seed: 20_261_201 },
    )
  })

  test('never touches a number, a negative one included', () => {
    for (const n of [-1e-3, -0, 1e-7, -1e21, 5e-324, 0.1 + 0.2])
      expect(Object.is(Number(readCsv(write(n, 'x'))[0]!.n), n)).toBe(true)
    expect(write(-1e-3, 'x')).toContain('\r\n-0.001,x,')
  })

  // ASVS 5.0.0-1.2.10: a cell that begins with = + - @, a tab or NUL is a formula to some spreadsheet.
  test('holds no text that a spreadsheet takes for a formula', () => {
    const risky = fc
      .tuple(fc.constantFrom('=', '+', '-', '@', '\t', '\r', '\n', '\0', "'=", "''@"), fc.string({ unit: 'binary' }))
      .map(([start, rest]) => start + rest)
    fc.assert(
      fc.property(risky, (t) => {
        expect(readCsv(write(1, t))[0]!.t).toMatch(/^'/)
        expect(undefendText(defendText(t))).toBe(t)
      }),
      { numRuns: 300, seed: 20_261_201 },
    )
    expect(defendText("o'clock")).toBe("o'clock")
    expect(defendText("'quoted'")).toBe("'quoted'")
  })

  test('is never written of a row that its description does not fit', () => {
    expect(() => csvText(table, [{ n: '1', t: 'x', yes: true }])).toThrow(/sample\.n must be number/)
    expect(() => csvText(table, [{ n: Number.NaN, t: 'x', yes: true }])).toThrow(/sample\.n/)
    expect(() => csvText(table, [{ n: 1, t: 'x', yes: null }])).toThrow(/sample\.yes/)
    expect(() => csvText(table, [{ n: 1, t: 'x' }])).toThrow(/sample\.yes/)
  })
})
