import Link from 'next/link'
import { READERS } from '@/lib/readers/readers'

/** Eight typical readers, each a line and a way to the picks for them. */
export function TypicalReaders() {
  return (
    <section aria-labelledby="typical-readers" className="later measure mt-14">
      <h2 id="typical-readers">Do you read like one of these?</h2>
      <p className="mt-3 max-w-[68ch] text-soft">
        Eight sets of answers, ranked by the same method as yours would be. Start from the nearest, and change what
        differs.
      </p>
      <ul className="mt-5 grid gap-x-10 border-t border-rule sm:grid-cols-2 lg:grid-cols-4">
        {READERS.map(({ slug, name, line }) => (
          <li key={slug} className="border-b border-rule py-4">
            <Link
              prefetch={false}
              href={`/for/${slug}`}
              className="inline-flex min-h-11 items-center font-heading text-h3 font-semibold sm:min-h-0"
            >
              {name}
            </Link>
            <p className="mt-1 text-small text-soft">{line}</p>
          </li>
        ))}
      </ul>
    </section>
  )
}
