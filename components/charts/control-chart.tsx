import { formatDay } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'
import type { Limits } from '@/lib/stats/control-chart'
import { RULE_WORDS } from '@/lib/workings/control-state'
import { Table } from '../ui/table'
import { percent } from './boxes'
import { ChartFrame, NARROW_FROM, WIDE_FROM } from './chart-frame'
import { type ControlLayout, type ControlPoint, layOutControl, type PointShape } from './control-chart-layout'
import { Drawing } from './drawing'
import { PATH_BOX } from './ladder-layout'
import { Mark } from './mark'

export type { ControlPoint } from './control-chart-layout'

const KEY: Record<PointShape, string> = {
  circle: 'within the limits',
  triangle: 'within the limits, and the end of a run that chance seldom makes',
  diamond: 'outside a limit',
}

type Shown = { title: string; quantity: string; decimals: number; points: readonly ControlPoint[]; limits: Limits }

/**
 * A Shewhart chart of a control: one point a session, oldest first, with its centre and the limits it is judged by.
 * Points that break a rule have a shape of their own. The limits are those of the same sessions.
 * @param kind `values` has sigma zones, which run rules count by; `ranges` has limits alone
 */
export function ControlChart({ kind = 'values', ...shown }: Shown & { kind?: 'values' | 'ranges' }) {
  if (shown.points.length === 0) return <p className="text-soft">There is no session to draw yet.</p>
  const layout = (width: number, gutter: number) =>
    layOutControl({ ...shown, width, gutter, plotHeight: 170, zones: kind === 'values' })
  const narrow = layout(NARROW_FROM, 52)
  return (
    <ChartFrame
      wide={<Points {...shown} layout={layout(WIDE_FROM, 150)} kind={kind} />}
      narrow={
        <>
          <Points {...shown} layout={narrow} kind={kind} />
          <p className="text-note text-soft">
            Lines from the top: {narrow.lines.map(({ words }) => words).join(', ')}.
          </p>
        </>
      }
      legend={<Key points={shown.points} />}
      table={<PointsTable {...shown} />}
    />
  )
}

function Points({
  layout,
  kind,
  title,
  quantity,
  decimals,
  limits,
}: Shown & { layout: ControlLayout; kind: 'values' | 'ranges' }) {
  const { plot, lines, zones, points, path, months, width, height } = layout
  const x = (px: number) => percent(px, width)
  const between = `${formatNumber(limits.lower, decimals)} and ${formatNumber(limits.upper, decimals)}`
  const desc = `${points.length} sessions, oldest first, about a centre of ${formatNumber(limits.centre, decimals)} with limits at ${between}${kind === 'values' ? ' and thin lines at one and two sigma' : ''}.`
  return (
    <Drawing title={title} desc={desc} height={height}>
      {zones.map((y) => (
        <line
          key={y}
          x1={x(plot.left)}
          x2={x(plot.right)}
          y1={y}
          y2={y}
          className="chart-grid paper:[stroke-dasharray:1_5]"
        />
      ))}
      {lines.map(({ id, y }) => (
        <line
          key={id}
          x1={x(plot.left)}
          x2={x(plot.right)}
          y1={y}
          y2={y}
          className={id === 'centre' ? 'chart-base' : 'chart-base [stroke-dasharray:8_4]'}
        />
      ))}
      <svg
        aria-hidden="true"
        x={x(plot.left)}
        y={plot.top}
        width={x(plot.right - plot.left)}
        height={plot.bottom - plot.top}
        viewBox={`0 0 ${PATH_BOX.width} ${PATH_BOX.height}`}
        preserveAspectRatio="none"
      >
        <path d={path} className="chart-curve chart-curve-quiet" />
      </svg>
      {points.map(({ point, x: px, y, shape }) => (
        <Mark key={point.label} label={`${quantity}: ${wordsFor(point, decimals)}`}>
          <svg x={x(px)} y={y} role="presentation">
            <Shape shape={shape} />
          </svg>
        </Mark>
      ))}
      {lines.map(({ id, beside, y }) => (
        <text key={id} x={x(plot.right)} dx={8} y={y + 5} className="chart-strong">
          {beside}
        </text>
      ))}
      {months.map(({ text, x: px, anchor }) => (
        <text key={text} x={x(px)} y={plot.bottom + 22} textAnchor={anchor}>
          {text}
        </text>
      ))}
    </Drawing>
  )
}

/** A point about its own origin. */
function Shape({ shape }: { shape: PointShape }) {
  if (shape === 'circle') return <circle r={4} className="chart-stop" />
  const outline = shape === 'diamond' ? 'M0-8L8 0 0 8-8 0z' : 'M0-7L7 6H-7z'
  return <path d={outline} className="fill-stop stroke-sheet stroke-1" />
}

function Key({ points }: { points: readonly ControlPoint[] }) {
  const used = (Object.keys(KEY) as PointShape[]).filter((shape) =>
    points.some(({ outside, rules }) =>
      shape === 'diamond' ? outside : !outside && (shape === 'triangle') === rules.length > 0,
    ),
  )
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1 text-note text-soft">
      {used.map((shape) => (
        <li key={shape} className="flex items-center gap-2">
          <svg aria-hidden="true" viewBox="-9 -9 18 18" className="size-4.5 shrink-0">
            <Shape shape={shape} />
          </svg>
          {KEY[shape]}
        </li>
      ))}
    </ul>
  )
}

function PointsTable({ title, quantity, decimals, points }: Shown) {
  return (
    <Table
      caption={title}
      rows={points}
      rowKey={(point) => point.label}
      columns={[
        { key: 'session', head: 'Session', label: 'Session', heading: true, cell: ({ label }) => label },
        { key: 'day', head: 'Day', label: 'Day', cell: ({ day }) => formatDay(day) },
        {
          key: 'value',
          head: quantity,
          label: quantity,
          numeric: true,
          cell: ({ value }) => formatNumber(value, decimals),
        },
        { key: 'judged', head: 'Judged', label: 'Judged', cell: judgedWords },
      ]}
    />
  )
}

function wordsFor(point: ControlPoint, decimals: number): string {
  return `${formatNumber(point.value, decimals)} on ${formatDay(point.day)}, session ${point.label}, ${judgedWords(point)}`
}

/** What a point broke, in words. */
function judgedWords({ outside, rules }: ControlPoint): string {
  const runs = rules.filter((rule) => rule !== 1).map((rule) => RULE_WORDS[rule] ?? `rule ${rule}`)
  if (!outside && runs.length === 0) return KEY.circle
  return [...(outside ? [KEY.diamond] : []), ...runs].join('; ')
}
