import Link from 'next/link'
import type { Reader } from '@/lib/readers/reader'
import { READERS } from '@/lib/readers/readers'

/** The way to the other typical readers. */
export function OtherReaders({ reader }: { reader: Reader }) {
  return (
    <nav aria-labelledby="others" className="border-t border-rule pt-8">
      <h2 id="others" className="text-h3">
        Other readers
      </h2>
      <ul className="mt-3 grid gap-x-10 sm:grid-cols-2 lg:grid-cols-3">
        {READERS.filter(({ slug }) => slug !== reader.slug).map(({ slug, name, line }) => (
          <li key={slug} className="py-2">
            <Link
              href={`/for/${slug}`}
              prefetch={false}
              className="inline-flex min-h-11 items-center font-semibold sm:min-h-6"
            >
              {name}
            </Link>
            <span className="block text-small text-soft">{line}</span>
          </li>
        ))}
      </ul>
    </nav>
  )
}
