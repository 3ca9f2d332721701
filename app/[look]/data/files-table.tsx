import { type Column, Table } from '@/components/ui/table'
import { CSVW, csvName, DATA_PACKAGE, type Dataset, type DatasetFile, jsonName } from '@/lib/dataset/files'
import { type Table as Described, TABLES } from '@/lib/dataset/tables'
import { formatDay } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'

/** Loads one file. The name says what it is, the size what it costs. */
function Load({ edition, file }: { edition: number; file: DatasetFile | undefined }) {
  if (!file) return null
  return (
    <a href={`/data/${edition}/${file.name}`} download className="inline-flex min-h-11 items-center md:min-h-6">
      {file.name}, {size(file.bytes.length)}
    </a>
  )
}

/** The tables of an edition, each as CSV and as JSON. */
export function FilesTable({ edition, dataset }: { edition: number; dataset: Dataset }) {
  const { files, rows } = dataset
  const columns: Column<Described>[] = [
    {
      key: 'title',
      head: 'Table',
      label: 'Table',
      heading: true,
      cell: ({ name, title }) => (
        <a href={`/data#table-${name}`} className="inline-flex min-h-11 items-center md:min-h-6">
          {title}
        </a>
      ),
    },
    { key: 'rows', head: 'Rows', label: 'Rows', numeric: true, cell: ({ name }) => formatNumber(rows[name] ?? 0) },
    {
      key: 'csv',
      head: 'CSV',
      label: 'CSV',
      numeric: true,
      cell: (table) => <Load edition={edition} file={files.get(csvName(table))} />,
    },
    {
      key: 'json',
      head: 'JSON',
      label: 'JSON',
      numeric: true,
      cell: (table) => <Load edition={edition} file={files.get(jsonName(table))} />,
    },
  ]
  return (
    <Table
      className="mt-2 [&_td]:items-center"
      caption={`Each table as CSV and as JSON; measured from ${formatDay(dataset.measuredFrom)} to ${formatDay(dataset.measuredTo)}`}
      columns={columns}
      rows={TABLES}
      rowKey={({ name }) => name}
    />
  )
}

/** What describes the tables, for programs: both standards, and the checksums. */
export function Descriptions({ edition, dataset: { files } }: { edition: number; dataset: Dataset }) {
  const described = [
    [DATA_PACKAGE, 'Data Package 2.0: every file and column, types, units, keys.'],
    [CSVW, 'CSV on the Web: the same for tools of the W3C’s standard.'],
    ['SHA256SUMS.txt', 'Checksums of every file above, as sha256sum --check reads them.'],
  ] as const
  return (
    <ul className="mt-4 grid gap-2">
      {described.map(([name, what]) => (
        <li key={name}>
          <a href={`/data/${edition}/${name}`} download className="inline-flex min-h-11 items-center md:min-h-6">
            {name}
          </a>{' '}
          <span className="text-soft">
            {what} {size(files.get(name)?.bytes.length ?? 0)}.
          </span>
        </li>
      ))}
    </ul>
  )
}

/** How long a file is, in bytes or kilobytes of a thousand. */
function size(bytes: number): string {
  return bytes < 1000 ? `${formatNumber(bytes)} B` : `${formatNumber(bytes / 1000, bytes < 10_000 ? 1 : 0)} kB`
}
