import Link from 'next/link'
import type { ReactNode } from 'react'
import { Sheet } from '@/components/sheet'
import { type Column, Table } from '@/components/ui/table'
import { catalogueHref } from '@/lib/catalogue/address'
import type { ListedDevice } from '@/lib/catalogue/list'
import type { CatalogueQuery } from '@/lib/catalogue/schema'
import { nextSort, SORTS, type Sort, type SortKey } from '@/lib/catalogue/sort'
import { FACT_WORDS } from '@/lib/catalogue/words'
import { DECIMALS } from '@/lib/findings/decimals'
import { formatList } from '@/lib/format/list'
import { formatDiagonal, formatMass } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import { formatNumber, THIN_SPACE } from '@/lib/format/number'
import type { Look } from '@/lib/look'
import type { EditionDevice } from '@/lib/method/types'
import { FigureText, NotStated } from './figure'

/** The form the boxes of the table belong to. */
export const COMPARE_FORM = 'compare'

type Listing = { query: CatalogueQuery; sort: Sort }

/** All devices with their figures, each with its doubt. A table on a desk, cards on a phone; its heads are links. */
export function DevicesTable({
  caption,
  rows,
  look,
  className = '',
  ...listing
}: Listing & { caption: string; rows: readonly ListedDevice[]; look: Look; className?: string }) {
  return (
    <Table
      className={`catalogue-list ${className}`}
      caption={caption}
      columns={columnsFor(listing, look)}
      rows={rows}
      rowKey={({ device }) => device.slug}
    />
  )
}

const ORDERS = { ascending: 'lowest first', descending: 'highest first' }
const KINDS = { all: '', match: ' that match', open: ' not ruled out' }

export function tableWords(count: number, kind: keyof typeof KINDS, { by, order }: Sort): string {
  const devices = count === 1 ? 'device' : 'devices'
  return `${formatNumber(count)} ${devices}${KINDS[kind]}, by ${SORTS[by].words}, ${ORDERS[order]}. ± at about 95${THIN_SPACE}%.`
}

const sortHref = ({ query, sort }: Listing, by: SortKey) => {
  const next = nextSort(sort, by)
  return catalogueHref({ ...query, sort: next.by, order: next.order, page: undefined })
}

