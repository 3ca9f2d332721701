import type { Metadata } from 'next'
import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { listEditions } from '@/db/queries/editions'
import { formatDay } from '@/lib/format/date'
import { datasetOf } from '@/lib/server/dataset'
import { read } from '@/lib/server/db'
import { editionByNumber } from '@/lib/server/editions'
import { Dictionary } from './dictionary'
import { EditionData } from './edition-data'
import { Writing } from './writing'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = {
  title: 'Data',
  description:
    'Every reading, set, control and figure of each edition as CSV and JSON, with units, doubts, a dictionary of columns, checksums and a licence to use them.',
  alternates: { canonical: '/data' },
}

export default async function DataPage() {
  const editions = await read(listEditions)
  const newest = editions[0]
  const [edition, dataset] = newest
    ? await Promise.all([editionByNumber(newest.number), datasetOf(newest.number)])
    : [null, null]
  return (
    <main className="measure py-12 [&_code]:font-text [&_pre]:font-text">
      <h1>The data</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        Everything a published figure rests on, to check, to use and to cite: the readings as the instrument gave them,
        the controls of the day, and what we worked out of them, each edition by itself.
      </p>
      <p className="mt-4 flex flex-wrap gap-x-6 gap-y-1">
        <Link prefetch={false} href="/data/api" className="inline-flex min-h-11 items-center">
          The API, with examples
        </Link>
        <Link prefetch={false} href="/method" className="inline-flex min-h-11 items-center">
          How the figures are worked out
        </Link>
      </p>
      {edition && dataset ? (
        <EditionData edition={edition} dataset={dataset} />
      ) : (
        <Notice className="mt-8 max-w-[60ch]">
          No edition has been released yet, so there is nothing to load. The columns its files will have are below.
        </Notice>
      )}
      {editions.length > 1 && (
        <section aria-labelledby="earlier-title" className="mt-12">
          <h2 id="earlier-title">Earlier editions</h2>
          <p className="mt-2 max-w-[68ch] text-soft">They stay as they were released, figures found wrong included.</p>
          <ul className="mt-3">
            {editions.slice(1).map(({ number, publishedAt }) => (
              <li key={number}>
                <Link
                  prefetch={false}
                  href={`/data/${number}`}
                  className="inline-flex min-h-11 items-center md:min-h-8"
                >
                  Data of edition {number}, released {formatDay(publishedAt)}
                </Link>
              </li>
            ))}
          </ul>
        </section>
      )}
      <Writing />
      <section id="dictionary" aria-labelledby="dictionary-title" className="mt-12 scroll-mt-4">
        <h2 id="dictionary-title">Data dictionary</h2>
        <Dictionary />
      </section>
    </main>
  )
}
