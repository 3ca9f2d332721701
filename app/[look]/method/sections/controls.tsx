import { ControlChart, type ControlPoint } from '@/components/charts/control-chart'
import type { BenchEvent, ControlSeries } from '@/db/queries/controls'
import { formatDay } from '@/lib/format/date'
import { formatNumber as n } from '@/lib/format/number'
import { type ControlState, controlOfRanges, controlOfValues, RULE_WORDS } from '@/lib/workings/control-state'
import { controlWords } from '@/lib/workings/control-words'
import type { MethodData } from '../data'
import { MethodSection, Prose } from '../parts'
import { ControlsTable, readingsOf, valuesOf } from './controls-table'

/** A chart holds so many sessions, the newest; its limits are made from them. */
const MOST_SESSIONS = 48

export function ControlsSection({ number, data: { edition, series, events } }: { number: number; data: MethodData }) {
  const charted = series.map((one) => ({ ...one, sessions: one.sessions.slice(-MOST_SESSIONS) }))
  return (
    <MethodSection id="controls" number={number} title="The control charts">
      <Prose>
        <p>
          In every session we read the same samples before and after the devices: a tile, which says whether the bench
          still reads as it did, a chart’s white patch, and a numbered paper, which gives the figures a meaning. Each
          point is the mean of a session’s readings. The limits are three sigma from the centre, sigma from the moving
          range of neighbouring sessions (NIST/SEMATECH e-Handbook, 6.3.2.2): sessions differ by more than readings
          within one do, and that is what the session’s part of a doubt stands for. They are made from the sessions
          shown. Within a session the range of its readings is charted by itself.
        </p>
        <p>
          Beside the limits, eight runs are looked for that chance seldom makes (Nelson 1984):{' '}
          {Object.entries(RULE_WORDS)
            .map(([rule, words]) => `(${rule}) ${words}`)
            .join(', ')}
          . With so many charts a false alarm now and then is to be expected; a run is a reason to look, not a fault.
        </p>
      </Prose>
      {edition === null || charted.length === 0 ? (
        <p className="mt-6 text-soft">No edition has been released yet, so there are no control charts.</p>
      ) : (
        <>
          <ControlsTable series={charted} />
          {charted.map((one) => (
            <Control key={one.serial} series={one} />
          ))}
          <Done events={events} />
        </>
      )}
    </MethodSection>
  )
}

/** One control with its charts: lightness session by session, and the range within sessions. */
function Control({ series }: { series: ControlSeries }) {
  const { name, serial, note, kind, sessions } = series
  const [first, last] = [sessions[0], sessions.at(-1)]
  if (!first || !last) return null
  const value = controlOfValues(valuesOf(series, 'L'))
  const range = controlOfRanges(readingsOf(series, 'L'))
  return (
    <section aria-labelledby={`control-${serial}`} className="mt-12">
      <h3 id={`control-${serial}`}>{name}</h3>
      <p className="mt-2 max-w-[68ch] text-small text-soft">
        {serial}. {note} Read in {n(sessions.length)} sessions from {formatDay(first.startedAt)} to{' '}
        {formatDay(last.startedAt)}.
      </p>
      {value ? (
        <Chart
          title={`${name}: mean L* of each session`}
          quantity="L*"
          state={value}
          kind="values"
          series={series}
          words={controlWords(value, sessions)}
        />
      ) : (
        <p className="mt-3 text-soft">Too few sessions to make limits from.</p>
      )}
      {range && kind === 'tile' && (
        <Chart
          title={`${name}: range of L* within each session`}
          quantity="Range of L*"
          state={range}
          kind="ranges"
          series={series}
          words={controlWords(range, sessions)}
        />
      )}
    </section>
  )
}

function Chart({
  title,
  quantity,
  state,
  kind,
  series: { sessions },
  words,
}: {
  title: string
  quantity: string
  state: ControlState
  kind: 'values' | 'ranges'
  series: ControlSeries
  words: string
}) {
  const points: ControlPoint[] = state.points.map((point, i) => ({
    ...point,
    label: sessions[i]?.name ?? String(i + 1),
    day: sessions[i]?.startedAt.toISOString() ?? '',
  }))
  return (
    <figure className="card mt-5 p-5 max-sm:p-4">
      <figcaption className="mb-3">
        <span className="font-semibold">{title}</span>
        <span className="block max-w-[68ch] text-small text-soft">{words}</span>
      </figcaption>
      <ControlChart
        title={title}
        quantity={quantity}
        decimals={kind === 'ranges' ? 3 : 2}
        points={points}
        limits={state.limits}
        kind={kind}
      />
    </figure>
  )
}

/** What was done to the bench meanwhile, as its records have it. */
function Done({ events }: { events: readonly BenchEvent[] }) {
  return (
    <>
      <h3 className="mt-12">What was done meanwhile</h3>
      {events.length === 0 ? (
        <p className="mt-3 text-soft">Nothing is on record: no service, and no note of a calibration or a session.</p>
      ) : (
        <ul className="mt-3 max-w-[68ch] list-disc pl-5">
          {events.map(({ on, instrument, what }) => (
            <li key={`${on} ${instrument} ${what}`}>
              {formatDay(on)}, {instrument}: {what}
            </li>
          ))}
        </ul>
      )}
      <p className="mt-3 max-w-[68ch] text-soft">
        This is all the bench’s records hold. A session that stands out without a line here has no explanation on
        record.
      </p>
    </>
  )
}
