import { citationBibtex } from '@/lib/cite/bibtex'
import { citationCff } from '@/lib/cite/cff'
import { citationText } from '@/lib/cite/text'
import type { Edition } from '@/lib/method/types'
import { CREATOR, LICENCE, TITLE } from './about'

/** How the data set of an edition is cited: as text, BibTeX and CITATION.cff. */
export type Citations = { text: string; bibtex: string; cff: string }

/** @param url the address of the data set's own page, absolute */
export function datasetCitations(
  { number, publishedAt }: Pick<Edition, 'number' | 'publishedAt'>,
  url: string,
): Citations {
  const work = {
    title: TITLE,
    edition: number,
    publishedOn: publishedAt.slice(0, 10),
    url,
    authors: [CREATOR],
    licence: LICENCE.id,
  }
  return { text: citationText(work), bibtex: citationBibtex(work), cff: citationCff(work) }
}

/** Citations name the address of the site, so they are files beside the data set, and none of its checksums. */
export const CITATION_FILES = {
  'citation.txt': { kind: 'text', type: 'text/plain; charset=utf-8' },
  'citation.bib': { kind: 'bibtex', type: 'application/x-bibtex; charset=utf-8' },
  'CITATION.cff': { kind: 'cff', type: 'application/yaml; charset=utf-8' },
} as const satisfies Record<string, { kind: keyof Citations; type: string }>
