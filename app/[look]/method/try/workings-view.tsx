import { type Column, Table } from '@/components/ui/table'
import { formatExact, formatNumber as n } from '@/lib/format/number'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import type { State } from '@/lib/workings/budget'
import { PART_WORDS } from '@/lib/workings/part-words'
import { CHANNELS, type Channel, type ChannelStatistics } from '@/lib/workings/readings'
import type { Budget, Workings } from '@/lib/workings/workings'
import { StepsList } from './steps-list'

const SIGNS: Record<Channel, string> = { L: 'L*', a: 'a*', b: 'b*' }

/** Every step from the readings to the contrast reserve, each with its numbers and its source. */
export function WorkingsView({ workings: { statistics, budget, steps } }: { workings: Workings }) {
  return (
    <div className="grid gap-10">
      <section aria-labelledby="steps-readings">
        <h3 id="steps-readings">From readings to a colour</h3>
        <StatisticsTable statistics={statistics} />
        <p className="mt-4 mb-2 text-soft">The page’s lightness, step by step; the others go the same way.</p>
        <StepsList title="From readings to a colour" steps={steps.readings} />
      </section>
      <section aria-labelledby="steps-colour">
        <h3 id="steps-colour" className="mb-4">
          From the colour to whiteness, tint and contrast
        </h3>
        <StepsList title="From the colour to whiteness, tint and contrast" steps={steps.colour} />
      </section>
      <section aria-labelledby="steps-doubt">
        <h3 id="steps-doubt">How sure that is</h3>
        {budget ? (
          <>
            <BudgetTable budget={budget} />
            <p className="mt-4 mb-2 max-w-[68ch] text-soft">
              {scatterWords(budget)} The spreads of places, units, session and calibration are edition{' '}
              {formatExact(budget.edition)}’s.
            </p>
            <StepsList title="How sure that is" steps={steps.doubt} />
          </>
        ) : (
          <p className="mt-3 text-soft">
            No edition has been released, so there are no spreads of places and units to work a doubt out from.
          </p>
        )}
      </section>
      <section aria-labelledby="steps-reserve">
        <h3 id="steps-reserve" className="mb-4">
          In this light
        </h3>
        <StepsList title="In this light" steps={steps.reserve} />
      </section>
    </div>
  )
}

function scatterWords({ ownScatter: { page, ink } }: Budget): string {
  if (page && ink) return 'The scatter is that of the readings above; our figures take the whole edition’s, pooled.'
  if (page || ink) {
    return `The scatter of the ${page ? 'page' : 'ink'} is that of its readings; the other has one reading, and the edition’s pooled scatter stands in.`
  }
  return 'A single reading has no scatter of its own; the edition’s, pooled over all devices, stands in.'
}

type Row = { state: State; channel: Channel; of: ChannelStatistics }

const STATISTICS: Column<Row>[] = [
  {
    key: 'of',
    head: 'Of',
    label: 'Of',
    heading: true,
    cell: ({ state, channel }) => `${SIGNS[channel]} of the ${state}`,
  },
  { key: 'n', head: 'Readings', label: 'Readings', numeric: true, cell: ({ of }) => n(of.n) },
  { key: 'mean', head: 'Mean', label: 'Mean', numeric: true, cell: ({ of }) => n(of.mean, 3) },
  { key: 'sd', head: 's', label: 'Standard deviation s', numeric: true, cell: ({ of }) => or(of.sd, 4) },
  { key: 'standard', head: 's/√n', label: 's/√n', numeric: true, cell: ({ of }) => or(of.standard, 4) },
  { key: 'half', head: '± 95 %', label: '± 95 %', numeric: true, cell: ({ of }) => or(of.halfWidth, 3) },
  { key: 'grubbs', head: 'Grubbs’ test', label: 'Grubbs’ test', cell: ({ of }) => grubbsWords(of) },
]

function StatisticsTable({ statistics }: { statistics: Workings['statistics'] }) {
  const rows = (['page', 'ink'] as const).flatMap((state) =>
    CHANNELS.map((channel) => ({ state, channel, of: statistics[state][channel] })),
  )
  return (
    <Table
      caption="Mean, spread and Grubbs’ test of each channel, in CIELAB units"
      columns={STATISTICS}
      rows={rows}
      rowKey={({ state, channel }) => `${state} ${channel}`}
      className="mt-4"
    />
  )
}

const or = (value: number | null, decimals: number) => (value === null ? 'no spread' : n(value, decimals))

function grubbsWords({ grubbs }: ChannelStatistics): string {
  if (grubbs.reason !== null) return grubbs.reason === 'too-few' ? 'too few readings' : 'all the same'
  const { G, critical, index, isOutlier } = grubbs
  return isOutlier
    ? `reading ${index + 1} stands out, G ${n(G, 2)} > ${n(critical, 2)}`
    : `none stands out, G ${n(G, 2)} ≤ ${n(critical, 2)}`
}

type Line = { key: string; name: string; type: string; u: Record<State, Record<Channel, number>> }

function BudgetTable({ budget: { parts, combined, expanded } }: { budget: Budget }) {
  const rows: Line[] = [
    ...parts.map(({ id, type, u }) => ({ key: id, name: PART_WORDS[id].name, type, u })),
    { key: 'combined', name: 'Combined, u(c)', type: '', u: combined },
    { key: 'expanded', name: `Expanded, U = ${COVERAGE_FACTOR}·u(c)`, type: '', u: expanded },
  ]
  const sizes = (['page', 'ink'] as const).flatMap((state) =>
    CHANNELS.map((channel): Column<Line> => {
      const label = `${SIGNS[channel]} of the ${state}`
      return { key: label, head: label, label, numeric: true, cell: ({ u }) => n(u[state][channel], 3) }
    }),
  )
  return (
    <Table
      caption="Standard uncertainty each part brings, in CIELAB units. Type A: from repeated readings; B: from a certificate"
      columns={[
        { key: 'part', head: 'Part', label: 'Part', heading: true, cell: ({ name }) => name },
        { key: 'type', head: 'Type', label: 'Type', cell: ({ type }) => type || '–' },
        ...sizes,
      ]}
      rows={rows}
      rowKey={({ key }) => key}
      className="mt-4"
    />
  )
}
