import { formatExact, formatLux, formatNumber, formatTimes, THIN_SPACE } from '@/lib/format/number'
import { Table } from '../ui/table'
import { percent } from './boxes'
import { ChartFrame, NARROW_FROM, WIDE_FROM } from './chart-frame'
import { Drawing } from './drawing'
import {
  type LadderBand,
  type LadderCurve,
  type LadderLayout,
  layOutLadder,
  PATH_BOX,
  reserveAt,
} from './ladder-layout'
import { Mark } from './mark'
import { LINE_PX } from './text-width'

export type { LadderBand, LadderCurve } from './ladder-layout'

const TITLE = 'The ladder: contrast reserve over the light falling on the page'

const STROKES: Record<LadderCurve['style'], string> = {
  first: 'chart-curve chart-curve-first',
  second: 'chart-curve chart-curve-second',
  third: 'chart-curve chart-curve-third',
  quiet: 'chart-curve chart-curve-quiet',
}
const TONES: Record<LadderBand['tone'], string> = {
  lamp: 'chart-band chart-band-lamp',
  room: 'chart-band chart-band-room',
  daylight: 'chart-band chart-band-daylight',
}

/**
 * How many times more contrast a page gives than the eye needs, from one lux to full sun. Curves are told apart by
 * their stroke and their name; the quiet ones are the others, for company.
 */
export function Ladder({ curves, bands }: { curves: readonly LadderCurve[]; bands: readonly LadderBand[] }) {
  if (curves.length === 0) return <p className="text-soft">There is no curve to draw yet.</p>
  const order = Object.keys(STROKES)
  const named = curves
    .filter((curve) => curve.style !== 'quiet')
    .sort((one, two) => order.indexOf(one.style) - order.indexOf(two.style))
  const wide = layOutLadder({ width: WIDE_FROM, plotHeight: 250, gutter: named.length > 0 ? 146 : 0, curves, bands })
  const narrow = layOutLadder({ width: NARROW_FROM, plotHeight: 240, gutter: 0, curves, bands })
  return (
    <ChartFrame
      wide={<Curves layout={wide} />}
      narrow={
        <>
          <Curves layout={narrow} />
          <Key curves={named} />
        </>
      }
      table={<LadderTable curves={curves} bands={bands} />}
    />
  )
}

