import Link from 'next/link'
import type { ReactNode } from 'react'
import { Sheet } from '@/components/sheet'
import { type Column, Table } from '@/components/ui/table'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatNumber, THIN_SPACE } from '@/lib/format/number'
import { DECIMALS, FigureText, NotStated } from './figure'
import { type DeviceRow, SORTS, type Sort, type SortKey, sortHref } from './sort'

/** All devices with their figures, each with its doubt. A table on a desk, cards on a phone; its heads are links. */
export function DevicesTable({ rows, sort }: { rows: readonly DeviceRow[]; sort: Sort }) {
  return (
    <div className="@container mt-6">
      <OrderBy sort={sort} />
      <Table
        caption={`${formatNumber(rows.length)} devices by ${SORTS[sort.by].words}, ${ORDERS[sort.order]}. ± at about 95 %.`}
        columns={columnsFor(sort)}
        rows={rows}
        rowKey={({ device }) => device.slug}
      />
    </div>
  )
}

const ORDERS = { ascending: 'lowest first', descending: 'highest first' }

/** The orders as a list of links, where the table is cards and its heads are not there to be selected. */
function OrderBy({ sort }: { sort: Sort }) {
  return (
    <nav aria-label="Order by" className="mb-4 text-small @min-[40rem]:hidden">
      <p className="font-semibold">Order by</p>
      <ul className="flex flex-wrap gap-x-5">
        {(Object.keys(SORTS) as SortKey[]).map((key) => (
          <li key={key}>
            <Link
              href={sortHref(sort, key)}
              aria-current={sort.by === key ? 'true' : undefined}
              className="inline-flex min-h-11 items-center aria-[current]:font-semibold"
            >
              {SORTS[key].words}
              {sort.by === key && <Arrow order={sort.order} />}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}

function Arrow({ order }: Pick<Sort, 'order'>) {
  return <span aria-hidden="true">{order === 'ascending' ? ' ↑' : ' ↓'}</span>
}

function columnsFor(sort: Sort): Column<DeviceRow>[] {
  const column = (
    key: SortKey,
    label: string,
    cell: Column<DeviceRow>['cell'],
    more: Partial<Column<DeviceRow>> & { shown?: ReactNode } = {},
  ): Column<DeviceRow> => {
    const { shown = label, ...rest } = more
    return {
      key,
      label,
      cell,
      sorted: sort.by === key ? sort.order : undefined,
      head: (
        <>
          <Link href={sortHref(sort, key)} scroll={false} className="text-soft @max-[40rem]:hidden">
            {shown}
            {sort.by === key && <Arrow order={sort.order} />}
          </Link>
          <span className="@min-[40rem]:hidden">{shown}</span>
        </>
      ),
      ...rest,
    }
  }
  return [
    column('name', 'Device', ({ device }) => <Named row={{ device }} />, { heading: true }),
    column('size', 'Size, in', ({ device: { diagonal } }) => orNot(diagonal, formatExact), { numeric: true }),
    column('colour', 'Colour', ({ device: { colour } }) => orNot(colour, (has) => (has ? 'colour' : 'mono'))),
    column('front-light', 'Front light', ({ device: { frontLight } }) =>
      orNot(frontLight, (light) => (light ? `to ${formatNumber(light.max)}${THIN_SPACE}cd/m²` : 'none')),
    ),
    column(
      'lightness',
      'Lightness L*',
      ({ figures }) => <FigureText figure={figures.lightness} decimals={DECIMALS.lightness} />,
      {
        numeric: true,
      },
    ),
    column(
      'whiteness',
      'Whiteness W10 †',
      ({ figures }) => (
        <FigureText figure={figures.whiteness} decimals={DECIMALS.whiteness} dagger={!figures.withinLimits} />
      ),
      {
        numeric: true,
        shown: (
          <>
            Whiteness W<sub>10</sub> †
          </>
        ),
      },
    ),
    column(
      'tint',
      'Tint T10 †',
      ({ figures }) => <FigureText figure={figures.tint} decimals={DECIMALS.tint} dagger={!figures.withinLimits} />,
      {
        numeric: true,
        shown: (
          <>
            Tint T<sub>10</sub> †
          </>
        ),
      },
    ),
    column('chroma', 'Chroma C*', ({ figures }) => <FigureText figure={figures.chroma} decimals={DECIMALS.chroma} />, {
      numeric: true,
    }),
    column(
      'contrast',
      'Contrast, to 1',
      ({ figures }) => <FigureText figure={figures.contrast} decimals={DECIMALS.contrast} />,
      {
        numeric: true,
      },
    ),
    column('price', 'Price', ({ device: { price } }) => orNot(price, formatMoney), { numeric: true }),
  ]
}

function Named({ row: { device } }: { row: Pick<DeviceRow, 'device'> }) {
  return (
    <span className="flex items-center gap-3">
      <Sheet page={device.page} ink={device.ink} size="thumb" />
      <span>
        <Link href={`/devices/${device.slug}`}>{device.name}</Link>
        {device.provisional && <span className="block text-note font-normal text-soft">provisional: one unit</span>}
      </span>
    </span>
  )
}

function orNot<T>(value: T | null, words: (value: T) => ReactNode): ReactNode {
  return value === null ? <NotStated /> : words(value)
}
