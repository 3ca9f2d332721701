import type { Metadata } from 'next'
import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { Pager } from '@/components/ui/pager'
import { listCorrections } from '@/db/queries/corrections'
import { formatNumber } from '@/lib/format/number'
import { read } from '@/lib/server/db'
import { PER_PAGE } from '@/lib/server/path-page'
import { CorrectionEntry } from './correction-entry'
import { withChanges } from './load'
import { Report } from './report'

export const correctionsMetadata: Metadata = {
  title: 'Corrections',
  description:
    'Every published figure that turned out wrong, newest first: what it was, what it is now, the edition that put it right, who raised it, and every reply.',
}

export const pathOf = (page: number) => (page === 1 ? '/corrections' : `/corrections/pages/${page}`)

/** One page of the corrections. @param total all there are */
export async function Corrections({ page, total }: { page: number; total: number }) {
  const rows = await read((db) => listCorrections(db, { limit: PER_PAGE, offset: (page - 1) * PER_PAGE }))
  const corrections = await withChanges(rows)
  return (
    <main className="measure py-12">
      <h1>Corrections</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        Figures we printed and had to change, and what was said about them. Nothing is taken off this page. Differences
        are taken before rounding.
      </p>
      <p className="mt-4 max-w-[68ch]">
        A released{' '}
        <Link href="/editions" prefetch={false}>
          edition
        </Link>{' '}
        is never altered: the wrong figure stays where it was printed, the right one comes with a later edition, and the
        note here joins the two. The readings a wrong figure rested on stay visible on the device’s page, marked
        withdrawn, with the reason.
      </p>
      {total === 0 ? (
        <Notice className="mt-8 max-w-[60ch]">
          No figure has been corrected so far. That may mean that none was wrong, or that nobody has looked closely
          enough; if you do, write to us.
        </Notice>
      ) : (
        <>
          <p className="mt-8 text-small text-soft">
            {total === 1 ? 'One correction so far.' : `${formatNumber(total)} corrections so far, newest first.`}
          </p>
          <div className="mt-3 grid grid-cols-[minmax(0,1fr)] gap-10">
            {corrections.map((correction) => (
              <CorrectionEntry key={correction.id} correction={correction} />
            ))}
          </div>
          <p className="mt-6 max-w-[68ch] text-note text-soft">
            What both editions share, calibration and sessions, drops out of the doubt of a difference; the rest is
            taken as independent although some readings are the same, so that doubt is rather too large than too small.
            † outside the formula’s limits, as on every electronic-paper page.
          </p>
        </>
      )}
      <Pager paging={{ page, perPage: PER_PAGE, hrefFor: pathOf }} total={total} what="Corrections" />
      <Report />
    </main>
  )
}
