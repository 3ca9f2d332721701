import Link from 'next/link'
import type { Changelog } from './changelog'

/** The head of a later page of an edition's long lists, with the way back. */
export function LaterHeading({ changelog }: { changelog: Changelog }) {
  const { number } = changelog.edition
  return (
    <header className="mb-8">
      <h1>{changelog.title}</h1>
      <p className="mt-2">
        <Link href={`/editions/${number}`} prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-6">
          All that changed in edition {number}
        </Link>
      </p>
    </header>
  )
}
