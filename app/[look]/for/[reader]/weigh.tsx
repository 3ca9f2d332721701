import type { Reader } from '@/lib/readers/reader'
import { wordsFor } from '@/lib/readers/words'

/** The editor's words on the reader's situation, and what to keep in mind. */
export function Weigh({ reader }: { reader: Reader }) {
  const { paragraphs, cautions } = wordsFor(reader.slug)
  return (
    <section aria-labelledby="weigh" className="min-w-0">
      <h2 id="weigh">What to weigh</h2>
      <div className="mt-4 grid max-w-[62ch] gap-4">
        {paragraphs.map((paragraph) => (
          <p key={paragraph}>{paragraph}</p>
        ))}
      </div>
      <h3 className="mt-6">Please keep in mind</h3>
      <ul className="mt-3 grid max-w-[62ch] list-disc gap-2 pl-5 text-small text-soft">
        {cautions.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </section>
  )
}
