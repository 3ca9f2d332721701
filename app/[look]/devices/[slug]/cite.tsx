import Link from 'next/link'
import { Disclosure } from '@/components/ui/disclosure'
import { citationBibtex } from '@/lib/cite/bibtex'
import { citationCff } from '@/lib/cite/cff'
import { citationText } from '@/lib/cite/text'
import type { Work } from '@/lib/cite/work'

/** How to cite the figures: in a sentence, and for the programs that keep references. */
export function Cite({ work, slug }: { work: Work; slug: string }) {
  return (
    <section aria-labelledby="cite" className="mt-14 max-w-[68ch] print:hidden">
      <h2 id="cite">How to cite</h2>
      <p className="mt-3 wrap-anywhere">{citationText(work)}</p>
      <p className="mt-2 text-small text-soft">
        A released edition never changes, so its number and date say exactly which figures are meant; this address
        stays, and its <Link href={`/devices/${slug}#history`}>history</Link> keeps the figures of every edition. There
        is no DOI. The whole edition stands at{' '}
        <Link href={`/editions/${work.edition}`} prefetch={false}>
          edition {work.edition}
        </Link>
        .
      </p>
      <Disclosure summary="For reference managers: BibTeX and CFF" className="mt-1">
        <Code name="BibTeX">{citationBibtex(work)}</Code>
        <Code name="Citation File Format (CITATION.cff)">{citationCff(work)}</Code>
      </Disclosure>
    </section>
  )
}

function Code({ name, children }: { name: string; children: string }) {
  return (
    <figure className="mt-3">
      <figcaption className="text-note text-soft">{name}</figcaption>
      <pre className="mt-1 rounded-card border border-rule bg-sheet p-3 font-text text-note wrap-anywhere whitespace-pre-wrap">
        {children}
      </pre>
    </figure>
  )
}
