import { Pager } from '@/components/ui/pager'
import { type Column, Table } from '@/components/ui/table'
import { formatNumber } from '@/lib/format/number'
import { noteOn, type RecordedSet } from '../dossier'
import { Breadcrumb } from '../heading'
import type { requireDevice } from '../require-device'
import { PER_PAGE, readingsPath } from './paging'

type Reading = RecordedSet['readings'][number]
type Row = { set: RecordedSet; reading: Reading; serial: string; note: string }

/** One page of every reading ever taken of the device, also those that do not count, with why. */
export function ReadingsView({
  dossier: { record, released },
  page,
}: {
  dossier: Awaited<ReturnType<typeof requireDevice>>
  page: number
}) {
  const serials = new Map(record.units.map(({ id, serial }) => [id, serial]))
  const rows: Row[] = record.sets.flatMap((set) => {
    const why = noteOn(set, record, released?.entry ?? null)
    return set.readings.map((reading) => ({
      set,
      reading,
      serial: serials.get(set.unitId) ?? '',
      note: [why, flagInWords(reading)].filter(Boolean).join('; ') || 'accepted',
    }))
  })
  return (
    <main className="measure py-10">
      <Breadcrumb maker={record.maker} device={record} />
      <h1 className="mt-4">Readings of {record.name}</h1>
      <p className="mt-3 max-w-[68ch] text-soft">
        Every reading as the instrument gave it, newest session first, {formatNumber(rows.length)} in{' '}
        {formatNumber(record.sets.length)} sets. Nothing is deleted: what does not count stays, with the reason
        {released && `; notes are as edition ${released.edition.number} has it`}.
      </p>
      <Table
        className="mt-6"
        caption="L*a*b* by D65 and the 10° observer; d/8°, specular included unless noted"
        columns={COLUMNS}
        rows={rows.slice((page - 1) * PER_PAGE, page * PER_PAGE)}
        rowKey={({ set, reading }) => `${set.id}-${reading.ordinal}`}
        empty="Nothing has been read yet."
      />
      <Pager
        paging={{ page, perPage: PER_PAGE, hrefFor: (to) => readingsPath(record.slug, to) }}
        total={rows.length}
        what="Readings"
      />
    </main>
  )
}

function flagInWords({ flag, flagReason }: Reading): string | null {
  if (flag === 'none') return flagReason && `flag cleared: ${flagReason}`
  return `${flag === 'left-out' ? 'left out' : 'flagged, counts'}: ${flagReason}`
}

const COLUMNS: Column<Row>[] = [
  {
    key: 'set',
    head: 'Session, unit, position',
    label: 'Session, unit, position',
    heading: true,
    cell: ({ set, serial }) => (
      <span className="font-normal md:whitespace-nowrap">
        {set.session}, {serial}, {set.position}
      </span>
    ),
  },
  { key: 'state', head: 'State', label: 'State', cell: ({ set }) => set.state },
  { key: 'ordinal', head: 'No.', label: 'No.', numeric: true, cell: ({ reading }) => formatNumber(reading.ordinal) },
  { key: 'L', head: 'L*', label: 'L*', numeric: true, cell: ({ reading }) => formatNumber(reading.lStar, 2) },
  { key: 'a', head: 'a*', label: 'a*', numeric: true, cell: ({ reading }) => formatNumber(reading.aStar, 2) },
  { key: 'b', head: 'b*', label: 'b*', numeric: true, cell: ({ reading }) => formatNumber(reading.bStar, 2) },
  { key: 'note', head: 'Note', label: 'Note', cell: ({ note }) => note },
]
