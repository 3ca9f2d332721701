'use client'

import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useCallback, useMemo, useTransition } from 'react'
import { LightControl } from '@/components/light-control'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { useLight } from '@/components/use-light'
import { formatLux, formatNumber } from '@/lib/format/number'
import { nearestLevel } from '@/lib/lamp/levels'
import { type LightChoice, lightHref, pairsOf } from '@/lib/light/choice'
import { quizWithLight } from '@/lib/light/into-quiz'
import { lampNamed } from '@/lib/light/lamps'
import { paperIn, rankInLight } from '@/lib/light/ranking'
import { canBeRead, orderInWords } from '@/lib/light/words'
import type { Edition } from '@/lib/method/types'
import { ChoicesForm } from './choices-form'
import { FiguresTable } from './figures-table'
import { Gallery } from './gallery'
import type { LitPage } from './lit-page'
import { UnderTheLamp } from './under-the-lamp'

/** As many as can be compared side by side. */
const COMPARED = 4

export type LitEdition = Pick<Edition, 'uncertainty' | 'control'> & { devices: readonly LitPage[] }

/**
 * The light, its control, and the pages in it. Ranked by the method's own code, on the server for the first picture and
 * in the browser from then on; the light is kept in the address. Lamp, front light, eyes and pages are asked of the
 * server by a form.
 * @param everyDevice all devices of the edition, for the form
 * @param perPage rows of a numbered page; null where all stand on one
 */
export function LightRoom({
  opening,
  edition,
  everyDevice,
  perPage,
}: {
  opening: LightChoice
  edition: LitEdition
  everyDevice: readonly { slug: string; name: string }[]
  perPage: number | null
}) {
  const hrefFor = useCallback((lux: number) => lightHref({ ...opening, lux }), [opening])
  const router = useRouter()
  const [leaving, startLeaving] = useTransition()
  const [lux, setLux] = useLight(opening.lux, hrefFor, leaving)
  const choice = useMemo(() => ({ ...opening, lux }), [opening, lux])
  const rows = useMemo(() => rankInLight(edition, choice), [edition, choice])
  const paper = paperIn(edition.control.paper, choice)
  const readable = rows.some(canBeRead)
  const kept = pairsOf(opening).filter(([name]) => name !== 'lux')
  const compared = rows.slice(0, COMPARED).map(({ device }) => device.slug)

  return (
    <>
      <section aria-labelledby="the-light" className="band bg-linear-to-b from-deepest to-deep">
        <div className="measure grid gap-x-12 gap-y-6 pt-10 pb-8 lg:grid-cols-[minmax(0,1fr)_18rem] lg:pt-0">
          <div className="grid content-end gap-6 lg:pt-12">
            <div className="max-w-[60ch]">
              <h1 id="the-light">In your light</h1>
              <p className="mt-4 text-lead text-soft">
                Set the light that falls on your page. Every page we measured is shown as it would look there, and
                stands in the order of the contrast it keeps.
              </p>
            </div>
            <LightControl action="/light" kept={kept} lux={lux} hrefFor={hrefFor} onChange={setLux}>
              <p role="status" className="text-brass-lit">
                {nearestLevel(lux).name}, about {formatLux(lux)} lux {lampNamed(choice.lamp).phrase}
                {choice.frontLight && ', front lights on'}.
              </p>
            </LightControl>
          </div>
          {rows[0] && <UnderTheLamp row={rows[0]} lux={lux} paper={edition.control.paper} paperGloom={paper.gloom} />}
        </div>
      </section>

      <div className="measure mt-8 grid gap-8">
        <ChoicesForm
          choice={choice}
          everyDevice={everyDevice}
          onShow={(href) => startLeaving(() => router.push(href, { scroll: false }))}
        />

        <section aria-labelledby="pages" className="grid gap-5">
          <div className="max-w-[70ch]">
            <h2 id="pages">The pages in this light</h2>
            <p className="mt-3">{orderInWords(rows, lux)}</p>
          </div>
          {!readable && (
            <Notice look="warning" className="max-w-[70ch]">
              {choice.frontLight
                ? 'With this little light, what these devices’ own lights add is not enough. Turn the light up.'
                : 'With this little light and no front light, nobody could read any of these pages. Turn the light up, or let the front lights be on.'}
            </Notice>
          )}
          <Gallery rows={rows} paper={edition.control.paper} paperGloom={paper.gloom} />
          <FiguresTable
            rows={rows}
            paper={paper}
            choice={choice}
            paging={
              perPage === null
                ? null
                : { page: opening.page, perPage, hrefFor: (page) => lightHref({ ...choice, page }) }
            }
          />
          <p className="flex flex-wrap items-center gap-x-6 gap-y-3">
            <ButtonLink prefetch={false} href={quizWithLight(choice)}>
              Take this light into the quiz
            </ButtonLink>
            {compared.length > 1 && (
              <Link prefetch={false} href={`/compare?with=${compared.join(',')}`}>
                Compare {rows.length > COMPARED ? `the first ${formatNumber(COMPARED)} of these` : 'these'}
              </Link>
            )}
          </p>
        </section>
      </div>
    </>
  )
}
