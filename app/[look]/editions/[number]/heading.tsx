import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { formatDay } from '@/lib/format/date'
import { formatNumber } from '@/lib/format/number'
import type { Changelog } from './changelog'

/** Which edition this is, what the team wrote at its release, and whether it is the newest or wrong anywhere. */
export function EditionHeading({ changelog }: { changelog: Changelog }) {
  const { edition, title, note, latest, wrong } = changelog
  const { number, publishedAt, devices, method } = edition
  return (
    <header>
      <nav aria-label="Breadcrumb" className="text-small text-soft">
        <Link href="/editions" prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-6">
          Editions
        </Link>
      </nav>
      <h1 className="mt-3 text-h1 sm:text-display">{title}</h1>
      <p className="mt-3 text-soft">
        Released <time dateTime={publishedAt}>{formatDay(publishedAt)}</time>, {formatNumber(devices.length)}{' '}
        {devices.length === 1 ? 'device' : 'devices'}, by{' '}
        <Link href="/method" prefetch={false}>
          Method {method}
        </Link>
        .
      </p>
      <p className="mt-4 max-w-[60ch] text-lead">{note}</p>
      {wrong.map(({ id, name, figure, rightIn }) => (
        <Notice key={id} look="warning" className="mt-5 max-w-[68ch]">
          Wrong in this edition: {figure[0]?.toLowerCase()}
          {figure.slice(1)} of {name}.{' '}
          {rightIn === null ? (
            'No edition puts it right yet. '
          ) : (
            <>
              <Link href={`/editions/${rightIn}`} prefetch={false} className="text-inherit">
                Edition {rightIn}
              </Link>{' '}
              puts it right; this one keeps what it printed.{' '}
            </>
          )}
          <Link href={`/corrections#correction-${id}`} prefetch={false} className="text-inherit">
            The correction of {name}
          </Link>
        </Notice>
      ))}
      {number < latest && (
        <Notice className="mt-5 max-w-[68ch]">
          Not the newest.{' '}
          <Link href={`/editions/${latest}`} prefetch={false} className="text-inherit">
            Edition {latest}
          </Link>{' '}
          has the figures we stand by today.
        </Notice>
      )}
      <nav aria-label="Editions before and after" className="mt-5 flex flex-wrap gap-x-6 text-small">
        {number > 1 && (
          <Link
            href={`/editions/${number - 1}`}
            prefetch={false}
            rel="prev"
            className="inline-flex min-h-11 items-center sm:min-h-6"
          >
            The edition before, {number - 1}
          </Link>
        )}
        {number < latest && (
          <Link
            href={`/editions/${number + 1}`}
            prefetch={false}
            rel="next"
            className="inline-flex min-h-11 items-center sm:min-h-6"
          >
            The edition after, {number + 1}
          </Link>
        )}
        <a href={`/api/v1/editions/${number}`} className="inline-flex min-h-11 items-center sm:min-h-6">
          The document, JSON
        </a>
        <Link href="/data" prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-6">
          Tables to download
        </Link>
      </nav>
    </header>
  )
}
