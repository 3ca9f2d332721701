import Link from 'next/link'
import type { ReactNode } from 'react'
import { formatMoney } from '@/lib/format/money'
import { formatDoubt, formatNumber, formatRange, formatShare, roundToTotal } from '@/lib/format/number'
import { AIMS, type Aim, type EditionDevice, type RankedDevice } from '@/lib/method/types'
import { AIM_BARS, AIM_NAMES } from './aims'
import { onPage, sectionsOf } from './points-sections'
import { Sheet } from './sheet'
import { Pager, type Paging } from './ui/pager'
import { CELL, COLUMN_HEAD, GROUP_HEAD, ROW, ROW_GROUP, ROW_HEAD, TABLE } from './ui/table-roles'

/** Expanded uncertainties (k = 2) of a device's figures, as the edition's doubts give them. */
export type FigureDoubts = { L: number; whiteness: number; chroma: number }

/**
 * Where each fit comes from: the points of the four aims, which add up to it, then the doubt and the figures. Groups
 * too close to call are rows of the table.
 * @param groups ranked devices in groups, from `groupTies`
 * @param weights final weights, summing to 1
 * @param doubts by slug; without them the heads carry no ±
 * @param paging shows one numbered page of the rows
 */
export function PointsTable({
  groups,
  devices,
  weights,
  doubts,
  paging,
  hrefFor = (slug) => `/devices/${slug}`,
  caption = 'Points of each device by aim, its fit with the doubt, and its figures',
}: {
  groups: readonly (readonly RankedDevice[])[]
  devices: Readonly<Record<string, EditionDevice>>
  weights: Record<Aim, number>
  doubts?: Readonly<Record<string, FigureDoubts>>
  paging?: Paging
  hrefFor?: (slug: string) => string
  caption?: string
}) {
  const total = groups.reduce((sum, group) => sum + group.length, 0)
  const sections = onPage(sectionsOf(groups), paging)
  const mostPoints = roundToTotal(AIMS.map((aim) => 100 * weights[aim]))
  const widest = Math.max(...AIMS.map((aim) => weights[aim]), 1e-9)
  return (
    <div>
      <div className="points card @container">
        <table {...TABLE}>
          <caption className="sr-only">{caption}</caption>
          <thead {...ROW_GROUP}>
            <tr {...ROW}>
              <Head wide>Device</Head>
              {AIMS.map((aim, i) => (
                <Head key={aim} below={`of ${mostPoints[i]}`} className="points-aim">
                  {AIM_NAMES[aim]}
                </Head>
              ))}
              <Head numeric>Fit</Head>
              <Head numeric>First in</Head>
              <Head numeric below="95 %">
                Rank
              </Head>
              <Head numeric below={spread(doubts, 'L', 1)}>
                L*
              </Head>
              <Head numeric below={spread(doubts, 'whiteness', 0)}>
                W<sub>10</sub>
              </Head>
              <Head numeric below={spread(doubts, 'chroma', 1)}>
                C*
              </Head>
              <Head numeric>Price</Head>
            </tr>
          </thead>
          {sections.map((section) => (
            <tbody key={section.title + section.rows[0]?.slug} {...ROW_GROUP}>
              <tr {...ROW} className="points-group">
                <th {...GROUP_HEAD} colSpan={12}>
                  {section.title}
                </th>
              </tr>
              {section.rows.map((row) => {
                const device = devices[row.slug]
                return device && <Row key={row.slug} {...{ row, device, widest, weights, href: hrefFor(row.slug) }} />
              })}
            </tbody>
          ))}
        </table>
      </div>
      {paging && <Pager paging={paging} total={total} what="Devices" />}
    </div>
  )
}

function Head({
  children,
  below,
  numeric = false,
  wide = false,
  className = '',
}: {
  children: ReactNode
  below?: string
  numeric?: boolean
  wide?: boolean
  className?: string
}) {
  return (
    <th
      {...COLUMN_HEAD}
      className={`${numeric ? 'text-right' : 'text-left'} ${className}`}
      data-wide={wide || undefined}
    >
      {children}
      {below && <span className="block font-normal whitespace-nowrap">{below}</span>}
    </th>
  )
}

function Row({
  row,
  device,
  weights,
  widest,
  href,
}: {
  row: RankedDevice
  device: EditionDevice
  weights: Record<Aim, number>
  widest: number
  href: string
}) {
  const points = roundToTotal(AIMS.map((aim) => row.contributions[aim]))
  return (
    <tr {...ROW}>
      <th {...ROW_HEAD}>
        <span className="flex items-center gap-3.5">
          <Sheet page={device.page} ink={device.ink} size="thumb" />
          <span>
            <Link href={href} className="font-semibold text-ink">
              {device.name}
            </Link>
            {device.provisional && <span className="block text-note font-normal text-soft">provisional, one unit</span>}
          </span>
        </span>
      </th>
      {AIMS.map((aim, i) => (
        <td key={aim} {...CELL} data-label={AIM_NAMES[aim]} className="points-aim">
          <span className="points-cell">
            <span aria-hidden="true" className="points-track" style={{ width: `${(100 * weights[aim]) / widest}%` }}>
              <span
                className={AIM_BARS[aim]}
                style={{ width: `${weights[aim] > 0 ? Math.min(100, row.contributions[aim] / weights[aim]) : 0}%` }}
              />
            </span>
            <span className="text-right">{points[i]}</span>
          </span>
        </td>
      ))}
      <td {...CELL} data-label="Fit" className="points-fit">
        <span className="whitespace-nowrap">
          <span className="text-lead">{formatNumber(row.fit)}</span>{' '}
          <span className="text-note text-soft">{formatDoubt(2 * row.sd)}</span>
        </span>
      </td>
      <td {...CELL} data-label="First in">
        {formatShare(row.first)}
      </td>
      <td {...CELL} data-label="Rank, 95 %">
        {formatRange(...row.rank95)}
      </td>
      <td {...CELL} data-label="Lightness L*">
        {formatNumber(device.page.L, 1)}
      </td>
      <td {...CELL} data-label="Whiteness W10">
        {formatNumber(device.whiteness)}
        {!device.withinLimits && '†'}
      </td>
      <td {...CELL} data-label="Chroma C*">
        {formatNumber(Math.hypot(device.page.a, device.page.b), 1)}
      </td>
      <td {...CELL} data-label="Price">
        {device.price ? formatMoney(device.price) : <span className="text-note text-soft">not stated</span>}
      </td>
    </tr>
  )
}

/** The doubts of a column in its head: one where they agree as printed, else from the least to the most. */
function spread(
  doubts: Readonly<Record<string, FigureDoubts>> | undefined,
  figure: keyof FigureDoubts,
  decimals: number,
) {
  const all = Object.values(doubts ?? {}).map((doubt) => doubt[figure])
  if (all.length === 0) return undefined
  const [least, most] = [Math.min(...all), Math.max(...all)]
  const low = formatDoubt(least, decimals)
  return low === formatDoubt(most, decimals) ? low : `±\u202f${formatRange(least, most, decimals)}`
}
