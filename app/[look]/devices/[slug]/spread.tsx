import { type Column, Table } from '@/components/ui/table'
import { type SpreadRow, spreadBy } from '@/lib/findings/spread'
import { formatNumber } from '@/lib/format/number'
import type { CountedSet } from './dossier'

/** How far apart the units and the positions on their pages lie. */
export function Spread({ sets }: { sets: readonly CountedSet[] }) {
  const [units, positions] = [spreadBy(sets, 'unit'), spreadBy(sets, 'position')]
  return (
    <section aria-labelledby="spread" className="mt-14 print:hidden">
      <h2 id="spread">Between units and positions</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        {units.length === 1
          ? 'One unit was measured, so how far another would lie is not known from this device.'
          : 'A figure is the mean of the units’, a unit’s the mean of its sets. What lies far from the others shows here.'}{' '}
        Repeatability is the standard deviation of L* within the page’s sets.
      </p>
      <div className="mt-5 grid gap-10">
        <Table
          caption="By unit: L*, a*, b* of the page, L* of the ink"
          columns={columns('Unit')}
          rows={units}
          rowKey={({ name }) => name}
        />
        <Table
          caption="By position on the page, over all units"
          columns={columns('Position')}
          rows={positions}
          rowKey={({ name }) => name}
        />
      </div>
    </section>
  )
}

const columns = (first: string): Column<SpreadRow>[] => [
  { key: 'name', head: first, label: first, heading: true, cell: ({ name }) => name },
  number('readings', 'Readings', ({ readings }) => readings, 0),
  number('L', 'L*', ({ page }) => page?.L, 1),
  number('off', 'L* off the mean', ({ offset }) => offset, 2),
  number('sd', 'Repeatability, L*', ({ repeatability }) => repeatability, 2),
  number('a', 'a*', ({ page }) => page?.a, 1),
  number('b', 'b*', ({ page }) => page?.b, 1),
  number('ink', 'Ink L*', ({ ink }) => ink?.L, 1),
]

function number(
  key: string,
  head: string,
  value: (row: SpreadRow) => number | null | undefined,
  decimals: number,
): Column<SpreadRow> {
  return {
    key,
    head,
    label: head,
    numeric: true,
    cell: (row) => {
      const given = value(row)
      return given == null ? 'not read' : formatNumber(given, decimals)
    },
  }
}
