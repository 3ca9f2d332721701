import type { Metadata } from 'next'
import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { Pager } from '@/components/ui/pager'
import { listEditionSummaries } from '@/db/queries/editions'
import { formatDay } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'
import { read } from '@/lib/server/db'
import { PER_PAGE } from '@/lib/server/path-page'

export const editionsMetadata: Metadata = {
  title: 'Editions',
  description:
    'Every released edition of the figures, newest first: what changed, how many devices, its seal, and its data to download and cite.',
}

export const pathOf = (page: number) => (page === 1 ? '/editions' : `/editions/pages/${page}`)

/** One page of the editions, newest first. @param total all there are */
export async function Editions({ page, total }: { page: number; total: number }) {
  const editions = await read((db) => listEditionSummaries(db, { limit: PER_PAGE, offset: (page - 1) * PER_PAGE }))
  return (
    <main className="measure py-12">
      <h1>Editions</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        We publish figures in numbered editions. A released edition never changes, so a figure you cite stays as you
        cited it, right or wrong.
      </p>
      <p className="mt-4 max-w-[68ch]">
        What turns out wrong is put right in a later edition and noted among the{' '}
        <Link href="/corrections" prefetch={false}>
          corrections
        </Link>
        . Every edition carries a seal, a SHA-256 of its document, and a list of what it changed.
      </p>
      {total === 0 ? (
        <Notice className="mt-8 max-w-[60ch]">
          No edition has been released yet.{' '}
          <Link href="/method" prefetch={false}>
            How the figures will come about
          </Link>{' '}
          is already there to read.
        </Notice>
      ) : (
        <ol reversed start={total - (page - 1) * PER_PAGE} className="mt-10 border-t-(length:--strong-rule) border-ink">
          {editions.map((edition) => (
            <EditionRow key={edition.number} edition={edition} />
          ))}
        </ol>
      )}
      <Pager paging={{ page, perPage: PER_PAGE, hrefFor: pathOf }} total={total} what="Editions" />
    </main>
  )
}

function EditionRow({ edition }: { edition: Awaited<ReturnType<typeof listEditionSummaries>>[number] }) {
  const { number, title, note, publishedAt, devices, sha256 } = edition
  return (
    <li className="grid gap-x-10 gap-y-2 border-b border-rule py-6 md:grid-cols-[11rem_minmax(0,1fr)]">
      <div>
        <h2 className="text-h3">
          <Link href={`/editions/${number}`} prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-8">
            {title}
          </Link>
        </h2>
        <p className="text-small text-soft">
          <time dateTime={publishedAt.toISOString()}>{formatDay(publishedAt)}</time>
          <br />
          {formatNumber(devices)} {devices === 1 ? 'device' : 'devices'}
        </p>
      </div>
      <div className="min-w-0">
        <p className="max-w-[68ch]">{note}</p>
        <p className="mt-2 text-note wrap-anywhere text-soft">Seal {sha256}</p>
        <p className="mt-1 flex flex-wrap gap-x-6 text-small">
          <Link
            href={`/editions/${number}`}
            prefetch={false}
            className="inline-flex min-h-11 items-center sm:min-h-6"
            aria-label={`What changed in edition ${number}`}
          >
            What changed
          </Link>
          <a
            href={`/api/v1/editions/${number}`}
            className="inline-flex min-h-11 items-center sm:min-h-6"
            aria-label={`Document of edition ${number}, JSON`}
          >
            Document, JSON
          </a>
          <Link
            href="/data"
            prefetch={false}
            className="inline-flex min-h-11 items-center sm:min-h-6"
            aria-label={`Tables of edition ${number} to download`}
          >
            Tables to download
          </Link>
        </p>
      </div>
    </li>
  )
}
