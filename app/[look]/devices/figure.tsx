import type { Figure } from '@/lib/findings/published'
import { formatDoubt, formatNumber } from '@/lib/format/number'

/** A figure with its doubt on one line, "73.4 ± 0.8"; the coverage is said once a view, beside the figures. */
export function FigureText({
  figure,
  decimals,
  dagger = false,
}: {
  figure: Figure
  decimals: number
  dagger?: boolean
}) {
  return (
    <span className="whitespace-nowrap tabular-nums">
      {formatNumber(figure.value, decimals)}
      {dagger && <Dagger />} <span className="text-soft">{formatDoubt(figure.doubt, decimals)}</span>
    </span>
  )
}

/** The mark of whiteness and tint outside their formula's stated limits. */
export function Dagger() {
  return (
    <>
      <span aria-hidden="true">†</span>
      <span className="sr-only"> outside the formula’s limits</span>
    </>
  )
}

/** What is not known is said, never left empty. */
export function NotStated() {
  return <span className="text-soft italic">not stated</span>
}
