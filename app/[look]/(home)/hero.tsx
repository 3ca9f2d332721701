import type { ReactNode } from 'react'
import { ButtonLink } from '@/components/ui/button'
import { formatDay } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'
import type { Edition } from '@/lib/method/types'

/** The dark band: what the site is for, the one thing to do, and the lamp with the pages under it. */
export function Hero({ edition, children }: { edition: Edition | null; children: ReactNode }) {
  return (
    <section className="band bg-linear-to-b from-deepest to-deep" aria-labelledby="promise">
      <div className="measure grid gap-x-10 gap-y-10 pt-10 pb-8 lg:grid-cols-[26rem_minmax(0,1fr)] lg:pt-0">
        <div className="lg:pt-24">
          <h1 id="promise" className="text-display sm:text-hero">
            Find the page that suits your light
          </h1>
          <p className="mt-6 max-w-[40ch] text-lead text-soft">
            We measure how light, how white and how tinted each reading device’s page is. Tell us where and what you
            read, and see which ones hold up there.
          </p>
          <ButtonLink href="/quiz" look="lamp" className="mt-7 text-lead">
            Take the quiz, five steps
          </ButtonLink>
          <p className="mt-5 text-small text-soft">
            {edition && (
              <>
                {formatNumber(edition.devices.length)} devices on the bench · Edition {edition.number},{' '}
                <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time> ·{' '}
              </>
            )}
            no sponsors
          </p>
        </div>
        {children}
      </div>
    </section>
  )
}
