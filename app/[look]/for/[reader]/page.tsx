import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { Changes } from '@/components/result/changes'
import { InYourLight } from '@/components/result/in-your-light'
import { Notice } from '@/components/ui/notice'
import { picksOf } from '@/lib/readers/picks'
import type { Reader } from '@/lib/readers/reader'
import { findReader } from '@/lib/readers/readers'
import { pageMetadata } from '@/lib/server/page-metadata'
import { answeredFor } from '../answered'
import { AnswersStated } from './answers-stated'
import { ReaderHeading } from './heading'
import { OtherReaders } from './other-readers'
import { PicksTable } from './picks-table'
import { ReaderStructure } from './structure'
import { Pick } from './the-pick'
import { Weigh } from './weigh'

type Props = { params: Promise<{ reader: string }> }

async function requireReader(params: Props['params']): Promise<Reader> {
  return findReader((await params).reader) ?? notFound()
}

export const dynamic = 'force-static'
export const revalidate = 60

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const reader = await requireReader(params)
  return pageMetadata({
    title: `For readers: ${reader.name}`,
    description: `${reader.line} The devices whose pages suit these answers, with points, doubts and what would change the order.`,
    path: `/for/${reader.slug}`,
  })
}

export default async function ReaderPage({ params }: Props) {
  const reader = await requireReader(params)
  const result = await answeredFor(reader)
  const picks = result ? picksOf(result.match.ranked) : null
  return (
    <main>
      <ReaderHeading reader={reader} result={result} picks={picks} />
      <div className="measure grid grid-cols-[minmax(0,1fr)] gap-12 pt-10">
        {!result && (
          <Notice className="max-w-[60ch]">
            No edition has been released yet, so there is nothing to rank these answers against. They are stated below,
            and the picks will be here with the first edition.
          </Notice>
        )}
        {result && picks && picks.readable.length === 0 && (
          <Notice look="warning" className="max-w-[60ch]">
            No device of edition {result.edition.number} meets these answers: the limits leave none that can be read in
            this light.
          </Notice>
        )}
        <div className="grid gap-x-14 gap-y-10 lg:grid-cols-[minmax(0,1.25fr)_minmax(0,1fr)]">
          {result && picks && picks.readable.length > 0 ? (
            <Pick result={result} picks={picks} />
          ) : (
            <Weigh reader={reader} />
          )}
          <AnswersStated reader={reader} />
        </div>
        {result && picks && picks.readable.length > 0 && (
          <>
            <PicksTable reader={reader} result={result} picks={picks} />
            <div className="grid gap-x-14 gap-y-10 lg:grid-cols-[minmax(0,1.25fr)_minmax(0,1fr)]">
              <Weigh reader={reader} />
              <Changes result={result} />
            </div>
            <div className="max-w-180">
              <InYourLight result={result} ranked={picks.readable} />
            </div>
            <ReaderStructure reader={reader} result={result} picks={picks} />
          </>
        )}
        <OtherReaders reader={reader} />
        <p className="max-w-[68ch] text-note text-soft">
          Rest of the small print: <Link href="/method#unknowns">what we do not know</Link>,{' '}
          <Link href="/about" prefetch={false}>
            who pays for this
          </Link>{' '}
          and{' '}
          <Link href="/corrections" prefetch={false}>
            what we got wrong
          </Link>
          .
        </p>
      </div>
    </main>
  )
}
