import type { Metadata } from 'next'
import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { formatDay } from '@/lib/format/date'
import { READERS } from '@/lib/readers/readers'
import { latestEdition } from '@/lib/server/editions'
import { ReaderRow } from './reader-row'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = {
  title: 'For readers like you',
  description:
    'Eight typical readers, from a dim bedroom to a sunny balcony: the devices whose pages suit each, worked out from stated answers by the published method.',
  alternates: { canonical: '/for' },
}

export default async function ReadersPage() {
  const edition = await latestEdition()
  return (
    <main className="measure py-12">
      <h1>For readers like you</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        The page that suits one light does not suit another. Here are eight typical readers, what each would answer in
        our quiz, and what the method makes of it.
      </p>
      {edition ? (
        <p className="mt-4 max-w-[68ch]">
          Nobody picked these by hand: the answers are stated on each page, and the order follows from them and from{' '}
          <Link href={`/editions/${edition.number}`} prefetch={false}>
            edition {edition.number}
          </Link>
          , released <time dateTime={edition.publishedAt}>{formatDay(edition.publishedAt)}</time>, by{' '}
          <Link href="/method" prefetch={false}>
            Method {edition.method}
          </Link>
          . Change one answer and you have your own.
        </p>
      ) : (
        <Notice className="mt-6 max-w-[60ch]">
          No edition has been released yet, so there are no picks. What each reader would answer is there already.
        </Notice>
      )}
      <ul className="mt-10 border-t-(length:--strong-rule) border-ink">
        {READERS.map((reader) => (
          <ReaderRow key={reader.slug} reader={reader} />
        ))}
      </ul>
      <p className="mt-10 max-w-[60ch]">None of them is quite you? Five short steps are all it takes.</p>
      <ButtonLink href="/quiz" prefetch={false} className="mt-4">
        Take the quiz
      </ButtonLink>
    </main>
  )
}
