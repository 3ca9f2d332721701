import Link from 'next/link'
import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import { figureList, type ListedFigure } from '@/lib/findings/figure-list'
import { inkFigures } from '@/lib/findings/ink'
import type { PublishedFigures } from '@/lib/findings/published'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { FigureText } from '../figure'

/** Every figure the edition publishes of the device, each with its unit and its doubt, behind a button. */
export function AllFigures({
  edition,
  device,
  figures,
}: {
  edition: Edition
  device: EditionDevice
  figures: PublishedFigures
}) {
  const ink = inkFigures(edition, device)
  const ofInk = (method: string, name: string, figure: ListedFigure['figure']): ListedFigure => ({
    method,
    name,
    figure,
    unit: 'CIELAB',
    decimals: 1,
    outside: false,
  })
  const rows = [
    ...figureList(figures),
    ofInk('lightness', 'Lightness L* of the ink', ink.lightness),
    ofInk('a-b', 'a* of the ink', ink.a),
    ofInk('a-b', 'b* of the ink', ink.b),
  ]
  return (
    <Disclosure summary="Every figure with its doubt" className="text-small print:hidden">
      <Table
        caption="Figures of page and ink, ± at about 95 % (k = 2). † outside the formula’s limits"
        columns={COLUMNS}
        rows={rows}
        rowKey={({ name }) => name}
      />
    </Disclosure>
  )
}

const COLUMNS: Column<ListedFigure>[] = [
  {
    key: 'name',
    head: 'Figure',
    label: 'Figure',
    heading: true,
    cell: ({ method, name }) => (
      <Link href={`/method#q-${method}`} prefetch={false}>
        {name}
      </Link>
    ),
  },
  {
    key: 'value',
    head: 'Value',
    label: 'Value',
    numeric: true,
    cell: ({ figure, decimals, outside }) => <FigureText figure={figure} decimals={decimals} dagger={outside} />,
  },
  { key: 'unit', head: 'Unit', label: 'Unit', cell: ({ unit }) => unit },
]
