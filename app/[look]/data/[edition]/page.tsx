import type { Metadata } from 'next'
import Link from 'next/link'
import { notFound } from 'next/navigation'
import { cache } from 'react'
import { MAX_EDITION } from '@/lib/contract/match-request'
import { formatDay } from '@/lib/format/date'
import { datasetOf } from '@/lib/server/dataset'
import { editionByNumber } from '@/lib/server/editions'
import { EditionData } from '../edition-data'

type Props = { params: Promise<{ edition: string }> }

export const dynamic = 'force-static'
export const revalidate = 60

const requireData = cache(async (params: Props['params']) => {
  const { edition: digits } = await params
  if (!/^[1-9]\d{0,9}$/.test(digits) || Number(digits) > MAX_EDITION) notFound()
  const edition = (await editionByNumber(Number(digits))) ?? notFound()
  return { edition, dataset: (await datasetOf(edition.number)) ?? notFound() }
})

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { edition } = await requireData(params)
  return {
    title: `Data of edition ${edition.number}`,
    description: `The figures of ${edition.devices.length} devices released on ${formatDay(edition.publishedAt)}, with every reading they rest on, as CSV and JSON with checksums and a citation.`,
    alternates: { canonical: `/data/${edition.number}` },
  }
}

export default async function EditionDataPage({ params }: Props) {
  const { edition, dataset } = await requireData(params)
  return (
    <main className="measure py-12 [&_code]:font-text [&_pre]:font-text">
      <h1>Data of edition {edition.number}</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        Released {formatDay(edition.publishedAt)}; {edition.devices.length} devices. The bytes of these files never
        change.
      </p>
      <p className="mt-4 flex flex-wrap gap-x-6 gap-y-1">
        <Link prefetch={false} href="/data#dictionary" className="inline-flex min-h-11 items-center">
          What the columns mean
        </Link>
        <Link prefetch={false} href="/data" className="inline-flex min-h-11 items-center">
          All data
        </Link>
      </p>
      <EditionData edition={edition} dataset={dataset} />
    </main>
  )
}
