import { type Column, Table } from '@/components/ui/table'
import type { ControlSeries } from '@/db/queries/controls'
import { formatRange, formatNumber as n } from '@/lib/format/number'
import { mean } from '@/lib/stats/describe'
import { type ControlState, controlOfRanges, controlOfValues } from '@/lib/workings/control-state'
import { sinceWords } from '@/lib/workings/control-words'

type Channel = 'L' | 'a' | 'b'
const CHANNELS: readonly Channel[] = ['L', 'a', 'b']

/** Means of the sessions, and the readings within them, of one channel. */
export const valuesOf = ({ sessions }: ControlSeries, channel: Channel) =>
  sessions.map(({ readings }) => mean(readings.map((reading) => reading[channel])))
export const readingsOf = ({ sessions }: ControlSeries, channel: Channel) =>
  sessions.map(({ readings }) => readings.map((reading) => reading[channel]))

type Row = { key: string; name: string; series: ControlSeries; state: ControlState | null; range: ControlState | null }

/** Every control and channel in a line. */
export function ControlsTable({ series }: { series: readonly ControlSeries[] }) {
  const rows: Row[] = series.flatMap((one) =>
    CHANNELS.map((channel) => ({
      key: `${one.serial} ${channel}`,
      name: `${one.name}, ${channel}*`,
      series: one,
      state: controlOfValues(valuesOf(one, channel)),
      range: controlOfRanges(readingsOf(one, channel)),
    })),
  )
  const columns: Column<Row>[] = [
    { key: 'name', head: 'Control', label: 'Control', heading: true, cell: ({ name }) => name },
    {
      key: 'sessions',
      head: 'Sessions',
      label: 'Sessions',
      numeric: true,
      cell: ({ series: { sessions } }) => n(sessions.length),
    },
    {
      key: 'centre',
      head: 'Centre',
      label: 'Centre',
      numeric: true,
      cell: ({ state }) => (state ? n(state.limits.centre, 3) : 'too few'),
    },
    {
      key: 'limits',
      head: 'Limits',
      label: 'Limits',
      numeric: true,
      cell: ({ state }) => (state ? formatSpan(state.limits.lower, state.limits.upper) : 'none'),
    },
    {
      key: 'outside',
      head: 'Outside',
      label: 'Outside',
      numeric: true,
      cell: ({ state }) => (state ? n(state.points.filter(({ outside }) => outside).length) : 'not judged'),
    },
    {
      key: 'since',
      head: 'In control',
      label: 'In control',
      cell: ({ state, series: { sessions } }) => (state ? sinceWords(state, sessions) : 'not judged'),
    },
    {
      key: 'range',
      head: 'Range in a session',
      label: 'Range in a session',
      numeric: true,
      cell: ({ range }) => (range ? `${n(range.limits.centre, 3)} (limit ${n(range.limits.upper, 3)})` : 'not charted'),
    },
  ]
  return (
    <Table
      caption="Controls up to the newest edition, in CIELAB units"
      columns={columns}
      rows={rows}
      rowKey={({ key }) => key}
      className="mt-6"
    />
  )
}

/** A range in which either end may be negative: words between, since a dash would read as a sign. */
function formatSpan(from: number, to: number): string {
  return from < 0 || to < 0 ? `${n(from, 2)} to ${n(to, 2)}` : formatRange(from, to, 2)
}
