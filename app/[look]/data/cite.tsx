import { TextToCopy } from '@/components/text-to-copy'
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
        <TextToCopy label={`BibTeX of edition ${edition}`} text={citations.bibtex} />
      </Disclosure>
      <Disclosure summary="CITATION.cff">
        <TextToCopy label={`CITATION.cff of edition ${edition}`} text={citations.cff} />
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
