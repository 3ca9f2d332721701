import Link from 'next/link'
import { TextToCopy } from '@/components/text-to-copy'
import { Disclosure } from '@/components/ui/disclosure'
import { LICENCE } from '@/lib/dataset/about'
import { datasetCitations } from '@/lib/dataset/citation-files'
import type { Edition } from '@/lib/method/types'
import { siteUrl } from '@/lib/server/site-url'

/** How to cite the edition, and where its data is. */
export function Cite({ edition }: { edition: Edition }) {
  const { number } = edition
  const { text, bibtex, cff } = datasetCitations(edition, siteUrl(`/editions/${number}`))
  return (
    <section aria-labelledby="cite">
      <h2 id="cite">Cite and use it</h2>
      <p className="mt-3 max-w-[68ch] wrap-anywhere">{text}</p>
      <Disclosure summary="As BibTeX" className="mt-2">
        <TextToCopy label="Citation as BibTeX" text={bibtex} />
      </Disclosure>
      <Disclosure summary="As CITATION.cff">
        <TextToCopy label="Citation as CITATION.cff" text={cff} />
      </Disclosure>
      <p className="mt-4 max-w-[68ch]">
        The data is under <a href={LICENCE.url}>{LICENCE.title}</a>: use it as you like, and say where it is from and
        what you changed. <a href={`/api/v1/editions/${number}`}>The document of edition {number}</a> is JSON; readings,
        controls and facts are among the{' '}
        <Link href="/data" prefetch={false}>
          tables to download
        </Link>
        .
      </p>
    </section>
  )
}
