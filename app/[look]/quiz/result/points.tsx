import Link from 'next/link'
import { type FigureDoubts, PointsTable } from '@/components/points-table'
import { Disclosure } from '@/components/ui/disclosure'
import { formatNumber, formatShare } from '@/lib/format/number'
import { derivedUncertainty, expandedFigure } from '@/lib/method/figure-doubts'
import type { EditionDevice, RankedDevice } from '@/lib/method/types'
import { resultHref } from '@/lib/quiz/moves'
import type { Result } from '@/lib/quiz/result'
import { canonicalTexts } from '@/lib/quiz/write-address'
import { WeightsForm } from './weights-form'

/** Where the points come from, in groups too close to call, and the weights to move by hand. */
export function Points({
  result,
  groups,
  paging,
}: {
  result: Result
  groups: readonly (readonly RankedDevice[])[]
  paging: { page: number; perPage: number } | null
}) {
  const { address, edition, match } = result
  const devices = Object.fromEntries(edition.devices.map((device) => [device.slug, device]))
  const ranked = new Set(groups.flat().map(({ slug }) => slug))
  const doubts = Object.fromEntries(
    edition.devices.filter(({ slug }) => ranked.has(slug)).map((device) => [device.slug, doubtsOf(edition, device)]),
  )
  const lost = lossWords(match.ranked)
  const own = resultHref(address)
  const onPage = (page: number | 'all') => `${own}${own.includes('?') ? '&' : '?'}page=${page}#points`
  const pages = paging ? Math.max(1, Math.ceil(ranked.size / paging.perPage)) : 1
  return (
    <section aria-labelledby="points" className="result-points">
      <h2 id="points">Where the points come from</h2>
      <div className="mt-4 print:mt-1">
        <PointsTable
          groups={groups}
          devices={devices}
          weights={match.weights}
          doubts={doubts}
          paging={paging ? { perPage: paging.perPage, page: Math.min(paging.page, pages), hrefFor: onPage } : undefined}
        />
      </div>
      {lost && (
        <p className="mt-3 max-w-[80ch]">
          A device loses the share of its points that your unreadable hours are of all hours: {lost}. The columns show
          what is left.
        </p>
      )}
      {paging && pages > 1 && (
        <p className="hidden print:mt-1 print:block">
          Page {formatNumber(Math.min(paging.page, pages))} of {formatNumber(pages)} of {formatNumber(ranked.size)}{' '}
          devices; add page=all to the address for all of them.
        </p>
      )}
      {paging && (
        <p className="mt-2 print:hidden">
          <Link href={onPage('all')} prefetch={false}>
            All {formatNumber(ranked.size)} on one page
          </Link>
        </p>
      )}
      <p className="mt-3 max-w-[80ch] text-note text-soft print:mt-1">
        ± is the doubt at about 95 %. † Whiteness of an electronic-paper page lies outside the limits of the CIE formula
        and is good for comparison only. <Link href="/method#q-whiteness">Why we still show it</Link>
      </p>
      <Disclosure
        summary="Move the weights yourself"
        open={address.answers.weights !== undefined}
        className="mt-2 print:hidden"
      >
        <WeightsForm
          weights={address.answers.weights ?? match.weights}
          others={[...canonicalTexts(address)].filter(([name]) => !name.startsWith('weight.'))}
          byHand={address.answers.weights !== undefined}
        />
      </Disclosure>
    </section>
  )
}

/** How much of the points unreadable hours take, in words; null where they take nothing from anybody. */
function lossWords(ranked: readonly RankedDevice[]): string | null {
  const losses = ranked.map(({ unreadable }) => unreadable).filter((share) => share < 1)
  const [least, most] = [Math.min(...losses), Math.max(...losses)]
  if (!(most > 0)) return null
  return least === most || formatShare(least) === formatShare(most)
    ? `here ${formatShare(most)} for each of them`
    : `here ${formatShare(least)} to ${formatShare(most)}`
}

function doubtsOf({ uncertainty }: Result['edition'], device: EditionDevice): FigureDoubts {
  const { whiteness, chroma } = derivedUncertainty(device, uncertainty)
  const L = expandedFigure(device.page.u.L, uncertainty.session.L, device.sessions, uncertainty.common.L)
  return { L, whiteness, chroma }
}
