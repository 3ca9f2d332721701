import Link from 'next/link'
import { TextToCopy } from '@/components/text-to-copy'
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
        <TextToCopy label="Citation as BibTeX" text={citationBibtex(work)} />
        <TextToCopy label="Citation as CITATION.cff" text={citationCff(work)} />
      </Disclosure>
    </section>
  )
}
