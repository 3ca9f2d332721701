import type { ReactNode } from 'react'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceRecord } from '@/db/queries/devices'
import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatNumber, formatUnit } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'
import { NotStated } from '../figure'
import { newestSpecs, unitsOf } from './dossier'

/** What is stated of the device, by whom and when; its prices, its units, and its front light as measured. */
export function Facts({ record, device }: { record: DeviceRecord; device: EditionDevice }) {
  const specs = newestSpecs(record, device)
  const units = unitsOf(record, device)
  const unitIds = new Set(units.map(({ id }) => id))
  const frontLights = record.frontLights.filter(({ unitId }) => unitIds.has(unitId))
  return (
    <section aria-labelledby="facts" className="mt-14">
      <h2 id="facts">What is stated</h2>
      <div className="mt-5 grid gap-10">
        <Table
          caption="Facts, each with who stated it and when. What nobody states is not taken as “no”."
          columns={specColumns}
          rows={FIELDS.map((field) => ({ field, spec: specs.find((spec) => spec.field === field) ?? null }))}
          rowKey={({ field }) => field}
        />
        <Table
          caption="Prices as seen, newest first"
          columns={priceColumns}
          rows={record.prices}
          rowKey={({ id }) => String(id)}
          empty="No price has been seen."
        />
        <Table caption="Units on the bench" columns={unitColumns} rows={units} rowKey={({ id }) => String(id)} />
        {frontLights.length > 0 && (
          <Table
            caption="Front light on a white page, by luminance meter in a dark room"
            columns={frontLightColumns(units)}
            rows={frontLights}
            rowKey={({ id }) => String(id)}
          />
        )}
        {record.revisions.length > 1 && (
          <Table
            caption="Revisions: what the maker changed under this name"
            columns={revisionColumns(device.revision)}
            rows={record.revisions}
            rowKey={({ id }) => String(id)}
          />
        )}
      </div>
    </section>
  )
}

type Spec = DeviceRecord['specs'][number]
type SpecField = Spec['field']
const NAMES: Record<SpecField, string> = {
  diagonal: 'Size of the page',
  ppi: 'Resolution',
  weight: 'Weight',
  pen: 'Pen',
  colour: 'Colour',
  frontLight: 'Front light',
  water: 'Water resistance',
  pageButtons: 'Page buttons',
  onSale: 'On sale',
  lending: 'Library lending',
  speech: 'Reading aloud',
  formats: 'File formats',
}
const FIELDS = Object.keys(NAMES) as SpecField[]

const specColumns: Column<{ field: SpecField; spec: Spec | null }>[] = [
  { key: 'field', head: 'Fact', label: 'Fact', heading: true, cell: ({ field }) => NAMES[field] },
  { key: 'value', head: 'Stated', label: 'Stated', cell: ({ spec }) => stated(spec) },
  { key: 'source', head: 'By', label: 'By', cell: ({ spec }) => spec?.source ?? '' },
  { key: 'date', head: 'On', label: 'On', cell: ({ spec }) => (spec ? formatDay(spec.statedOn) : '') },
]

/** A fact in words: its number with its unit, its list, or yes and no. */
function stated(spec: Spec | null): ReactNode {
  if (!spec || spec.stated === 'not-stated') return <NotStated />
  if (spec.stated === 'no') return 'no'
  if (spec.list) return formatList(spec.list)
  if (spec.value === null) return 'yes'
  if (spec.field === 'water') return spec.value === 0 ? 'none' : `second digit ${formatExact(spec.value)} (IEC 60529)`
  const unit = { diagonal: 'in', ppi: 'ppi', weight: 'g' }[spec.field as 'diagonal' | 'ppi' | 'weight']
  return formatUnit(spec.value, unit, Number.isInteger(spec.value) ? 0 : 1)
}

type Price = DeviceRecord['prices'][number]
const priceColumns: Column<Price>[] = [
  { key: 'seen', head: 'Seen', label: 'Seen', heading: true, cell: ({ seenOn }) => formatDay(seenOn) },
  {
    key: 'price',
    head: 'Price',
    label: 'Price',
    numeric: true,
    cell: ({ amountMinor, currency }) => formatMoney({ amount: amountMinor, currency }),
  },
  { key: 'seller', head: 'Seller', label: 'Seller', cell: ({ seller }) => seller },
]

type Unit = DeviceRecord['units'][number]
const unitColumns: Column<Unit>[] = [
  { key: 'serial', head: 'Unit', label: 'Unit', heading: true, cell: ({ serial }) => serial },
  { key: 'batch', head: 'Batch', label: 'Batch', cell: ({ batch }) => batch ?? <NotStated /> },
  { key: 'firmware', head: 'Firmware', label: 'Firmware', cell: ({ firmware }) => firmware },
  {
    key: 'from',
    head: 'How we got it',
    label: 'How we got it',
    cell: ({ obtained, obtainedFrom, obtainedOn }) =>
      `${obtained === 'bought' ? 'bought from' : 'lent by'} ${obtainedFrom}, ${formatDay(obtainedOn)}`,
  },
  { key: 'condition', head: 'Condition', label: 'Condition', cell: ({ condition }) => condition },
]

type FrontLight = DeviceRecord['frontLights'][number]
const frontLightColumns = (units: readonly Unit[]): Column<FrontLight>[] => [
  {
    key: 'unit',
    head: 'Unit',
    label: 'Unit',
    heading: true,
    cell: ({ unitId }) => units.find(({ id }) => id === unitId)?.serial,
  },
  {
    key: 'most',
    head: 'Most, cd/m²',
    label: 'Most, cd/m²',
    numeric: true,
    cell: ({ maxCdM2 }) => formatNumber(maxCdM2),
  },
  {
    key: 'least',
    head: 'Least, cd/m²',
    label: 'Least, cd/m²',
    numeric: true,
    cell: ({ minCdM2 }) => formatNumber(minCdM2, 1),
  },
  {
    key: 'even',
    head: 'Darkest over lightest place',
    label: 'Darkest over lightest place',
    numeric: true,
    cell: ({ evennessPercent }) => formatUnit(evennessPercent, '%'),
  },
  {
    key: 'white',
    head: 'Colour temperature, K',
    label: 'Colour temperature, K',
    numeric: true,
    cell: ({ coolestKelvin, warmestKelvin }) =>
      coolestKelvin === warmestKelvin
        ? formatNumber(coolestKelvin)
        : `${formatNumber(warmestKelvin)} to ${formatNumber(coolestKelvin)}`,
  },
]

type Revision = DeviceRecord['revisions'][number]
const revisionColumns = (measured: string): Column<Revision>[] => [
  {
    key: 'name',
    head: 'Revision',
    label: 'Revision',
    heading: true,
    cell: ({ name }) => (name === measured ? `${name} (the one these figures are of)` : name),
  },
  { key: 'since', head: 'Since', label: 'Since', cell: ({ since }) => (since ? formatDay(since) : <NotStated />) },
  { key: 'note', head: 'What changed', label: 'What changed', cell: ({ note }) => note ?? '' },
]
