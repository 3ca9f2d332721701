import { Booth } from '@/components/booth'
import { ButtonLink } from '@/components/ui/button'
import { formatDoubt, formatNumber, formatRange, formatShare } from '@/lib/format/number'
import type { RankedDevice } from '@/lib/method/types'
import { MARGIN_WORDS, marginOf, rivalsSentence } from '@/lib/quiz/lead'
import { quizHref } from '@/lib/quiz/moves'
import { leadSentence, reasonsFor, sentenceOf } from '@/lib/quiz/reasons'
import { deviceOf, type Result, spotsOf } from '@/lib/quiz/result'
import { CopyLink } from './copy-link'
import { PrintButton } from './print-button'

/** The closest fit, how close the next are, and the reasons, built from its own numbers. */
export function Verdict({
  result,
  ranked,
  group,
}: {
  result: Result
  ranked: readonly RankedDevice[]
  group: readonly RankedDevice[]
}) {
  const { match, address, edition, answers } = result
  const [first] = ranked
  if (!first) return null
  const device = deviceOf(result, first.slug)
  const nameOf = (slug: string) => deviceOf(result, slug).name
  const margin = marginOf(ranked)
  const left = match.ranked.map(({ slug }) => deviceOf(result, slug))
  const { pro, contra } = reasonsFor(device, match.weights, { edition, answers, spots: spotsOf(result), left })
  const rivals = rivalsSentence(ranked, nameOf)

  return (
    <section className="band" aria-labelledby="verdict">
      <div className="measure grid gap-x-10 gap-y-8 py-10 lg:grid-cols-[17.5rem_minmax(0,1fr)_14rem] print:block print:py-0">
        <div>
          <p className="text-brass-lit">{tieWords(group.length, first.tiedWith.length, ranked.length)}</p>
          <h1 id="verdict" className="mt-2 text-h1 sm:text-display print:mt-0 print:text-h2">
            {device.name.replace(/ (\d+)$/, '\u00a0$1')}
            {MARGIN_WORDS[margin] && (
              <>
                , <span className="inline-block">{MARGIN_WORDS[margin]}</span>
              </>
            )}
          </h1>
          <p className="mt-5 max-w-[58ch] text-lead print:mt-1 print:max-w-none print:text-body">{sentenceOf(pro)}</p>
          {contra.length > 0 && (
            <p className="mt-3 max-w-[58ch] text-soft print:mt-1 print:max-w-none">Against it: {sentenceOf(contra)}</p>
          )}
          <p className="mt-3 max-w-[58ch] text-soft print:mt-1 print:max-w-none">{leadSentence(ranked, nameOf)}</p>
          {rivals && (
            <p className="mt-5 max-w-[58ch] border-l-3 border-brass-lit pl-4 print:mt-1 print:mb-2 print:max-w-none">
              {rivals}
            </p>
          )}
          {device.onSale === false && (
            <p className="mt-3 max-w-[58ch] print:mt-1 print:max-w-none">
              It is no longer sold: you would have to find one second hand.
            </p>
          )}
          {device.provisional && (
            <p className="mt-3 max-w-[58ch] text-soft print:mt-1 print:max-w-none">
              Provisional: its figures rest on a single unit, so its doubt is larger.
            </p>
          )}
        </div>
        <div className="grid content-start gap-5 print:hidden">
          <div>
            <p className="text-small text-soft">Fit with your answers</p>
            <p className="mt-1 text-h2 font-semibold tabular-nums">
              {formatNumber(first.fit)} {formatDoubt(2 * first.sd)}
            </p>
            <p className="mt-1 text-small text-soft">
              of 100, at about 95 %; first in {formatShare(first.first)} of draws, rank {formatRange(...first.rank95)}
            </p>
          </div>
          <CopyLink />
          <ButtonLink href={quizHref(1, address)} look="quiet" prefetch={false}>
            Change my answers
          </ButtonLink>
          <PrintButton />
        </div>
        <Booth
          sheets={[{ name: device.name, page: device.page, ink: device.ink }]}
          paper={edition.control.paper}
          className="max-w-80 lg:order-first print:hidden"
        />
      </div>
    </section>
  )
}

function tieWords(level: number, ties: number, all: number): string {
  if (all === 1) return 'The only device left'
  if (level < 2 && ties === 0) return 'Ahead of each of the others in at least 95 of 100 draws'
  return `${formatNumber(Math.max(level, ties + 1))} devices are too close to call for you`
}
