import type { Metadata } from 'next'
import Link from 'next/link'
import { JsonLd } from '@/components/json-ld'
import { formatNumber } from '@/lib/format/number'
import type { Term } from '@/lib/glossary/term'
import { TERMS, termsByLetter } from '@/lib/glossary/terms'
import { siteUrl } from '@/lib/server/site-url'
import { termSet } from '@/lib/structured/glossary'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = {
  title: 'Glossary',
  description:
    'The words of the trade and of this guide, each in a few exact sentences, with the standard it is from and where it is used.',
  alternates: { canonical: '/glossary' },
}

export default function GlossaryPage() {
  const letters = termsByLetter()
  return (
    <main className="measure py-12">
      <h1>Glossary</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        {formatNumber(TERMS.length)} words, as this guide means them. The trade’s words stay as the standards have them;
        those marked “house” are ours.
      </p>
      <nav aria-label="Letters" className="mt-8">
        <ul className="flex flex-wrap gap-1">
          {letters.map(({ letter }) => (
            <li key={letter}>
              <a
                href={`#letter-${letter}`}
                aria-label={`Words with ${letter}`}
                className="flex size-11 items-center justify-center rounded-card border border-edge font-semibold no-underline hover:bg-tint"
              >
                {letter}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      {letters.map(({ letter, terms }) => (
        <section
          key={letter}
          id={`letter-${letter}`}
          aria-labelledby={`title-${letter}`}
          className="mt-10 grid scroll-mt-4 gap-x-8 border-t border-rule pt-6 sm:grid-cols-[3rem_minmax(0,1fr)]"
        >
          <h2 id={`title-${letter}`}>{letter}</h2>
          <dl className="grid gap-7 max-sm:mt-4">
            {terms.map((term) => (
              <Entry key={term.id} term={term} />
            ))}
          </dl>
        </section>
      ))}
      <JsonLd data={termSet(TERMS, siteUrl('/glossary'))} />
    </main>
  )
}

function Entry({ term }: { term: Term }) {
  const { id, name, also, text, source, used } = term
  return (
    <div id={id} className="scroll-mt-4 target:border-l-4 target:border-shade target:pl-4">
      <dt className="font-heading text-h3 font-semibold">
        {name}
        {also && <span className="font-text text-small font-normal text-soft">, also {also.join(', ')}</span>}
      </dt>
      <dd className="mt-1 max-w-[68ch]">{text}</dd>
      <dd className="mt-1 text-note text-soft">
        From: {source}. Used in:{' '}
        <Link href={used.href} prefetch={false} className="inline-flex min-h-6 items-center">
          {used.name}
        </Link>
      </dd>
    </div>
  )
}
