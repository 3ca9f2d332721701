import Link from 'next/link'
import { assumptionsOf } from '@/lib/quiz/assumptions'
import { toldBy } from '@/lib/quiz/told'
import { questionOf, type Reader, yoursHref } from '@/lib/readers/reader'

/** Every answer the picks rest on, in words, and what the method filled in. */
export function AnswersStated({ reader }: { reader: Reader }) {
  const { words } = assumptionsOf(questionOf(reader).assumed, reader.answers)
  return (
    <section aria-labelledby="answers" className="min-w-0">
      <h2 id="answers" className="text-h3">
        The answers behind it
      </h2>
      <dl className="mt-3 border-t border-rule text-small">
        {toldBy(reader.answers).map(({ topic, words: told }) => (
          <div key={topic} className="grid grid-cols-[7.5rem_minmax(0,1fr)] gap-x-4 border-b border-rule py-2">
            <dt className="text-soft">{topic}</dt>
            <dd className="wrap-anywhere">{told}</dd>
          </div>
        ))}
      </dl>
      {words && <p className="mt-3 text-small text-soft">Not answered, so the method assumes {words}.</p>}
      <p className="mt-3">
        <Link href={yoursHref(reader)} prefetch={false} className="inline-flex min-h-11 items-center sm:min-h-6">
          Change these answers
        </Link>
      </p>
    </section>
  )
}
