import Link from 'next/link'
import type { ReactNode } from 'react'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import type { MovedFigure } from '@/lib/edition/changes-figures'
import { movedWords } from '@/lib/edition/changes-words'
import { DECIMALS } from '@/lib/findings/decimals'
import { type HistoryRow, historyOf } from '@/lib/findings/history'
import { formatDay } from '@/lib/format/date'
import { FigureText } from '../figure'
import { correctionHref } from './corrections'

type Row = HistoryRow & { publishedAt: Date }

/** The figures edition by edition, how each changed, and which were corrected. */
export function History({
  entries,
  corrections,
}: {
  entries: readonly DeviceEntry[]
  corrections: DeviceRecord['corrections']
}) {
  const published = new Map(entries.map(({ edition, publishedAt }) => [edition, publishedAt]))
  const rows: Row[] = historyOf(entries, corrections).map((row) => ({
    ...row,
    publishedAt: published.get(row.edition)!,
  }))
  return (
    <section aria-labelledby="history" className="mt-14 print:hidden">
      <h2 id="history">History across editions</h2>
      <p className="mt-3 max-w-[68ch] text-small text-soft">
        Below a figure stands its change since the edition before, where readings were added or taken away. Its doubt
        takes the two as measured apart but for calibration and common sessions; as they share readings, it is rather
        too large.
      </p>
      <Table
        className="mt-5"
        caption="Figures in each edition, newest first, ± at about 95 % (k = 2). † outside the formula’s limits"
        columns={COLUMNS}
        rows={rows}
        rowKey={({ edition }) => String(edition)}
      />
    </section>
  )
}

const HEADS = {
  lightness: 'Lightness L*',
  whiteness: 'Whiteness W10',
  tint: 'Tint T10',
  contrast: 'Contrast, to 1',
} as const
type Followed = keyof typeof HEADS
const FOLLOWED = Object.keys(HEADS) as Followed[]

const COLUMNS: Column<Row>[] = [
  {
    key: 'edition',
    head: 'Edition',
    label: 'Edition',
    heading: true,
    cell: ({ edition, publishedAt }) => (
      <>
        <Link href={`/editions/${edition}`} prefetch={false}>
          Edition {edition}
        </Link>
        <span className="block font-normal text-soft">
          <time dateTime={publishedAt.toISOString()}>{formatDay(publishedAt)}</time>
        </span>
      </>
    ),
  },
  ...FOLLOWED.map(
    (name): Column<Row> => ({
      key: name,
      head: HEADS[name],
      label: HEADS[name],
      numeric: true,
      cell: ({ figures, change }) => (
        <>
          <FigureText
            figure={figures[name]}
            decimals={DECIMALS[name]}
            dagger={(name === 'whiteness' || name === 'tint') && !figures.withinLimits}
          />
          {change.kind === 'readings' && <Change moved={change.moved} figure={name} />}
        </>
      ),
    }),
  ),
  { key: 'note', head: 'What happened', label: 'What happened', cell: (row) => <WhatHappened row={row} /> },
]

/** How a figure moved, with its sign and doubt: "change −1.4 ± 0.9". */
function Change({ moved, figure }: { moved: readonly MovedFigure[]; figure: Followed }) {
  const own = moved.find((one) => one.figure === figure)
  if (!own) return <span className="block text-soft">no change</span>
  const { difference, doubt } = movedWords(own)
  return (
    <span className="block whitespace-nowrap text-soft">
      change {difference} {doubt}
    </span>
  )
}

function WhatHappened({ row: { revision, change, corrections } }: { row: Row }): ReactNode {
  return (
    <>
      {corrections.map(({ id, as }) => (
        <span key={id} className="block">
          <Link href={correctionHref(id)} prefetch={false}>
            {as === 'corrected' ? 'Corrected' : 'Wrong, corrected later'}
          </Link>
        </span>
      ))}
      {inWords(revision, change)}
    </>
  )
}

function inWords(revision: string, change: HistoryRow['change']): string {
  if (change.kind === 'readings') {
    const words = `Other readings than edition ${change.since}`
    return change.moved.some(({ beyond }) => beyond) ? words : `${words}; every change is within its doubt`
  }
  if (change.kind === 'first') return `First figures, revision ${revision}`
  if (change.kind === 'same') return 'Same readings as before'
  return `Now revision ${revision}: other units, no change of a page`
}
