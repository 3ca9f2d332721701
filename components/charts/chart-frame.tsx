import type { ReactNode } from 'react'
import { Disclosure } from '../ui/disclosure'
import { MarkReader } from './mark-reader'

/** Least width of a wide drawing, px; the class below says the same in rem. */
export const WIDE_FROM = 600
/** Least width of a narrow one: a phone of 320 px less its margins. */
export const NARROW_FROM = 272

/**
 * A chart with what belongs to each: two drawings of which the container's width shows one, a line that says the value
 * of the mark in hand, a key if it has one, and the same figures in a table.
 */
export function ChartFrame({
  wide,
  narrow,
  legend,
  hint = 'Point at a mark to read it; on a keyboard, Tab to the chart and walk with the arrow keys.',
  table,
}: {
  wide: ReactNode
  narrow: ReactNode
  legend?: ReactNode
  hint?: string
  table: ReactNode
}) {
  return (
    <div className="chart @container">
      <MarkReader hint={hint}>
        <div className="hidden @min-[37.5rem]:block">{wide}</div>
        <div className="@min-[37.5rem]:hidden">{narrow}</div>
      </MarkReader>
      {legend}
      <Disclosure summary="The same figures as a table" className="mt-1 text-small print:hidden">
        {table}
      </Disclosure>
    </div>
  )
}
