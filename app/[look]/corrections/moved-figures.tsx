import { type Column, Table } from '@/components/ui/table'
import { COMPARED, type MovedFigure } from '@/lib/edition/changes-figures'
import { movedWords } from '@/lib/edition/changes-words'
import { Dagger } from '../devices/figure'

/** Figures of one device before and after, with the doubt of the difference and whether it is more than that. */
export function MovedFigures({
  figures,
  from,
  to,
  caption,
}: {
  figures: readonly MovedFigure[]
  /** Numbers of the editions. */
  from: number
  to: number
  caption: string
}) {
  const columns: Column<MovedFigure>[] = [
    { key: 'figure', head: 'Figure', label: 'Figure', heading: true, cell: ({ figure }) => <Name figure={figure} /> },
    numeric('before', `Edition ${from}`, (moved) => movedWords(moved).before),
    numeric('after', `Edition ${to}`, (moved) => movedWords(moved).after),
    numeric('difference', 'Difference', (moved) => (
      <span className="whitespace-nowrap">
        {movedWords(moved).difference} <span className="text-soft">{movedWords(moved).doubt}</span>
      </span>
    )),
    {
      key: 'beyond',
      head: 'More than the doubt?',
      label: 'More than the doubt?',
      cell: ({ beyond }) => (beyond ? <strong>yes</strong> : 'no, too close to call'),
    },
  ]
  return <Table caption={caption} columns={columns} rows={figures} rowKey={({ figure }) => figure} />
}

function numeric(key: string, label: string, cell: Column<MovedFigure>['cell']): Column<MovedFigure> {
  return { key, head: label, label, numeric: true, cell }
}

function Name({ figure }: { figure: MovedFigure['figure'] }) {
  const { name, symbol, dagger } = COMPARED[figure]
  return (
    <>
      {name}
      {symbol && (
        <>
          , {symbol.base}
          {symbol.sub && <sub>{symbol.sub}</sub>}
        </>
      )}
      {dagger && <Dagger />}
    </>
  )
}
