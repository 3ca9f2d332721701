/**
 * The roles of a table's parts, to be spread on them. Where a narrow container lays rows out as cards, `display` takes
 * the native roles away in some browsers; said outright they stay.
 */
export const TABLE = { role: 'table' } as const
export const ROW_GROUP = { role: 'rowgroup' } as const
export const ROW = { role: 'row' } as const
export const COLUMN_HEAD = { role: 'columnheader', scope: 'col' } as const
export const ROW_HEAD = { role: 'rowheader', scope: 'row' } as const
export const GROUP_HEAD = { role: 'rowheader', scope: 'rowgroup' } as const
export const CELL = { role: 'cell' } as const
