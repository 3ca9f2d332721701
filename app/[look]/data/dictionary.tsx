import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import { type Column as Described, TABLES } from '@/lib/dataset/tables'
import { WAVELENGTHS } from '@/lib/dataset/tables-bench'
import { formatNumber } from '@/lib/format/number'

const TYPES = {
  text: 'text',
  number: 'number',
  integer: 'whole number',
  boolean: 'true or false',
  datetime: 'time, UTC',
}

const COLUMNS: readonly Column<Described>[] = [
  { key: 'name', head: 'Column', label: 'Column', heading: true, cell: ({ name }) => <code>{name}</code> },
  { key: 'type', head: 'Type', label: 'Type', cell: ({ type }) => TYPES[type] },
  { key: 'unit', head: 'Unit', label: 'Unit', cell: ({ unit }) => unit ?? '–' },
  { key: 'meaning', head: 'Meaning', label: 'Meaning', cell: meaning },
  { key: 'empty', head: 'An empty cell', label: 'An empty cell', cell: ({ empty }) => empty ?? 'Never empty.' },
]

function meaning({ meaning, words }: Described) {
  return words ? `${meaning} One of: ${words.join(', ')}.` : meaning
}

/** What every column of every table means. Of the wavelengths of a spectrum the first stands for all. */
export function Dictionary() {
  return TABLES.map((table) => (
    <section key={table.name} id={`table-${table.name}`} className="mt-10 scroll-mt-4">
      <h3>{table.title}</h3>
      <p className="mt-2 max-w-[68ch] text-soft">
        <code>{table.name}.csv</code>, <code>{table.name}.json</code>. {table.description}
        {table.name === 'spectra' &&
          ` Columns run from r${WAVELENGTHS[0]} to r${WAVELENGTHS.at(-1)}, one every 10 nm; the first is shown.`}
      </p>
      <Disclosure summary={`Columns of ${table.name}, ${formatNumber(table.columns.length)}`} className="mt-2">
        <Table
          className="mt-2"
          caption={`Columns of ${table.title.toLowerCase()}; key: ${table.key.join(', ')}`}
          columns={COLUMNS}
          rows={table.columns.filter(({ name }) => !/^r\d+$/.test(name) || name === `r${WAVELENGTHS[0]}`)}
          rowKey={({ name }) => name}
        />
      </Disclosure>
    </section>
  ))
}
