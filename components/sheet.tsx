import type { CSSProperties } from 'react'
import { labToHex } from '@/lib/colour/display'
import type { Lab } from '@/lib/method/types'
import { variants } from './ui/variants'

/** What the sheets say: long enough to fill one, and the same on all, so that only the page differs. */
const SAMPLE =
  'The rain had come in off the estuary before anyone thought to light the lamps, and so we read by the window until the letters ran together. By the time the kettle sang, we had read the same page twice.'

const leaf = variants('leaf block', {
  /** In a table's row, 40 by 50. */
  thumb: 'h-12.5 w-10 shrink-0 p-1.25 text-[5px]',
  /** Beside a figure, 64 by 84. */
  small: 'h-21 w-16 shrink-0 p-1.75 text-[7.5px]',
  /** Standing among others, 120 by 160. */
  stand: 'h-40 w-30 shrink-0 p-3 text-[11px]',
  /** The one looked at, as wide as its place and four to three in height. */
  page: 'aspect-3/4 w-full min-w-0 p-4 text-body',
})

/**
 * A device's page: its measured colour with text in its measured ink, approximate on a display. Decoration, its
 * words too (they come from the style sheet, so nobody reads, finds or copies them): say the figures beside it. On
 * paper it is drawn in outline, black on white.
 * @param className for size and place where none of the sizes fits
 */
export function Sheet({
  page,
  ink,
  size = 'stand',
  text = SAMPLE,
  className,
  style,
}: {
  page: Lab
  ink: Lab
  size?: Parameters<typeof leaf>[0]
  text?: string
  className?: string
  style?: CSSProperties
}) {
  const colours = { '--page': labToHex(page), '--page-ink': labToHex(ink) } as CSSProperties
  return (
    <span aria-hidden="true" data-sample={text} className={leaf(size, className)} style={{ ...colours, ...style }} />
  )
}
