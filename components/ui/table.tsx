import type { ReactNode } from 'react'
import { CELL, COLUMN_HEAD, ROW, ROW_GROUP, ROW_HEAD, TABLE } from './table-roles'

export type Column<Row> = {
  key: string
  /** As the column's head shows it; `label` is the same in plain text, for cards. */
  head: ReactNode
  label: string
  numeric?: boolean
  /** The order the rows stand in, where it is by this column. */
  sorted?: 'ascending' | 'descending'
  /** The cell that names its row. */
  heading?: boolean
  cell: (row: Row) => ReactNode
}

/**
 * A table of figures. It becomes cards in a narrow container, each figure beside its column's name.
 * @param caption always read out; `captionHidden` where a heading above already says it
 */
export function Table<Row>({
  caption,
  captionHidden = false,
  columns,
  rows,
  rowKey,
  empty = 'Nothing here yet.',
  className = '',
}: {
  caption: ReactNode
  captionHidden?: boolean
  columns: readonly Column<Row>[]
  rows: readonly Row[]
  rowKey: (row: Row) => string
  empty?: ReactNode
  className?: string
}) {
  if (rows.length === 0) return <p className="text-soft">{empty}</p>
  return (
    <div className={`@container overflow-x-auto ${className}`}>
      <table {...TABLE} className="cards w-full border-collapse text-small">
        <caption className={captionHidden ? 'sr-only' : 'pb-2 text-left text-note text-soft'}>{caption}</caption>
        <thead {...ROW_GROUP}>
          <tr {...ROW}>
            {columns.map((column) => (
              <th
                key={column.key}
                {...COLUMN_HEAD}
                aria-sort={column.sorted}
                className={`border-b-(length:--strong-rule) border-ink px-2.5 py-2 align-bottom text-note font-semibold text-soft first:pl-0 last:pr-0 ${column.numeric ? 'text-right' : 'text-left'}`}
              >
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody {...ROW_GROUP}>
          {rows.map((row) => (
            <tr key={rowKey(row)} {...ROW}>
              {columns.map((column) => {
                const look = `border-b border-rule px-2.5 py-2.5 first:pl-0 last:pr-0 ${column.numeric ? 'text-right' : 'text-left'}`
                return column.heading ? (
                  <th key={column.key} {...ROW_HEAD} className={`${look} font-semibold`}>
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} {...CELL} data-label={column.label} className={look}>
                    {column.cell(row)}
                  </td>
                )
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
