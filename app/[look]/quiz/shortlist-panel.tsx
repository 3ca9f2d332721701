'use client'

import Link from 'next/link'
import { Shortlist } from '@/components/shortlist'
import { Button, ButtonLink } from '@/components/ui/button'
import { formatList } from '@/lib/format/list'
import { groupTies } from '@/lib/method/groups'
import type { Address } from '@/lib/quiz/address'
import { GO, resultHref } from '@/lib/quiz/moves'
import type { ShortlistView } from '@/lib/quiz/shortlist'
import type { DrawsAnswer } from './draws.worker'

/**
 * The order so far on a dark band, with doubts once the draws are done, what fell out and why, and what is assumed.
 * @param stale the edition could not be fetched, so the order no longer follows the answers
 */
export function ShortlistPanel({
  view,
  draws,
  address,
  stale,
}: {
  view: ShortlistView
  draws: DrawsAnswer | null
  address: Address
  stale: boolean
}) {
  const { rows, unreadable, excluded, assumptions } = view
  const level = draws ? (groupTies(draws)[0] ?? []).map(({ slug }) => slug) : []
  const doubts = new Map(draws?.map(({ slug, sd }) => [slug, sd]))
  const leftOut = [...excluded, ...unreadable.map((device) => ({ ...device, why: 'cannot be read in your light' }))]
  return (
    <aside aria-labelledby="shortlist" className="band px-[clamp(1rem,4vw,1.75rem)] py-9 lg:px-8.5">
      <div className="lg:sticky lg:top-6 lg:max-w-83 paper:static">
        <h2 id="shortlist" tabIndex={-1} className="text-h3 sm:text-[1.375rem]">
          Your shortlist so far
        </h2>
        <p className="mt-2 text-note text-soft">
          In order of fit, 0 to 100, with your answers so far.{' '}
          <span className="noscript:hidden">
            {draws ? 'The pale end of each bar is the doubt, at about 95 %.' : ''}
          </span>
          <span className="hidden noscript:inline">The result adds the doubts and says what is too close to call.</span>
        </p>
        {stale && (
          <p className="mt-3 text-note">
            The figures could not be fetched, so this list does not follow your answers just now. Your result will.
          </p>
        )}
        <div className="mt-6">
          {rows.length > 0 || unreadable.length === 0 ? (
            <Shortlist
              rows={rows.map((row) => ({
                ...row,
                sd: doubts.get(row.slug) ?? null,
                tied: level.length > 1 && level.includes(row.slug),
              }))}
              excluded={leftOut}
            />
          ) : (
            <p>
              None of these pages can be read in the light you describe. Allow the front light in a dark place, or add a
              brighter one.
            </p>
          )}
        </div>
        <Assumed assumptions={assumptions} />
        <div className="mt-6 flex flex-wrap items-center gap-3">
          <span className="hidden noscript:inline">
            <Button form="quiz" type="submit" name="go" value={GO.here} look="quiet">
              Update this list
            </Button>
          </span>
          <ButtonLink href={resultHref(address)} look="quiet" prefetch={false} className="noscript:hidden">
            Go to the result
          </ButtonLink>
        </div>
      </div>
    </aside>
  )
}

function Assumed({ assumptions: { open, unsure, words } }: { assumptions: ShortlistView['assumptions'] }) {
  if (words === '') return null
  return (
    <div className="mt-5 grid gap-1 border-t border-rule pt-4 text-note text-soft">
      {open.length > 0 && (
        <p>
          Not answered yet: <b className="text-ink">{formatList(open)}</b>.
        </p>
      )}
      {unsure.length > 0 && (
        <p>
          Not sure about: <b className="text-ink">{formatList(unsure)}</b>.
        </p>
      )}
      <p>
        {open.length > 0 ? 'Until then we' : 'We'} assume {words}.{' '}
        <Link prefetch={false} href="/method#spots">
          Why these
        </Link>
      </p>
    </div>
  )
}
