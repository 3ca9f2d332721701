import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceRecord } from '@/db/queries/devices'
import { formatNumber } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'
import { type RecordedSet, unitsOf, whyNotCounted } from './dossier'

type Reading = RecordedSet['readings'][number]
type Row = { set: RecordedSet; reading: Reading; serial: string; note: string }

/** Every reading ever taken of the device, also those that do not count, with why. Nothing is deleted. */
export function Readings({ record, device }: { record: DeviceRecord; device: EditionDevice }) {
  const unitIds = new Set(unitsOf(record, device).map(({ id }) => id))
  const serials = new Map(record.units.map(({ id, serial }) => [id, serial]))
  const rows: Row[] = record.sets.flatMap((set) => {
    const why = whyNotCounted(set, device, unitIds)
    return set.readings.map((reading) => ({
      set,
      reading,
      serial: serials.get(set.unitId) ?? '',
      note: [why, flagInWords(reading)].filter(Boolean).join('; '),
    }))
  })
  return (
    <section aria-labelledby="readings" className="mt-14">
      <h2 id="readings">Readings</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        Every reading as the instrument gave it, newest session first. What does not count stays, with the reason.
      </p>
      <Disclosure
        summary={`All ${formatNumber(rows.length)} readings in ${formatNumber(record.sets.length)} sets`}
        className="mt-2"
      >
        <Table
          caption="L*a*b* by D65 and the 10° observer; specular included unless noted"
          columns={columns}
          rows={rows}
          rowKey={({ set, reading }) => `${set.id}-${reading.ordinal}`}
          empty="Nothing has been read yet."
        />
      </Disclosure>
    </section>
  )
}

function flagInWords({ flag, flagReason }: Reading): string | null {
  if (flag === 'none') return null
  return `${flag === 'left-out' ? 'left out' : 'flagged, counts'}: ${flagReason}`
}

const columns: Column<Row>[] = [
  {
    key: 'set',
    head: 'Session, unit, position',
    label: 'Session, unit, position',
    heading: true,
    cell: ({ set, serial }) => (
      <span className="font-normal">
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
