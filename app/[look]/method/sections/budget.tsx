import { type Column, Table } from '@/components/ui/table'
import { formatList } from '@/lib/format/list'
import { formatExact, formatUnit, formatNumber as n } from '@/lib/format/number'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import type { Counts, Part, PartId } from '@/lib/workings/budget'
import { countsOf } from '@/lib/workings/counts'
import { type DeviceBudget, deviceBudget } from '@/lib/workings/device-budget'
import { PART_WORDS } from '@/lib/workings/part-words'
import type { Bench } from '@/lib/workings/workings'
import type { MethodData } from '../data'
import { MethodSection, Prose } from '../parts'

const DERIVED = [
  { id: 'whiteness', name: 'W₁₀' },
  { id: 'tint', name: 'T₁₀' },
  { id: 'contrast', name: 'Contrast' },
] as const
const FIGURES = [{ id: 'lightness', name: 'L*' }, ...DERIVED] as const

export function BudgetSection({ number, data }: { number: number; data: MethodData }) {
  const { edition, bench, sets, start } = data
  const device = edition?.devices.find(({ slug }) => slug === start.from?.slug)
  return (
    <MethodSection id="budget" number={number} title="The uncertainty budget">
      <Prose>
        <p>
          A budget lists every reason we know of why a figure may be off, how large each is, and what they make together
          (JCGM 100). Type A is worked out from our own repeated readings, type B is taken from a certificate. All sizes
          are standard uncertainties; only what is called expanded is multiplied by the coverage factor k ={' '}
          {COVERAGE_FACTOR}, once, for about 95 %.
        </p>
      </Prose>
      {edition && bench && device ? (
        <Budget
          name={device.name}
          edition={edition.number}
          bench={bench}
          counts={countsOf(sets, device.slug).page}
          budget={deviceBudget(device, edition.uncertainty, bench, countsOf(sets, device.slug))}
        />
      ) : (
        <p className="mt-6 text-soft">No edition has been released yet, so there is nothing to budget.</p>
      )}
    </MethodSection>
  )
}

function Budget({
  name,
  edition,
  bench,
  counts,
  budget,
}: {
  name: string
  edition: number
  bench: Bench
  counts: Counts
  budget: DeviceBudget
}) {
  const times = `${n(counts.units)} units, ${n(counts.sets)} sets, ${n(counts.readings)} readings of the page`
  return (
    <>
      <SpreadsTable bench={bench} edition={edition} parts={budget.parts} />
      <p className="mt-8 max-w-[68ch]">
        What those spreads make of a figure depends on how often a device was measured. As an example, {name}: {times}.{' '}
        {FIGURES.map(({ id, name: figure }) => largestWords(figure, budget.figures[id].largest)).join(' ')}
      </p>
      <DeviceTable budget={budget} caption={`${name}, edition ${edition}: what each part brings to its figures`} />
      <SlopesTable budget={budget} name={name} />
      <Prose>
        <p>
          The parts are combined as the root of their squares. An error of the session or of the calibration moves page
          and ink together, so in a contrast ratio it drops out in part; the others do not. The coverage factor is fixed
          and not taken from the degrees of freedom, which are given so that one can judge whether that is fair. The
          certificate states none.
        </p>
      </Prose>
    </>
  )
}

function largestWords(figure: string, largest: { id: PartId; share: number } | null): string {
  if (!largest) return ''
  return `The largest part of ${figure === 'Contrast' ? 'the contrast ratio' : figure}: ${PART_WORDS[largest.id].name.toLowerCase()}, ${formatUnit(100 * largest.share, '%')} of the variance.`
}

