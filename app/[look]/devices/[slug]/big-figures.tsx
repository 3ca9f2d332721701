import Link from 'next/link'
import type { ReactNode } from 'react'
import type { Figure, PublishedFigures } from '@/lib/findings/published'
import type { Standing } from '@/lib/findings/standing'
import { formatDoubt, formatNumber, formatOrdinal, formatRange } from '@/lib/format/number'
import { Dagger, DECIMALS } from '../figure'

/** The four figures a reader comes for, each with its doubt and a plain word on what it means. */
export function BigFigures({ figures, standing }: { figures: PublishedFigures; standing: Standing }) {
  const outside = !figures.withinLimits
  return (
    <section aria-label="Figures of the page" className="border-y border-rule border-t-2 border-t-ink py-5">
      <dl className="grid grid-cols-2 gap-x-6 gap-y-6 md:grid-cols-4">
        <Big id="lightness" name="Lightness L*" figure={figures.lightness} decimals={DECIMALS.lightness}>
          {inOrder(standing)}
        </Big>
        <Big
          id="whiteness"
          name={
            <>
              Whiteness W<sub>10</sub>
            </>
          }
          figure={figures.whiteness}
          decimals={DECIMALS.whiteness}
          outside={outside}
        >
          {outside && '† outside the formula’s limits'}
        </Big>
        <Big
          id="tint"
          name={
            <>
              Tint T<sub>10</sub>
            </>
          }
          figure={figures.tint}
          decimals={DECIMALS.tint}
          outside={outside}
        >
          {tintInWords(figures.tint)}
        </Big>
        <Big id="contrast" name="Contrast, to 1" figure={figures.contrast} decimals={DECIMALS.contrast}>
          page Y {formatNumber(figures.yPage.value, DECIMALS.y)}, ink Y {formatNumber(figures.yInk.value, DECIMALS.y)}
        </Big>
      </dl>
      <p className="mt-4 text-note text-soft">
        ± at about 95 %. Geometry d/8°, specular included, D65, 10° observer, front light off.
      </p>
    </section>
  )
}

function Big({
  id,
  name,
  figure,
  decimals,
  outside = false,
  children,
}: {
  id: string
  name: ReactNode
  figure: Figure
  decimals: number
  outside?: boolean
  children: ReactNode
}) {
  return (
    <div>
      <dt className="text-note text-soft">
        <Link href={`/method#q-${id}`} className="text-soft">
          {name}
        </Link>
      </dt>
      <dd>
        <span className="text-h2 leading-tight tabular-nums">
          {formatNumber(figure.value, decimals)}
          {outside && <Dagger />}
        </span>{' '}
        <span className="whitespace-nowrap text-small text-soft tabular-nums">
          {formatDoubt(figure.doubt, decimals)}
        </span>
        <span className="block text-note text-soft">{children}</span>
      </dd>
    </div>
  )
}

/** "3rd of 16, rank 2–5": the place by lightness and the band the doubt allows. */
function inOrder({ place, best, worst, of }: Standing): string {
  return `${formatOrdinal(place)} of ${formatNumber(of)}, rank ${formatRange(best, worst)}`
}

/** CIE 15: positive tint is greenish, negative reddish; within its doubt it has no clear side. */
function tintInWords({ value, doubt }: Figure): string {
  if (Math.abs(value) <= doubt) return 'no clear tint'
  return value > 0 ? 'on the green side' : 'on the red side'
}
