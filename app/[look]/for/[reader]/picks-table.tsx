import Link from 'next/link'
import { type FigureDoubts, PointsTable } from '@/components/points-table'
import { publishedFigures } from '@/lib/findings/published'
import { formatList } from '@/lib/format/list'
import { formatNumber } from '@/lib/format/number'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { notStatedByField } from '@/lib/quiz/not-stated'
import { deviceOf, type Result } from '@/lib/quiz/result'
import type { Picks } from '@/lib/readers/picks'
import { type Reader, wholeResultHref } from '@/lib/readers/reader'

/** Where the points of the leading groups come from. */
export function PicksTable({ reader, result, picks }: { reader: Reader; result: Result; picks: Picks }) {
  const { edition, match } = result
  const shown = picks.shown.flat().map(({ slug }) => deviceOf(result, slug))
  const rest = picks.readable.length - shown.length
  const notStated = notStatedByField(picks.shown.flat())
  return (
    <section aria-labelledby="points">
      <h2 id="points">Where the points come from</h2>
      <div className="mt-4">
        <PointsTable
          groups={picks.shown}
          devices={Object.fromEntries(shown.map((device) => [device.slug, device]))}
          weights={match.weights}
          doubts={Object.fromEntries(shown.map((device) => [device.slug, doubtsOf(edition, device)]))}
        />
      </div>
      {rest > 0 && (
        <p className="mt-3">
          {rest === 1 ? 'One more device fits' : `${formatNumber(rest)} more devices fit`} less well.{' '}
          <Link href={wholeResultHref(reader)} prefetch={false}>
            All {formatNumber(picks.readable.length)}, and weights to move
          </Link>
        </p>
      )}
      {notStated.length > 0 && (
        <ul className="mt-3 grid max-w-[80ch] gap-1">
          {notStated.map(({ field, name, effect, slugs }) => (
            <li key={field}>
              {name} of {formatList(slugs.map((slug) => deviceOf(result, slug).name))} is not stated: {effect}.
            </li>
          ))}
        </ul>
      )}
      <p className="mt-3 max-w-[80ch] text-note text-soft">
        ± is the doubt at about 95 %. † Whiteness of an electronic-paper page lies outside the limits of the CIE formula
        and is good for comparison only.{' '}
        <Link href="/method#q-whiteness" prefetch={false}>
          Why we still show it
        </Link>
      </p>
    </section>
  )
}

function doubtsOf(edition: Edition, device: EditionDevice): FigureDoubts {
  const { lightness, whiteness, chroma } = publishedFigures(edition, device)
  return { L: lightness.doubt, whiteness: whiteness.doubt, chroma: chroma.doubt }
}
