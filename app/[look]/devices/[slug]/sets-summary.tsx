import Link from 'next/link'
import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { formatNumber } from '@/lib/format/number'
import { mean, sd } from '@/lib/stats/describe'
import { acceptedReadings, noteOn, type RecordedSet } from './dossier'

type Row = { set: RecordedSet; serial: string; note: string | null }

/** The sets of this device, whether they count, and the way to every reading in them. Nothing is deleted. */
export function SetsSummary({ record, entry }: { record: DeviceRecord; entry: DeviceEntry }) {
  const serials = new Map(record.units.map(({ id, serial }) => [id, serial]))
  const rows = record.sets.map((set) => ({
    set,
    serial: serials.get(set.unitId) ?? '',
    note: noteOn(set, record, entry),
  }))
  const readings = record.sets.flatMap((set) => set.readings)
  const leftOut = readings.filter(({ flag }) => flag === 'left-out').length
  const flagged = readings.filter(({ flag }) => flag === 'flagged').length
  const withdrawn = record.sets.filter(({ withdrawnReason }) => withdrawnReason !== null).length
  return (
    <section aria-labelledby="readings" className="mt-14 print:hidden">
      <h2 id="readings">Readings</h2>
      <p className="mt-3 max-w-[68ch]">
        {formatNumber(readings.length)} readings in {formatNumber(rows.length)} sets; {formatNumber(leftOut)} left out,{' '}
        {formatNumber(flagged)} flagged and counted, {formatNumber(withdrawn)} sets withdrawn. What does not count
        stays, with the reason.
      </p>
      <p className="mt-1">
        <Link href={`/devices/${record.slug}/readings`} prefetch={false} className="inline-flex min-h-11 items-center">
          All {formatNumber(readings.length)} readings
        </Link>
      </p>
      <Disclosure summary={`The ${formatNumber(rows.length)} sets`}>
        <Table
          caption="Means and standard deviations of the accepted readings of each set, newest session first"
          columns={COLUMNS}
          rows={rows}
          rowKey={({ set }) => String(set.id)}
          empty="Nothing has been read yet."
        />
      </Disclosure>
    </section>
  )
}

/** Mean and standard deviation of L* over the accepted readings: "72.6, s 0.06". */
function lightness(set: RecordedSet): string {
  const values = acceptedReadings(set).map(({ lStar }) => lStar)
  if (values.length === 0) return 'none accepted'
  const spread = sd(values)
  return spread === null
    ? formatNumber(mean(values), 2)
    : `${formatNumber(mean(values), 2)}, s ${formatNumber(spread, 2)}`
}

const COLUMNS: Column<Row>[] = [
  { key: 'session', head: 'Session', label: 'Session', heading: true, cell: ({ set }) => set.session },
  { key: 'unit', head: 'Unit', label: 'Unit', cell: ({ serial }) => serial },
  { key: 'position', head: 'Position', label: 'Position', cell: ({ set }) => set.position },
  { key: 'state', head: 'State', label: 'State', cell: ({ set }) => set.state },
  {
    key: 'n',
    head: 'Accepted',
    label: 'Accepted',
    numeric: true,
    cell: ({ set }) => `${formatNumber(acceptedReadings(set).length)} of ${formatNumber(set.readings.length)}`,
  },
  { key: 'L', head: 'L*', label: 'L*', numeric: true, cell: ({ set }) => lightness(set) },
  { key: 'note', head: 'Note', label: 'Note', cell: ({ note }) => note ?? 'counts' },
]
