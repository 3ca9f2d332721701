import Link from 'next/link'
import type { ReactNode } from 'react'
import { DECIMALS } from '@/lib/findings/decimals'
import type { Figure, PublishedFigures } from '@/lib/findings/published'
import type { Standing } from '@/lib/findings/standing'
import { formatDoubt, formatNumber, formatOrdinal } from '@/lib/format/number'
import { Dagger } from '../figure'

/** The four figures a reader comes for, each with its doubt and a plain word on what it means. */
export function BigFigures({ figures, standing }: { figures: PublishedFigures; standing: Standing }) {
  const outside = !figures.withinLimits
  return (
    <section aria-label="Figures of the page" className="border-y border-rule border-t-2 border-t-ink py-5">
      <dl className="device-figures grid grid-cols-2 gap-x-6 gap-y-6 md:grid-cols-4">
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
        <Link href={`/method#q-${id}`} prefetch={false} className="inline-block py-2.5 text-soft md:py-0.5">
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

/**
 * The place by lightness as a band, since that is all the doubt allows: "3rd to 6th of 16". A single place is said only
 * where the pages before and after differ by more than the doubt.
 */
export function inOrder({ best, worst, of }: Standing): string {
  if (of === 1) return 'the only one measured'
  if (best === worst) return `${formatOrdinal(best)} of ${formatNumber(of)} by lightness, clear of the others`
  return `${formatOrdinal(best)} to ${formatOrdinal(worst)} of ${formatNumber(of)} by lightness, too close to call`
}

/** CIE 15: positive tint is greenish, negative reddish; within its doubt it has no clear side. */
function tintInWords({ value, doubt }: Figure): string {
  if (Math.abs(value) <= doubt) return 'no clear tint'
  return value > 0 ? 'on the green side' : 'on the red side'
}
