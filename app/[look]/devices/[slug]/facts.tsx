import type { ReactNode } from 'react'
import { type Column, Table } from '@/components/ui/table'
import type { DeviceEntry, DeviceRecord } from '@/db/queries/devices'
import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatDiagonal, formatMass } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatNumber, formatUnit } from '@/lib/format/number'
import type { Units as LengthUnits } from '@/lib/look'
import { NotStated } from '../figure'
import { newestSpecs, unitsOf } from './dossier'

/** What is stated of the device, by whom and when; its prices, its units, and its front light as measured. */
export function Facts({
  record,
  entry,
  lengths,
}: {
  record: DeviceRecord
  entry: DeviceEntry
  /** Whether sizes and weights are told in millimetres and grams, or in inches and ounces. */
  lengths: LengthUnits
}) {
  const specs = newestSpecs(record, entry)
  const units = unitsOf(record, entry)
  const unitIds = new Set(units.map(({ id }) => id))
  const frontLights = record.frontLights.filter(({ unitId }) => unitIds.has(unitId))
  return (
    <section aria-labelledby="facts" className="mt-14 print:hidden">
      <h2 id="facts">What is stated</h2>
      <div className="mt-5 grid gap-10">
        <Table
          caption="Facts, each with who stated it and when. What nobody states is not taken as “no”."
          columns={specColumns(lengths)}
          rows={FIELDS.map((field) => ({ field, spec: specs.find((spec) => spec.field === field) ?? null }))}
          rowKey={({ field }) => field}
        />
        <Table
          caption="Prices as seen, newest first, in the currency they were seen in"
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
      </div>
    </section>
  )
}

type Spec = DeviceRecord['specs'][number]
type SpecField = Spec['field']
export const FACT_NAMES: Record<SpecField, string> = {
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
const FIELDS = Object.keys(FACT_NAMES) as SpecField[]

const specColumns = (lengths: LengthUnits): Column<{ field: SpecField; spec: Spec | null }>[] => [
  { key: 'field', head: 'Fact', label: 'Fact', heading: true, cell: ({ field }) => FACT_NAMES[field] },
  { key: 'value', head: 'Stated', label: 'Stated', cell: ({ spec }) => stated(spec, lengths) },
  { key: 'source', head: 'By', label: 'By', cell: ({ spec }) => spec?.source ?? <NotStated /> },
  { key: 'date', head: 'On', label: 'On', cell: ({ spec }) => (spec ? formatDay(spec.statedOn) : <NotStated />) },
]

/** A fact in words: its number with its unit, its list, or yes and no. */
export function stated(spec: Spec | null | undefined, lengths: LengthUnits): ReactNode {
  if (!spec || spec.stated === 'not-stated') return <NotStated />
  if (spec.stated === 'no') return 'no'
  if (spec.list) return formatList(spec.list)
  if (spec.value === null) return 'yes'
  switch (spec.field) {
    case 'water':
      return spec.value === 0 ? 'none' : `second digit ${formatExact(spec.value)} (IEC 60529)`
    case 'diagonal':
      return formatDiagonal(spec.value, lengths)
    case 'weight':
      return formatMass(spec.value, lengths)
    default:
      return formatUnit(spec.value, 'ppi')
  }
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
