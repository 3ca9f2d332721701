import Link from 'next/link'
import { Fragment } from 'react'
import { formatDay } from '@/lib/format/date'
import { formatList } from '@/lib/format/list'
import { formatNumber } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import { assumptionsOf } from '@/lib/quiz/assumptions'
import { quizHref, resultHref } from '@/lib/quiz/moves'
import { notStatedByField } from '@/lib/quiz/not-stated'
import { deviceOf, type Result } from '@/lib/quiz/result'
import { toldBy } from '@/lib/quiz/told'
import { config } from '@/lib/server/config'

/** What was assumed and not stated, the edition and method the result rests on, and the cautions. */
export function FinePrint({ result }: { result: Result }) {
  const { match, edition, address, assumed } = result
  const assumptions = assumptionsOf(assumed, address.answers)
  const notStated = notStatedByField(match.ranked)
  const told = toldBy(address.answers)
  return (
    <section
      aria-labelledby="rests-on"
      className="grid gap-x-12 gap-y-6 border-t border-rule pt-8 md:grid-cols-2 print:block print:pt-2"
    >
      <div>
        <h2 id="rests-on" className="text-h3">
          What this rests on
        </h2>
        <p className="mt-3 max-w-[60ch] print:max-w-none print:mt-1">
          <Link href={`/api/v1/editions/${edition.number}`} prefetch={false}>
            Edition {edition.number}
          </Link>
          , released <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>, with{' '}
          {formatNumber(edition.devices.length)} devices; <Link href="/method">Method {match.method}</Link>, with{' '}
          {formatNumber(METHOD.ties.draws.value)} draws. The same answers on the same edition always give the same
          result.
        </p>
        {told.length > 0 && (
          <dl className="mt-3 grid max-w-[60ch] print:max-w-none grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 print:mt-1 print:gap-y-0">
            {told.map(({ topic, words }) => (
              <Fragment key={topic}>
                <dt className="text-soft">{topic}</dt>
                <dd className="wrap-anywhere">{words}</dd>
              </Fragment>
            ))}
          </dl>
        )}
        {assumptions.words && (
          <p className="mt-3 max-w-[60ch] print:max-w-none print:mt-1">
            You did not say, so we assumed {assumptions.words}.{' '}
            <Link href={quizHref(1, address)} prefetch={false} className="print:hidden">
              Answer more
            </Link>
          </p>
        )}
        <p className="mt-1 hidden text-note wrap-anywhere print:block">
          {config().baseUrl}
          {resultHref(address)}
        </p>
        {address.unknown.length > 0 && (
          <p className="mt-3 max-w-[60ch] print:max-w-none text-small text-soft">
            Parts of the address we do not know were left out: {formatList(address.unknown)}.
          </p>
        )}
      </div>
      <div className="grid content-start gap-6 print:mt-2 print:gap-1">
        {notStated.length > 0 && (
          <div>
            <h3>Not stated</h3>
            <ul className="mt-3 grid gap-1 print:mt-1">
              {notStated.map(({ field, name, effect, slugs }) => (
                <li key={field}>
                  {name} of {formatList(slugs.map((slug) => deviceOf(result, slug).name))}: {effect}.
                </li>
              ))}
            </ul>
          </div>
        )}
        <div>
          <h3>Please keep in mind</h3>
          <p className="mt-3 max-w-[60ch] print:max-w-none text-small text-soft print:mt-0 print:text-note">
            Not medical advice; sudden changes in sight, pain or haloes belong to an eye-care professional. Comfort,
            “eye strain” and sleep are not rated. Light levels are bands, not measurements. Water codes describe new
            devices in fresh water. Batteries and chargers: as their makers say. Local consumer law comes first.
          </p>
        </div>
      </div>
    </section>
  )
}
