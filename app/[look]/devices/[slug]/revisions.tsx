import { Booth } from '@/components/booth'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { DECIMALS } from '@/lib/findings/decimals'
import { differenceDoubt, withinDoubt } from '@/lib/findings/difference'
import { publishedFigures } from '@/lib/findings/published'
import { formatDay } from '@/lib/format/date'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import { FigureText, NotStated } from '../figure'

type Revision = DeviceRecord['revisions'][number]
type Row = { revision: Revision; entry: DeviceEntry | null; isShown: boolean }

/** What the maker changed under one name: each revision's page as its newest edition has it, side by side. */
export function Revisions({ record, entries }: { record: DeviceRecord; entries: readonly DeviceEntry[] }) {
  const [shown] = entries
  if (!shown) return null
  const rows: Row[] = record.revisions.map((revision) => ({
    revision,
    entry: entries.find(({ revisionId }) => revisionId === revision.id) ?? null,
    isShown: revision.id === shown.revisionId,
  }))
  const measured = rows.flatMap(({ revision, entry }) => (entry ? [{ revision, entry }] : []))
  return (
    <section aria-labelledby="revisions" className="mt-14 print:hidden">
      <h2 id="revisions">Revisions</h2>
      <p className="mt-3 max-w-[68ch]">
        One name, {formatNumber(rows.length)} revisions. The figures on this page are of revision {shown.revision}. A
        shop may still sell another, and rarely says which.
      </p>
      {measured.length > 1 && <p className="mt-2 max-w-[68ch]">{apartInWords(measured, shown)}</p>}
      <div className="mt-5 grid items-start gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        {measured.length > 1 && (
          <Booth
            sheets={measured.map(({ revision, entry }) => ({
              name: `Revision ${revision.name}, edition ${entry.edition}`,
              page: entry.device.page,
              ink: entry.device.ink,
            }))}
            paper={shown.control.paper}
          />
        )}
        <Table
          caption="Revisions: what changed under this name, and the page of each, ± at about 95 % (k = 2)"
          columns={COLUMNS}
          rows={rows}
          rowKey={({ revision }) => String(revision.id)}
        />
      </div>
    </section>
  )
}

/** How far the other revisions' pages lie from the one shown, by lightness, with the doubt of the difference. */
function apartInWords(measured: readonly { revision: Revision; entry: DeviceEntry }[], shown: DeviceEntry): string {
  return measured
    .filter(({ entry }) => entry.revisionId !== shown.revisionId)
    .map(({ revision, entry }) => {
      const lightness = ({ page }: { page: { L: number } }) => page.L
      const apart = entry.device.page.L - shown.device.page.L
      const doubt = differenceDoubt(shown, entry.device, shown.device, lightness)
      const figure = `${formatNumber(Math.abs(apart), 1)} ${formatDoubt(doubt, 1)} L*`
      if (withinDoubt(shown, entry.device, shown.device, lightness)) {
        return `By lightness revision ${revision.name} is too close to call from it: ${figure} apart.`
      }
      return `The page of revision ${revision.name} is ${apart > 0 ? 'lighter' : 'darker'} by ${figure}.`
    })
    .join(' ')
}

const COLUMNS: Column<Row>[] = [
  {
    key: 'name',
    head: 'Revision',
    label: 'Revision',
    heading: true,
    cell: ({ revision, isShown }) => (isShown ? `${revision.name} (the one these figures are of)` : revision.name),
  },
  {
    key: 'since',
    head: 'Since',
    label: 'Since',
    cell: ({ revision }) => (revision.since ? formatDay(revision.since) : <NotStated />),
  },
  { key: 'note', head: 'What changed', label: 'What changed', cell: ({ revision }) => revision.note ?? <NotStated /> },
  {
    key: 'L',
    head: 'Lightness L*',
    label: 'Lightness L*',
    numeric: true,
    cell: ({ entry }) =>
      entry ? (
        <FigureText figure={publishedFigures(entry, entry.device).lightness} decimals={DECIMALS.lightness} />
      ) : (
        'not released'
      ),
  },
  {
    key: 'edition',
    head: 'As in',
    label: 'As in',
    cell: ({ entry }) => (entry ? `edition ${entry.edition}` : ''),
  },
]
