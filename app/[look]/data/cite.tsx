import { Disclosure } from '@/components/ui/disclosure'
import { LICENCE } from '@/lib/dataset/about'
import type { Citations } from '@/lib/dataset/citation-files'

/** How to cite the data set of an edition, and under which licence it may be used. */
export function Cite({ edition, citations }: { edition: number; citations: Citations }) {
  return (
    <>
      <p className="mt-4 max-w-[68ch]">
        The data are under <a href={LICENCE.url}>{LICENCE.title}</a> ({LICENCE.id}): use them for anything, name the
        source and the edition, and say what you changed.
      </p>
      <blockquote className="mt-4 max-w-[68ch] border-l-4 border-shade pl-4 [overflow-wrap:anywhere]">
        {citations.text}
      </blockquote>
      <Disclosure summary="BibTeX" className="mt-3">
        <Source label={`BibTeX of edition ${edition}`} text={citations.bibtex} />
      </Disclosure>
      <Disclosure summary="CITATION.cff">
        <Source label={`CITATION.cff of edition ${edition}`} text={citations.cff} />
      </Disclosure>
      <p className="mt-3 flex flex-wrap gap-x-6">
        {['citation.txt', 'citation.bib', 'CITATION.cff'].map((name) => (
          <a key={name} href={`/data/${edition}/${name}`} download className="inline-flex min-h-11 items-center">
            {name}
          </a>
        ))}
      </p>
    </>
  )
}

/** Text to copy as it stands; long lines scroll inside. */
export function Source({ label, text }: { label: string; text: string }) {
  return (
    <section
      aria-label={label}
      className="mt-2 overflow-x-auto border border-rule bg-sheet p-4"
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls sideways must be reachable by keyboard
      tabIndex={0}
    >
      <pre className="text-note">{text}</pre>
    </section>
  )
}
