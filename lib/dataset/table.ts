/** What a cell holds. Times are UTC, ISO 8601; a number is written with every digit it takes to read it back. */
export type ColumnType = 'text' | 'number' | 'integer' | 'boolean' | 'datetime'

export type Column = {
  name: string
  type: ColumnType
  /** As UCUM or the trade writes it; absent where there is none to name. */
  unit?: string
  meaning: string
  /** What an empty cell (null in JSON) says; absent where no cell is ever empty. */
  empty?: string
  /** The words a text may be, where they are few. */
  words?: readonly string[]
}

export type Table = {
  name: string
  title: string
  /** What one row is, and how the rows are ordered. */
  description: string
  columns: readonly Column[]
  /** The columns that together name a row. */
  key: readonly string[]
  /** Columns that name a row of another table, and its key. */
  references?: readonly { columns: readonly string[]; table: string; to: readonly string[] }[]
}

export type Cell = string | number | boolean | null
export type Row = Readonly<Record<string, Cell>>

/** CIELAB of a reading or a mean: three columns with a prefix. */
export function labColumns(of: string, prefix = ''): Column[] {
  return [
    { name: `${prefix}l`, type: 'number', unit: 'L*', meaning: `Lightness L* of ${of}, D65, 10°.` },
    { name: `${prefix}a`, type: 'number', unit: 'a*', meaning: `a* of ${of}, − green to + red, D65, 10°.` },
    { name: `${prefix}b`, type: 'number', unit: 'b*', meaning: `b* of ${of}, − blue to + yellow, D65, 10°.` },
  ]
}

export const DEVICE: Column = {
  name: 'device',
  type: 'text',
  meaning: 'The device, by the last part of its address on the site.',
}
export const SESSION: Column = { name: 'session', type: 'text', meaning: 'The session, by its name.' }
export const STATES = ['page', 'ink'] as const