function SpreadsTable({ bench, edition, parts }: { bench: Bench; edition: number; parts: readonly Part[] }) {
  const columns: Column<Part>[] = [
    {
      key: 'part',
      head: 'Part',
      label: 'Part',
      heading: true,
      cell: ({ id }) => (
        <>
          {PART_WORDS[id].name}, {PART_WORDS[id].sign}
          <span className="block font-normal text-soft">{PART_WORDS[id].from}</span>
        </>
      ),
    },
    { key: 'type', head: 'Type', label: 'Type', cell: ({ type }) => type },
    ...(['L', 'a', 'b'] as const).map((channel): Column<Part> => {
      const label = `${channel}* of the page`
      return { key: label, head: label, label, numeric: true, cell: ({ spread }) => n(spread.page[channel], 3) }
    }),
    {
      key: 'ink',
      head: 'L* of the ink',
      label: 'L* of the ink',
      numeric: true,
      cell: ({ spread }) => n(spread.ink.L, 3),
    },
    {
      key: 'degrees',
      head: 'Degrees of freedom, page',
      label: 'Degrees of freedom, page',
      numeric: true,
      cell: ({ id }) => (bench.degrees[id] === undefined ? 'not stated' : n(bench.degrees[id])),
    },
  ]
  return (
    <Table
      caption={`Spreads of edition ${formatExact(edition)}, in CIELAB units, pooled over its devices; before they are divided by anything`}
      columns={columns}
      rows={parts}
      rowKey={({ id }) => id}
      className="mt-6"
    />
  )
}

type Line = { key: string; name: string; by: string; channels: Record<'L' | 'a' | 'b', number>; figures: number[] }

function DeviceTable({ budget, caption }: { budget: DeviceBudget; caption: string }) {
  const rows: Line[] = [
    ...budget.parts.map(({ id, u, divisor }, i) => ({
      key: id,
      name: PART_WORDS[id].name,
      by: divisor.page === 1 ? 'nothing' : `√${formatExact(Number((divisor.page ** 2).toFixed(2)))}`,
      channels: u.page,
      figures: DERIVED.map((figure) => budget.figures[figure.id].sizes[i]?.u ?? 0),
    })),
    {
      key: 'combined',
      name: 'Combined',
      by: '',
      channels: budget.combined,
      figures: DERIVED.map(({ id }) => budget.figures[id].combined),
    },
    {
      key: 'expanded',
      name: `Expanded, k = ${COVERAGE_FACTOR}`,
      by: '',
      channels: budget.expanded,
      figures: DERIVED.map(({ id }) => budget.figures[id].expanded),
    },
  ]
  return (
    <Table
      caption={caption}
      columns={[
        { key: 'part', head: 'Part', label: 'Part', heading: true, cell: ({ name }) => name },
        { key: 'by', head: 'Divided by', label: 'Divided by', cell: ({ by }) => by || '–' },
        ...(['L', 'a', 'b'] as const).map(
          (channel): Column<Line> => ({
            key: channel,
            head: `${channel}*`,
            label: `${channel}*`,
            numeric: true,
            cell: ({ channels }) => n(channels[channel], 3),
          }),
        ),
        ...DERIVED.map(
          ({ id, name }, i): Column<Line> => ({
            key: id,
            head: name,
            label: name,
            numeric: true,
            cell: ({ figures }) => n(figures[i] ?? 0, 3),
          }),
        ),
      ]}
      rows={rows}
      rowKey={({ key }) => key}
      className="mt-6"
    />
  )
}

function SlopesTable({ budget, name }: { budget: DeviceBudget; name: string }) {
  const rows = DERIVED.map(({ id, name: figure }) => ({ figure, ...budget.slopes[id] }))
  type Row = (typeof rows)[number]
  const page = (['L', 'a', 'b'] as const).map((channel): Column<Row> => {
    const label = `${channel}* of the page`
    return { key: channel, head: label, label, numeric: true, cell: (row) => n(row.page[channel], 3) }
  })
  return (
    <Table
      caption={`Sensitivities at ${name}’s page: how far ${formatList(DERIVED.map(({ name: figure }) => (figure === 'Contrast' ? 'the contrast ratio' : figure)))} move for one unit more`}
      columns={[
        { key: 'figure', head: 'Figure', label: 'Figure', heading: true, cell: ({ figure }) => figure },
        ...page,
        { key: 'ink', head: 'L* of the ink', label: 'L* of the ink', numeric: true, cell: (row) => n(row.ink, 3) },
      ]}
      rows={rows}
      rowKey={({ figure }) => figure}
      className="mt-6"
    />
  )
}
