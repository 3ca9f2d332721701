import { type Column, Table } from '@/components/ui/table'
import { formatExact, THIN_SPACE } from '@/lib/format/number'
import type { Constant, Standing } from '@/lib/method/constants'

const STANDING: Record<Standing, string> = {
  published: 'published',
  'from memory': 'from memory',
  house: 'house',
  'common practice': 'common practice, no source',
}

const columns: Column<Constant>[] = [
  {
    key: 'name',
    head: 'Constant',
    label: 'Constant',
    heading: true,
    cell: ({ name, note }) => (
      <>
        {name}
        {note && <span className="block font-normal text-soft">{note}</span>}
      </>
    ),
  },
  { key: 'value', head: 'Value', label: 'Value', cell: ({ value, unit }) => <Value value={value} unit={unit} /> },
  { key: 'source', head: 'From', label: 'From', cell: ({ source }) => source },
  { key: 'standing', head: 'Standing', label: 'Standing', cell: ({ standing }) => STANDING[standing] },
]

/** The constants of one section, straight from the objects the code computes with. */
export function ConstantsTable({ caption, constants }: { caption: string; constants: readonly Constant[] }) {
  return (
    <Table
      caption={caption}
      columns={columns}
      rows={constants}
      rowKey={({ name }) => name}
      className="mt-8 align-top"
    />
  )
}

/** A constant's value with its unit; what has parts is a list of them. */
function Value({ value, unit }: { value: unknown; unit?: string }) {
  if (Array.isArray(value)) return <>{withUnit(value.map(plain).join(', '), unit)}</>
  if (typeof value !== 'object' || value === null) return <>{withUnit(plain(value), unit)}</>
  return (
    <ul>
      {Object.entries(value).map(([part, its]) => (
        <li key={part}>
          {PARTS[part] ?? part}: <Value value={its} unit={unit} />
        </li>
      ))}
    </ul>
  )
}

/** Names of parts that read differently in a sentence than in code. */
const PARTS: Record<string, string> = {
  L: 'L*',
  a: 'a*',
  b: 'b*',
  'much-more': 'much more',
  'one-hand': 'one hand',
  'two-hands': 'two hands',
}

const plain = (value: unknown) => (typeof value === 'number' ? formatExact(value) : String(value))
const withUnit = (text: string, unit?: string) => (unit ? `${text}${THIN_SPACE}${unit}` : text)
