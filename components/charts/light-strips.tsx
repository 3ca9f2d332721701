import type { CSSProperties } from 'react'
import { labToHex } from '@/lib/colour/display'
import { formatLux, formatNumber, formatTimes, formatUnit, THIN_SPACE } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import { Table } from '../ui/table'
import { percent } from './boxes'
import { ChartFrame, NARROW_FROM, WIDE_FROM } from './chart-frame'
import { Drawing } from './drawing'
import { Mark } from './mark'
import {
  HANGING,
  layOutStrips,
  PAPER,
  PAPER_SLUG,
  type PlacedStrip,
  STANDING,
  type StripsLayout,
} from './strips-layout'

export type LightSpot = { name: string; lux: number; hours: number; frontLight: boolean }
/** A device with its contrast reserve in each spot, 0 where nothing can be read there. */
export type LightRow = { slug: string; name: string; page: Lab; reserves: readonly number[] }

const TITLE = 'How many times more contrast each page gives than your eyes need, in each light'

type Shown = { rows: readonly LightRow[]; named: readonly string[] }

/**
 * One strip a reading spot with every device as a small sheet: the two that matter and the control paper stand on it
 * with their names, the others hang below. What a curve hides is plain here: how close pages are.
 * @param paper the control paper's reserve in each spot
 * @param named slugs of the devices that carry their name, two at most
 */
export function LightStrips({
  spots,
  rows,
  paper,
  named,
}: {
  spots: readonly LightSpot[]
  rows: readonly LightRow[]
  paper: readonly number[] | null
  named: readonly string[]
}) {
  if (spots.length === 0 || rows.length === 0) return <p className="text-soft">There is nothing to draw yet.</p>
  const two = [...new Set(named)].slice(0, 2)
  const words = spots.map((spot) => ({ name: spot.name, detail: detailOf(spot) }))
  const strips = (width: number, gutter: number) => (
    <Strips
      layout={layOutStrips({ width, gutter, spots: words, devices: rows, paper, named: two })}
      names={spots.map((spot) => spot.name)}
      rows={rows}
      named={two}
    />
  )
  return (
    <ChartFrame
      wide={strips(WIDE_FROM, 150)}
      narrow={strips(NARROW_FROM, 0)}
      hint="Each small sheet is a device. Point at one to read it; on a keyboard, Tab to the chart and walk with the arrow keys."
      table={<StripsTable {...{ spots, rows, paper }} />}
    />
  )
}

function detailOf({ lux, hours, frontLight }: LightSpot): string {
  const light = `${formatLux(lux)}${THIN_SPACE}lux, ${formatUnit(hours, 'h', Number.isInteger(hours) ? 0 : 1)} a week`
  return frontLight ? `${light}, front light allowed` : light
}

function Strips({ layout, names, ...shown }: Shown & { layout: StripsLayout; names: readonly string[] }) {
  const { plot, tooLittle, ticks, strips, width, height } = layout
  const x = (px: number) => percent(px, width)
  const desc = `A strip for each of ${strips.length} reading spots, marked at 3 times for spot reading, 10 times for fluent and 30 times for easiest reading, with ${shown.rows.length} devices on each.`
  return (
    <Drawing title={TITLE} desc={desc} height={height}>
      <rect
        x={x(plot.left)}
        y={plot.top}
        width={x(tooLittle - plot.left)}
        height={plot.bottom - plot.top}
        className="chart-zone"
      />
      {ticks.map((tick) => (
        <g key={tick.times}>
          <line x1={x(tick.x)} x2={x(tick.x)} y1={plot.top} y2={plot.bottom} className="chart-anchor" />
          <text x={x(tick.timesX)} y={14} textAnchor="middle" className="chart-strong">
            {tick.times}
          </text>
          {tick.words.map((word) => (
            <text key={word.text} x={x(word.x)} y={word.y} textAnchor="middle">
              {word.text}
            </text>
          ))}
        </g>
      ))}
      {strips.map((strip, i) => (
        <Strip key={names[i]} {...{ strip, layout, ...shown }} spot={names[i] ?? ''} />
      ))}
    </Drawing>
  )
}

function Strip({
  strip,
  layout,
  rows,
  named,
  spot,
}: Shown & { strip: PlacedStrip; layout: StripsLayout; spot: string }) {
  const x = (px: number) => percent(px, layout.width)
  const { left, right } = layout.plot
  const pages = new Map(rows.map((row) => [row.slug, row.page]))
  const marks = [...strip.standing, ...strip.hanging].sort((one, two) => one.reserve - two.reserve)
  return (
    <g>
      {strip.heading.map((line) => (
        <text key={line.y} x={0} y={line.y} className={line.strong ? 'chart-strong chart-halo' : 'chart-halo'}>
          {line.text}
        </text>
      ))}
      <line x1={x(left)} x2={x(right)} y1={strip.axisY} y2={strip.axisY} className="chart-axis" />
      {strip.labels.map((label) => (
        <line
          key={label.slug}
          x1={x(label.at)}
          x2={x(label.at)}
          y1={label.y - 11}
          y2={strip.standing.find((mark) => mark.slug === label.slug)?.y ?? strip.axisY}
          className="chart-leader"
        />
      ))}
      {marks.map((mark) => {
        const page = pages.get(mark.slug)
        const isPaper = mark.slug === PAPER_SLUG
        const place = named.indexOf(mark.slug) + 1
        const size = isPaper ? PAPER : place > 0 ? STANDING : HANGING
        const value = mark.reserve > 0 ? formatTimes(mark.reserve) : 'cannot be read here'
        return (
          <Mark key={mark.slug} label={`${spot}. ${mark.name}: ${value}`}>
            <rect
              x={x(mark.x)}
              y={mark.y}
              {...size}
              transform={`translate(${-size.width / 2} 0)`}
              className={isPaper ? 'chart-paper' : place > 0 ? `chart-sheet chart-named-${place}` : 'chart-sheet'}
              style={page && !isPaper ? ({ '--page': labToHex(page) } as CSSProperties) : undefined}
            />
          </Mark>
        )
      })}
      {strip.labels.map((label) => (
        <text
          key={label.slug}
          x={x(label.at)}
          dx={label.x - label.at}
          y={label.y}
          className={label.slug === PAPER_SLUG ? 'chart-halo' : 'chart-strong chart-halo'}
        >
          {label.text}
        </text>
      ))}
      {strip.note && (
        <text x={x(strip.note.x)} y={strip.note.y} className="chart-halo">
          {strip.note.text}
        </text>
      )}
    </g>
  )
}

function StripsTable({
  spots,
  rows,
  paper,
}: {
  spots: readonly LightSpot[]
  rows: readonly LightRow[]
  paper: readonly number[] | null
}) {
  const all = paper ? [...rows, { slug: PAPER_SLUG, name: 'Control paper', reserves: paper }] : rows
  return (
    <Table
      caption="Contrast reserve: times the contrast your eyes need. 3 is enough for spot reading, 10 for fluent, 30 for easiest."
      rows={all}
      rowKey={(row) => row.slug}
      columns={[
        { key: 'name', head: 'Device', label: 'Device', heading: true, cell: (row) => row.name },
        ...spots.map((spot, i) => ({
          key: `${i}`,
          head: spot.name,
          label: spot.name,
          numeric: true,
          cell: (row: { reserves: readonly number[] }) => {
            const reserve = row.reserves[i] ?? 0
            return reserve > 0 ? formatNumber(reserve, 1) : 'cannot be read'
          },
        })),
      ]}
    />
  )
}
