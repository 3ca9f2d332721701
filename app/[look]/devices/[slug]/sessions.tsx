import Link from 'next/link'
import type { ReactNode } from 'react'
import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import type { TileReading, WhiteCalibration } from '@/db/queries/session-state'
import { type ControlState, controlStates } from '@/lib/findings/control-state'
import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatDoubt, formatNumber, formatUnit } from '@/lib/format/number'
import type { RecordedSet } from './dossier'

type Row = { first: RecordedSet; sets: number; state: ControlState | null; whiteSet: WhiteCalibration | null }

/** Whether the bench was in order on the days this device was read: the control tile and the white calibration. */
export function Sessions({
  sets,
  tiles,
  calibrations,
}: {
  sets: readonly RecordedSet[]
  tiles: readonly TileReading[]
  /** Oldest first. */
  calibrations: readonly WhiteCalibration[]
}) {
  const states = new Map(controlStates(tiles).map((state) => [state.session, state]))
  const rows: Row[] = [...new Set(sets.map(({ session }) => session))].map((session) => {
    const own = sets.filter((set) => set.session === session)
    const first = own[0]!
    const whiteSet = calibrations.findLast(
      ({ instrumentId, at }) => instrumentId === first.instrumentId && at <= first.startedAt,
    )
    return { first, sets: own.length, state: states.get(session) ?? null, whiteSet: whiteSet ?? null }
  })
  return (
    <section aria-labelledby="control" className="mt-14 print:hidden">
      <h2 id="control">The control on those days</h2>
      <p className="mt-3 max-w-[68ch]">{inShort(rows)}</p>
      <p className="mt-2 max-w-[68ch] text-small text-soft">
        The tile is read for stability, so its reference is its own mean on that instrument over all sessions. Limits
        are three sigma by the moving range, for L*, a* and b* each.{' '}
        <Link href="/method#figures" prefetch={false}>
          How a session’s part enters the doubt
        </Link>
        .
      </p>
      <Disclosure summary={rows.length === 1 ? 'The session' : `The ${formatNumber(rows.length)} sessions`}>
        <Table
          caption="Control tile in each session, newest first: its mean less its reference, and the end less the start"
          columns={COLUMNS}
          rows={rows}
          rowKey={({ first }) => first.session}
        />
      </Disclosure>
    </section>
  )
}

function inShort(rows: readonly Row[]): string {
  if (rows.length === 0) return 'Nothing has been read yet.'
  const out = rows.filter(({ state }) => state?.inLimits === false)
  const unknown = rows.filter(({ state }) => (state?.inLimits ?? null) === null)
  const days = (some: readonly Row[]) => formatList(some.map(({ first }) => formatDay(first.startedAt)))
  if (out.length === 0 && unknown.length === 0) {
    return rows.length === 1
      ? 'The control tile was within its limits in the one session this device was read in.'
      : `The control tile was within its limits in all ${formatNumber(rows.length)} sessions this device was read in.`
  }
  return [
    out.length > 0 && `The control tile was outside its limits on ${days(out)}.`,
    unknown.length > 0 && `Of ${days(unknown)} the limits are not known: too few sessions with that tile.`,
  ]
    .filter(Boolean)
    .join(' ')
}

const COLUMNS: Column<Row>[] = [
  {
    key: 'session',
    head: 'Session',
    label: 'Session',
    heading: true,
    cell: ({ first }) => (
      <>
        <time dateTime={first.startedAt.toISOString()}>{formatDay(first.startedAt)}</time>
        <span className="block font-normal text-soft">{first.session}</span>
      </>
    ),
  },
  { key: 'sets', head: 'Sets here', label: 'Sets here', numeric: true, cell: ({ sets }) => formatNumber(sets) },
  {
    key: 'with',
    head: 'With',
    label: 'With',
    cell: ({ first }) =>
      `${first.instrument}, ${formatUnit(first.apertureMm, 'mm')}, ${formatUnit(first.temperatureCelsius, '°C', 1)}, ${first.operator}`,
  },
  offset('L', 'L* off'),
  offset('a', 'a* off'),
  offset('b', 'b* off'),
  {
    key: 'drift',
    head: 'L* in the session',
    label: 'L* in the session',
    numeric: true,
    cell: ({ state }) => (state?.drift == null ? 'not read' : formatNumber(state.drift, 2)),
  },
  {
    key: 'in',
    head: 'In limits',
    label: 'In limits',
    cell: ({ state }): ReactNode => {
      if (!state) return 'not read'
      if (state.inLimits === null) return 'not known'
      return state.inLimits ? 'yes' : <strong className="text-stop">no</strong>
    },
  },
  {
    key: 'white',
    head: 'White set',
    label: 'White set',
    cell: ({ first, whiteSet }) => {
      if (!whiteSet) return 'not noted'
      const minutes = Math.round((first.startedAt.getTime() - whiteSet.at.getTime()) / 60_000)
      const before = minutes < 24 * 60 ? `${formatUnit(minutes, 'min')} before` : formatDay(whiteSet.at)
      return `${before}, on ${whiteSet.tileSerial}`
    },
  },
]

/** An offset with the limits it is judged by: "0.05, limits ± 0.31". */
function offset(channel: 'L' | 'a' | 'b', head: string): Column<Row> {
  return {
    key: channel,
    head,
    label: head,
    numeric: true,
    cell: ({ state }) =>
      state ? (
        <>
          {formatNumber(state.offset[channel], 2)}
          {state.reach && <span className="block text-soft">limits {formatDoubt(state.reach[channel], 2)}</span>}
        </>
      ) : (
        'not read'
      ),
  }
}