function Curves({ layout }: { layout: LadderLayout }) {
  const { width, height, plot, anchors, luxTicks, bands, curves } = layout
  const x = (px: number) => percent(px, width)
  const desc = `${curves.length} ${curves.length === 1 ? 'curve' : 'curves'} over 1 to 100,000 lux, both scales logarithmic, with lines at 3 times for spot reading, 10 times for fluent and 30 times for easiest reading.`
  return (
    <Drawing title={TITLE} desc={desc} height={height}>
      {bands.map(({ band, left, right, middle, labelY, hint }) => (
        <g key={band.label}>
          <rect
            x={x(left)}
            width={x(right - left)}
            y={plot.top}
            height={plot.bottom - plot.top}
            className={TONES[band.tone]}
          />
          <text x={x(middle)} y={hint ? labelY - LINE_PX + 2 : labelY} textAnchor="middle" className="chart-strong">
            {band.label}
          </text>
          {hint && (
            <text x={x(middle)} y={labelY} textAnchor="middle">
              {band.hint}
            </text>
          )}
        </g>
      ))}
      {anchors.map(({ at, word, y, side }) => (
        <g key={at}>
          <line x1={x(plot.left)} x2={x(plot.right)} y1={y} y2={y} className="chart-anchor" />
          <text x={x(plot.left)} dx={-6} y={y + 5} textAnchor="end" className="chart-strong">
            {at}×
          </text>
          <text
            x={x(side === 'left' ? plot.left : plot.right)}
            dx={side === 'left' ? 6 : -2}
            y={y - 5}
            textAnchor={side === 'left' ? 'start' : 'end'}
            className="chart-halo"
          >
            {word}
          </text>
        </g>
      ))}
      <line x1={x(plot.left)} x2={x(plot.right)} y1={plot.bottom} y2={plot.bottom} className="chart-base" />
      {luxTicks.map(({ lux, x: px }, i) => (
        <g key={lux}>
          <line x1={x(px)} x2={x(px)} y1={plot.bottom} y2={plot.bottom + 5} className="chart-base" />
          <text
            x={x(px)}
            y={plot.bottom + 20}
            textAnchor={i === luxTicks.length - 1 ? 'end' : 'middle'}
            dx={i === luxTicks.length - 1 ? 8 : 0}
          >
            {formatTick(lux, width)}
          </text>
        </g>
      ))}
      <text x={x(plot.left)} y={plot.bottom + 39}>
        Light falling on the page, lux
      </text>
      <svg
        aria-hidden="true"
        x={x(plot.left)}
        y={plot.top}
        width={x(plot.right - plot.left)}
        height={plot.bottom - plot.top}
        viewBox={`0 0 ${PATH_BOX.width} ${PATH_BOX.height}`}
        preserveAspectRatio="none"
        className="chart-clip"
      >
        {[...curves]
          .sort((one, two) => Number(one.curve.style !== 'quiet') - Number(two.curve.style !== 'quiet'))
          .map(({ curve, path }) => (
            <path key={curve.name} d={path} className={STROKES[curve.style]} />
          ))}
      </svg>
      {curves.map(({ curve, marks, label }) => (
        <g key={curve.name}>
          {marks.map((mark) => (
            <Mark key={mark.lux} label={`${curve.name}: ${formatTimes(mark.reserve)} at ${formatLux(mark.lux)} lux`}>
              <circle cx={x(mark.x)} cy={mark.y} r={4} className={`chart-stop chart-stop-${curve.style}`} />
            </Mark>
          ))}
          {label?.lines.map((text, i) => (
            <text key={text} x={x(plot.right)} dx={10} y={label.y + i * LINE_PX} className="chart-strong">
              {text}
            </text>
          ))}
        </g>
      ))}
    </Drawing>
  )
}

/** A narrow drawing has no room for every number: there the ticks go on, and one of them says nothing. */
function formatTick(lux: number, width: number): string {
  return width < WIDE_FROM && lux === 10_000 ? '' : formatExact(lux)
}

function Key({ curves }: { curves: readonly LadderCurve[] }) {
  return (
    <ul className="mt-2 grid gap-1 text-note">
      {curves.map((curve) => (
        <li key={curve.name} className="flex items-center gap-2.5">
          <svg aria-hidden="true" width={36} height={8} className="shrink-0">
            <path d="M0 4h36" className={STROKES[curve.style]} />
          </svg>
          {curve.name}
        </li>
      ))}
    </ul>
  )
}

function LadderTable({ curves, bands }: { curves: readonly LadderCurve[]; bands: readonly LadderBand[] }) {
  const stops = bands.length
    ? bands.map((band) => ({ name: band.label, lux: Math.sqrt(band.lo * band.hi) }))
    : [1, 10, 100, 1000, 10_000, 100_000].map((lux) => ({ name: '', lux }))
  return (
    <Table
      caption="Contrast reserve: times the contrast the eye needs, in the light of each column"
      rows={curves}
      rowKey={(curve) => curve.name}
      columns={[
        { key: 'name', head: 'Page', label: 'Page', heading: true, cell: (curve) => curve.name },
        ...stops.map((stop) => {
          const label = [stop.name, `${formatLux(stop.lux)}${THIN_SPACE}lux`].filter(Boolean).join(', ')
          return {
            key: `${stop.lux}`,
            head: label,
            label,
            numeric: true,
            cell: (curve: LadderCurve) => {
              const reserve = reserveAt(curve.points, stop.lux)
              if (reserve === null) return 'not drawn'
              return reserve > 0 ? formatNumber(reserve, 1) : 'cannot be read'
            },
          }
        }),
      ]}
    />
  )
}
