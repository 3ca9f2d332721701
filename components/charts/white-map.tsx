import type { CSSProperties } from 'react'
import { labToHex } from '@/lib/colour/display'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import { Table } from '../ui/table'
import { percent } from './boxes'
import { ChartFrame, NARROW_FROM, WIDE_FROM } from './chart-frame'
import { Drawing } from './drawing'
import { layOutMap, type MapLayout, type MapPoint, PAPER_SLUG, POINT } from './map-layout'
import { Mark } from './mark'

/** A device's page with the standard uncertainty of its a* and b*. */
export type MapRow = { slug: string; name: string; page: Lab; u: { a: number; b: number } }

/** Coverage factor of the ellipses' half-axes; k = 2 as for every figure. */
const COVERAGE = 2
const TITLE = 'Where each page sits among the whites: b* against a*'
const PAPER_NAME = 'control paper'

/**
 * The white map: each page a small sheet at its a* and b*, in its own colour, in an ellipse of its uncertainty at
 * k = 2; the control paper among them. Equal scale both ways, so that a distance means the same in every direction.
 */
export function WhiteMap({
  rows,
  paper,
  highlight,
}: {
  rows: readonly MapRow[]
  paper: Lab | null
  highlight?: string
}) {
  if (rows.length === 0) return <p className="text-soft">No page has been measured yet.</p>
  const points: MapPoint[] = rows.map(({ slug, name, page, u }) => ({
    slug,
    name,
    a: page.a,
    b: page.b,
    ra: COVERAGE * u.a,
    rb: COVERAGE * u.b,
  }))
  if (paper) points.push({ slug: PAPER_SLUG, name: PAPER_NAME, a: paper.a, b: paper.b, ra: 0, rb: 0 })
  const wide = layOutMap({ width: WIDE_FROM, points, first: highlight, namesUpTo: Infinity })
  const narrow = layOutMap({ width: NARROW_FROM, points, first: highlight, namesUpTo: 5 })
  return (
    <ChartFrame
      wide={
        <>
          <Pages layout={wide} rows={rows} highlight={highlight} />
          <Key layout={wide} />
        </>
      }
      narrow={
        <>
          <Pages layout={narrow} rows={rows} highlight={highlight} />
          <Key layout={narrow} />
        </>
      }
      hint="Each small sheet is a page, the ellipse its doubt at about 95 %. Point at one to read it; on a keyboard, Tab to the chart and walk with the arrow keys."
      table={<MapTable rows={rows} paper={paper} />}
    />
  )
}

function Pages({ layout, rows, highlight }: { layout: MapLayout; rows: readonly MapRow[]; highlight?: string }) {
  const { width, height, plot, gridA, gridB, points } = layout
  const x = (px: number) => percent(px, width)
  const y = (px: number) => percent(px, height)
  const measured = new Map(rows.map((row) => [row.slug, row]))
  const desc = `${rows.length} pages: further right is redder, further left greener; higher is yellower, lower bluer; a neutral white lies where the two lines cross.`
  return (
    <Drawing title={TITLE} desc={desc} ratio={width / height} className="mb-11">
      {gridA.map(({ at, x: px }) => (
        <g key={at}>
          <line
            x1={x(px)}
            x2={x(px)}
            y1={y(plot.y)}
            y2={y(plot.y + plot.height)}
            className={at === 0 ? 'chart-axis' : 'chart-grid'}
          />
          <text x={x(px)} y={y(plot.y + plot.height)} dy={17} textAnchor="middle">
            {formatNumber(at)}
          </text>
        </g>
      ))}
      {gridB.map(({ at, y: py }) => (
        <g key={at}>
          <line
            x1={x(plot.x)}
            x2={x(plot.x + plot.width)}
            y1={y(py)}
            y2={y(py)}
            className={at === 0 ? 'chart-axis' : 'chart-grid'}
          />
          <text x={x(plot.x)} dx={-6} y={y(py)} dy={5} textAnchor="end">
            {formatNumber(at)}
          </text>
        </g>
      ))}
      <text x={0} y={14}>
        b*, bluer to yellower
      </text>
      <text x={x(plot.x + plot.width)} y={y(plot.y + plot.height)} dy={37} textAnchor="end">
        a*, greener to redder
      </text>
      {points.map((point) => (
        <ellipse
          key={point.slug}
          cx={x(point.x)}
          cy={y(point.y)}
          rx={x(point.rx)}
          ry={y(point.ry)}
          className={point.slug === highlight ? 'chart-doubt chart-doubt-first' : 'chart-doubt'}
        />
      ))}
      {points.map((point) => (
        <svg key={point.slug} x={x(point.x)} y={y(point.y)} role="presentation">
          {point.leader && <line x2={point.label.dx + 4} y2={point.label.dy - 5} className="chart-leader" />}
        </svg>
      ))}
      {points.map((point) => (
        <svg key={point.slug} x={x(point.x)} y={y(point.y)} role="presentation">
          <PageMark row={measured.get(point.slug)} isFirst={point.slug === highlight} />
        </svg>
      ))}
      {points.map((point) => (
        <svg key={point.slug} x={x(point.x)} y={y(point.y)} role="presentation">
          <text
            x={point.label.dx}
            y={point.label.dy}
            className={point.slug === highlight ? 'chart-strong chart-halo' : 'chart-halo'}
          >
            {point.label.text}
          </text>
        </svg>
      ))}
    </Drawing>
  )
}

