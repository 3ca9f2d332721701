import type { Cell, Column, Row, Table } from './table'

/** Where a spreadsheet begins to read a cell as a formula, after any apostrophes we may have put before it. */
const FORMULA = /^'*[=+\-@\t\r\n\0]/

/**
 * A text that no spreadsheet takes for a formula: one apostrophe goes before any that begins with = + − (hyphen) @, a
 * tab or a line end, or with apostrophes and then one of these. Numbers are never touched.
 */
export function defendText(text: string): string {
  return FORMULA.test(text) ? `'${text}` : text
}

/** The text as it was before `defendText`. */
export function undefendText(text: string): string {
  return /^'/.test(text) && FORMULA.test(text) ? text.slice(1) : text
}

/**
 * A table as CSV by RFC 4180: a header line, CRLF after every line, quotes only where needed. Null is an empty cell, an
 * empty text a pair of quotes. Numbers have the fewest digits that read back as the same double.
 * @throws TypeError where a row does not hold what the table describes
 */
export function csvText({ name, columns }: Table, rows: readonly Row[]): string {
  const lines = [
    columns.map((column) => column.name),
    ...rows.map((row) => columns.map((one) => field(name, one, row))),
  ]
  return lines.map((cells) => `${cells.join(',')}\r\n`).join('')
}

function field(table: string, column: Column, row: Row): string {
  const cell = row[column.name]
  requireKind(table, column, cell)
  if (cell === null) return ''
  if (typeof cell === 'number') return Object.is(cell, -0) ? '-0' : String(cell)
  if (typeof cell === 'boolean') return String(cell)
  const text = column.type === 'datetime' ? cell : defendText(cell)
  return /^$|[",\r\n]|^\s|\s$/.test(text) ? `"${text.replaceAll('"', '""')}"` : text
}

/** Holds a cell to its column, so that a file never says other than its description. */
export function requireKind(table: string, column: Column, cell: Cell | undefined): asserts cell is Cell {
  if (cell === null && column.empty) return
  const right = {
    text: typeof cell === 'string',
    number: typeof cell === 'number' && Number.isFinite(cell),
    integer: Number.isSafeInteger(cell),
    boolean: typeof cell === 'boolean',
    datetime: typeof cell === 'string' && /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(\.\d+)?Z$/.test(cell),
  }[column.type]
  if (!right) throw new TypeError(`${table}.${column.name} must be ${column.type}, got ${String(cell)}`)
}
