import { requireKind } from './csv'
import type { Row, Table } from './table'

/**
 * A table as JSON: its name, the edition, and an object a row with the columns in their order, a row to a line. Text
 * stands as it is, nothing put before it.
 */
export function jsonText({ name, columns }: Table, edition: number, rows: readonly Row[]): string {
  const lines = rows.map((row) => {
    for (const column of columns) requireKind(name, column, row[column.name])
    return JSON.stringify(Object.fromEntries(columns.map((column) => [column.name, row[column.name]])))
  })
  return `{"edition":${edition},"table":${JSON.stringify(name)},"rows":[\n${lines.join(',\n')}\n]}\n`
}
