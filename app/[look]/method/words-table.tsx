import { Table } from '@/components/ui/table'

/** A word or phrase of this site, the numbers it holds for, and of what they are. */
export type WordThreshold = { words: string; holds: string; of: string; standing: string }

/** Words and the thresholds behind them. */
export function WordsTable({ caption, rows }: { caption: string; rows: readonly WordThreshold[] }) {
  return (
    <Table
      caption={caption}
      rows={rows}
      rowKey={({ words, of }) => `${words}, ${of}`}
      columns={[
        { key: 'words', head: 'Words', label: 'Words', heading: true, cell: ({ words }) => words },
        { key: 'holds', head: 'Hold for', label: 'Hold for', cell: ({ holds }) => holds },
        { key: 'of', head: 'Of', label: 'Of', cell: ({ of }) => of },
        { key: 'standing', head: 'Standing', label: 'Standing', cell: ({ standing }) => standing },
      ]}
      className="mt-6"
    />
  )
}
