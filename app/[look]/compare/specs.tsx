import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import { type SpecRow, specRows } from '@/lib/compare/specs'
import type { Units } from '@/lib/look'
import type { EditionDevice } from '@/lib/method/types'
import { NotStated } from '../devices/figure'

/** What is stated of the devices: what differs first, what is the same of all behind a line to open. */
export function Specs({ devices, units }: { devices: readonly EditionDevice[]; units: Units }) {
  const { differ, same } = specRows(devices, units)
  const columns: Column<SpecRow>[] = [
    { key: 'name', label: 'Fact', head: 'Fact', heading: true, cell: ({ name }) => name },
    ...devices.map(({ slug, name }, i) => ({
      key: slug,
      label: name,
      head: name,
      cell: ({ values }: SpecRow) => values[i] ?? <NotStated />,
    })),
  ]
  return (
    <section aria-labelledby="specs" className="mt-14">
      <h2 id="specs">What else differs</h2>
      <Table
        className="mt-4"
        caption="Facts that differ between these devices. What is not stated is not taken as “no”."
        columns={columns}
        rows={differ}
        rowKey={({ key }) => key}
        empty="Nothing that is stated differs between these devices."
      />
      {same.length > 0 && (
        <Disclosure className="mt-4" summary={`The same for all (${same.length})`}>
          <Table
            caption="Facts that are the same for all of these devices"
            captionHidden
            columns={[
              columns[0]!,
              { key: 'all', label: 'All', head: 'All', cell: ({ values }) => values[0] ?? <NotStated /> },
            ]}
            rows={same}
            rowKey={({ key }) => key}
          />
        </Disclosure>
      )}
      <p className="mt-3 max-w-[68ch] text-note text-soft">
        Water-resistance codes describe new devices in fresh water. Prices are those seen before the edition was
        released; each device’s own page says where and when.
      </p>
    </section>
  )
}
