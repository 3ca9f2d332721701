import type { CSSProperties } from 'react'
import { labToHex } from '@/lib/colour/display'
import { formatNumber } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import { Sheet } from './sheet'

export type BoothSheet = { name: string; page: Lab; ink: Lab }

/** The figures of a page in words: L* 73.4, a* −1.7, b* 0.9. */
export function labInWords({ L, a, b }: Lab): string {
  return `L* ${formatNumber(L, 1)}, a* ${formatNumber(a, 1)}, b* ${formatNumber(b, 1)}`
}

/**
 * Pages side by side on a neutral grey, each touching a strip of the control paper, so that neither the site's colours
 * nor the reader's display flatters one. Captions stand outside, since no text is legible on that grey.
 */
export function Booth({
  sheets,
  paper,
  paperName = 'Control paper',
  className = '',
}: {
  sheets: readonly BoothSheet[]
  paper: Lab | null
  paperName?: string
  className?: string
}) {
  return (
    <figure className={`min-w-0 ${className}`}>
      <div className="flex justify-center rounded-card border-(length:--sheet-edge) border-ink bg-booth px-5 py-6 sm:px-7 sm:py-8">
        {sheets.map((sheet) => (
          <div key={sheet.name} className="flex min-w-0 flex-1">
            <Sheet page={sheet.page} ink={sheet.ink} size="page" className="h-full flex-1" />
            {paper && <PaperStrip colour={paper} />}
          </div>
        ))}
      </div>
      <figcaption className="mt-3 grid gap-1 text-note text-soft">
        {sheets.map((sheet) => (
          <span key={sheet.name}>
            {sheet.name}: {labInWords(sheet.page)}
          </span>
        ))}
        {paper && (
          <span>
            {paperName}, the strip beside {sheets.length > 1 ? 'each' : 'it'}: {labInWords(paper)}
          </span>
        )}
        <span>
          Colours are approximate on your display. The surround is a neutral grey, so that no page is flattered.
        </span>
      </figcaption>
    </figure>
  )
}

/** The control paper, touching the page before it. */
function PaperStrip({ colour }: { colour: Lab }) {
  const style = { '--page': labToHex(colour), '--page-ink': '#000' } as CSSProperties
  return (
    <span aria-hidden="true" className="leaf -ml-(--sheet-edge) block w-1/5 max-w-16 min-w-6 shrink-0" style={style} />
  )
}
