import Link from 'next/link'
import { formatDay } from '@/lib/format/date'
import { formatDoubt, formatNumber, formatRange, formatShare } from '@/lib/format/number'
import { MARGIN_WORDS, marginOf, rivalsSentence } from '@/lib/quiz/lead'
import { leadSentence, reasonsFor, sentenceOf } from '@/lib/quiz/reasons'
import { deviceOf, type Result, spotsOf } from '@/lib/quiz/result'
import { type Picks, tieWords } from '@/lib/readers/picks'

/** What comes first for these answers and how surely, why, what speaks against it, and who else could be first. */
export function Pick({ result, picks }: { result: Result; picks: Picks }) {
  const { match, edition, answers } = result
  const { readable } = picks
  const [first] = readable
  if (!first) return null
  const device = deviceOf(result, first.slug)
  const nameOf = (slug: string) => deviceOf(result, slug).name
  const left = match.ranked.map(({ slug }) => deviceOf(result, slug))
  // The reasons speak of the reader's eyes and lamp, as they would to the reader.
  const { pro, contra } = reasonsFor(device, match.weights, { edition, answers, spots: spotsOf(result), left })
  const margin = MARGIN_WORDS[marginOf(readable)]
  const rivals = rivalsSentence(readable, nameOf)
  const lead = leadSentence(readable, nameOf)
  return (
    <section aria-labelledby="pick" className="min-w-0">
      <p className="text-brass">{tieWords(picks)}</p>
      <h2 id="pick" className="mt-1">
        <Link href={`/devices/${device.slug}`} prefetch={false} className="text-ink">
          {device.name}
        </Link>
        {margin && `, ${margin}`}
      </h2>
      <p className="mt-4 max-w-[58ch] text-lead">{sentenceOf(pro)}</p>
      {contra.length > 0 && <p className="mt-3 max-w-[58ch]">Against it: {sentenceOf(contra)}</p>}
      {lead && <p className="mt-3 max-w-[58ch]">{lead}</p>}
      {rivals && <p className="mt-4 max-w-[58ch] border-l-3 border-brass pl-4">{rivals}</p>}
      {device.onSale === false && (
        <p className="mt-3 max-w-[58ch]">It is no longer sold: one would have to find it second hand.</p>
      )}
      {device.provisional && (
        <p className="mt-3 max-w-[58ch] text-soft">
          Provisional: its figures rest on a single unit, so its doubt is larger.
        </p>
      )}
      <p className="mt-4 max-w-[58ch] text-small text-soft">
        Fit {formatNumber(first.fit)} {formatDoubt(2 * first.sd)} of 100, at about 95 %; first in{' '}
        {formatShare(first.first)} of draws, rank {formatRange(...first.rank95)} of {formatNumber(match.ranked.length)}.
        By{' '}
        <Link href="/method#fit" prefetch={false}>
          Method {match.method}
        </Link>{' '}
        on{' '}
        <Link href={`/editions/${edition.number}`} prefetch={false}>
          edition {edition.number}
        </Link>
        , released <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>.
      </p>
    </section>
  )
}