/** A page on the map, or the control paper where there is no device. */
function PageMark({ row, isFirst }: { row: MapRow | undefined; isFirst: boolean }) {
  return (
    <Mark label={row ? wordsFor(row) : PAPER_NAME}>
      <rect
        {...POINT}
        x={-POINT.width / 2}
        y={-POINT.height / 2}
        className={!row ? 'chart-paper' : isFirst ? 'chart-sheet chart-named-1' : 'chart-sheet'}
        style={row ? ({ '--page': labToHex(row.page) } as CSSProperties) : undefined}
      />
    </Mark>
  )
}

function wordsFor({ name, page, u }: MapRow): string {
  return `${name}: a* ${formatNumber(page.a, 1)} ${formatDoubt(COVERAGE * u.a, 1)}, b* ${formatNumber(page.b, 1)} ${formatDoubt(COVERAGE * u.b, 1)}`
}

/** What the numbers on the map stand for. */
function Key({ layout }: { layout: MapLayout }) {
  const numbered = layout.points.filter((point) => point.numbered)
  if (numbered.length === 0) return null
  return (
    <ol className="mt-2 columns-[12rem] gap-x-6 text-note text-soft">
      {numbered.map((point) => (
        <li key={point.slug} className="break-inside-avoid">
          <span className="inline-block w-6 font-semibold text-ink">{point.label.text}</span>
          {point.name}
        </li>
      ))}
    </ol>
  )
}

function MapTable({ rows, paper }: { rows: readonly MapRow[]; paper: Lab | null }) {
  const all = [
    ...rows.map(({ slug, name, page, u }) => ({ slug, name, page, u: u as { a: number; b: number } | null })),
    ...(paper ? [{ slug: PAPER_SLUG, name: 'Control paper', page: paper, u: null }] : []),
  ]
  const figure = (value: number, u: number | undefined) =>
    u === undefined ? formatNumber(value, 1) : `${formatNumber(value, 1)} ${formatDoubt(COVERAGE * u, 1)}`
  return (
    <Table
      caption="a* (− greener, + redder) and b* (− bluer, + yellower) of each page, ± at about 95 % (k = 2), the device’s own part"
      rows={all}
      rowKey={(row) => row.slug}
      columns={[
        { key: 'name', head: 'Page', label: 'Page', heading: true, cell: (row) => row.name },
        { key: 'a', head: 'a*', label: 'a*', numeric: true, cell: (row) => figure(row.page.a, row.u?.a) },
        { key: 'b', head: 'b*', label: 'b*', numeric: true, cell: (row) => figure(row.page.b, row.u?.b) },
      ]}
    />
  )
}