/** The orders as a list of links, where the table is cards and its heads are not there to be selected. */
export function OrderBy(listing: Listing) {
  const { by, order } = listing.sort
  return (
    <nav aria-label="Order by" className="mb-4 text-small @min-[40rem]:hidden">
      <p className="font-semibold">Order by</p>
      <ul className="flex flex-wrap gap-x-5">
        {(Object.keys(SORTS) as SortKey[]).map((key) => (
          <li key={key}>
            <Link
              href={sortHref(listing, key)}
              prefetch={false}
              scroll={false}
              aria-current={by === key ? 'true' : undefined}
              className="inline-flex min-h-11 items-center aria-[current]:font-semibold"
            >
              {SORTS[key].words}
              {by === key && <Arrow order={order} />}
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

type Cell = Column<ListedDevice>['cell']

function columnsFor(listing: Listing, { units }: Look): Column<ListedDevice>[] {
  const { by, order } = listing.sort
  /** A column whose head orders the list by it. */
  const sorting = (
    key: SortKey,
    label: string,
    cell: Cell,
    more: Partial<Column<ListedDevice>> & { shown?: ReactNode } = {},
  ): Column<ListedDevice> => {
    const { shown = label, ...rest } = more
    return {
      key,
      label,
      cell,
      sorted: by === key ? order : undefined,
      head: (
        <>
          <Link href={sortHref(listing, key)} prefetch={false} scroll={false} className="text-soft @max-[40rem]:hidden">
            {shown}
            {by === key && <Arrow order={order} />}
          </Link>
          <span className="@min-[40rem]:hidden">{shown}</span>
        </>
      ),
      ...rest,
    }
  }
  const figure = (key: 'lightness' | 'chroma' | 'contrast', label: string) =>
    sorting(key, label, ({ figures }) => <FigureText figure={figures[key]} decimals={DECIMALS[key]} />, {
      numeric: true,
    })
  const daggered = (key: 'whiteness' | 'tint', name: string, letter: string) =>
    sorting(
      key,
      `${name} ${letter}10 †`,
      ({ figures }) => <FigureText figure={figures[key]} decimals={DECIMALS[key]} dagger={!figures.withinLimits} />,
      {
        numeric: true,
        shown: (
          <>
            {name} {letter}
            <sub>10</sub> †
          </>
        ),
      },
    )
  return [
    { key: 'compare', head: 'Compare', label: 'Compare', cell: ({ device }) => <CompareBox device={device} /> },
    sorting('name', 'Device', (row) => <Named row={row} />, { heading: true }),
    sorting('size', 'Size', ({ device }) => orNot(device.diagonal, (inches) => formatDiagonal(inches, units)), {
      numeric: true,
    }),
    sorting('weight', 'Weight', ({ device }) => orNot(device.weight, (grams) => formatMass(grams, units)), {
      numeric: true,
    }),
    sorting('colour', 'Colour, pen, water', ({ device }) => <Features device={device} />),
    sorting('front-light', 'Front light', ({ device: { frontLight } }) =>
      orNot(frontLight, (light) => (light ? `to ${formatNumber(light.max)}${THIN_SPACE}cd/m²` : 'none')),
    ),
    figure('lightness', 'Lightness L*'),
    daggered('whiteness', 'Whiteness', 'W'),
    daggered('tint', 'Tint', 'T'),
    figure('chroma', 'Chroma C*'),
    figure('contrast', 'Contrast, to 1'),
    sorting(
      'price',
      'Price',
      ({ device }) =>
        device.price === null && device.onSale === false ? 'none now' : orNot(device.price, formatMoney),
      { numeric: true },
    ),
  ]
}

/** The box that chooses a device for comparing; the form it belongs to stands below the list. */
function CompareBox({ device: { slug, name } }: { device: EditionDevice }) {
  return (
    <label className="-m-2.5 flex min-h-11 min-w-11 cursor-pointer items-center justify-center">
      <input type="checkbox" name="with" value={slug} form={COMPARE_FORM} className="size-6 shrink-0" />
      <span className="sr-only">Compare {name}</span>
    </label>
  )
}

function Named({ row: { device, notStated } }: { row: ListedDevice }) {
  const notes = [
    device.provisional && 'provisional: one unit',
    device.onSale === false && 'no longer on sale',
    device.onSale === null && 'sale not stated',
    notStated.length > 0 && `not stated: ${formatList(notStated.map((field) => FACT_WORDS[field] ?? field))}`,
  ].filter(Boolean)
  return (
    <span className="flex items-center gap-3">
      <Sheet page={device.page} ink={device.ink} size="thumb" />
      <span className="text-balance">
        <Link href={`/devices/${device.slug}`} prefetch={false}>
          {device.name}
        </Link>
        {notes.map((note) => (
          <span key={String(note)} className="block text-note font-normal text-soft">
            {note}
          </span>
        ))}
      </span>
    </span>
  )
}

/** Colour, pen and water in a line each; what is not stated is said, and never taken as no. */
function Features({ device: { colour, pen, water } }: { device: EditionDevice }) {
  const lines = {
    colour: colour === null ? null : colour ? 'colour' : 'mono',
    pen: pen === null ? null : pen ? 'pen' : 'no pen',
    water: water === null ? null : water > 0 ? `IPX${water}` : 'no water rating',
  }
  return (
    <span className="block text-note @max-[40rem]:text-right">
      {Object.entries(lines).map(([name, words]) => (
        <span key={name} className="block whitespace-nowrap">
          {words ?? (
            <>
              <span className="text-soft">{name}</span> <NotStated />
            </>
          )}
        </span>
      ))}
    </span>
  )
}

function orNot<T>(value: T | null, words: (value: T) => ReactNode): ReactNode {
  return value === null ? <NotStated /> : words(value)
}
