import Link from 'next/link'
import { Booth } from '@/components/booth'
import { ButtonLink } from '@/components/ui/button'
import { deviceOf, type Result } from '@/lib/quiz/result'
import type { Picks } from '@/lib/readers/picks'
import { type Reader, wholeResultHref, yoursHref } from '@/lib/readers/reader'

/** Sheets of a tie that stand side by side; more would be too narrow to see. */
const MOST_SHEETS = 2

/** Who the reader is, the way into the quiz with these answers, and the page that comes first in the booth. */
export function ReaderHeading({
  reader,
  result,
  picks,
}: {
  reader: Reader
  result: Result | null
  picks: Picks | null
}) {
  const first = result && picks ? (picks.groups[0] ?? []).slice(0, MOST_SHEETS) : []
  return (
    <section className="band" aria-labelledby="reader">
      <div className="measure grid gap-x-12 gap-y-8 py-10 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <div className="grid content-start gap-5">
          <nav aria-label="Breadcrumb" className="text-small text-soft">
            <Link href="/for" prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-6">
              For readers like you
            </Link>
          </nav>
          <h1 id="reader" className="text-h1 sm:text-display">
            {reader.name}
          </h1>
          <p className="max-w-[50ch] text-lead">{reader.line}</p>
          <div className="mt-2 flex flex-wrap gap-3">
            <ButtonLink href={yoursHref(reader)} look="lamp" prefetch={false}>
              Make it yours
            </ButtonLink>
            <ButtonLink href={wholeResultHref(reader)} look="quiet" prefetch={false}>
              The whole result
            </ButtonLink>
          </div>
          <p className="max-w-[50ch] text-small text-soft">
            Both begin with exactly the answers stated on this page. They travel in the address; nothing is stored.
          </p>
        </div>
        {result && first.length > 0 && (
          <Booth
            sheets={first.map(({ slug }) => deviceOf(result, slug))}
            paper={result.edition.control.paper}
            className="max-w-96 print:hidden"
          />
        )}
      </div>
    </section>
  )
}
