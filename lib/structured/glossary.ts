import type { Term } from '@/lib/glossary/term'

/**
 * The glossary as a schema.org DefinedTermSet.
 * @param url absolute address of the page
 * @see https://schema.org/DefinedTermSet
 */
export function termSet(terms: readonly Term[], url: string) {
  return {
    '@context': 'https://schema.org',
    '@type': 'DefinedTermSet',
    '@id': url,
    name: 'Glossary of Lampleaf',
    url,
    inLanguage: 'en-GB',
    hasDefinedTerm: terms.map(({ id, name, also, text }) => ({
      '@type': 'DefinedTerm',
      '@id': `${url}#${id}`,
      name,
      ...(also ? { alternateName: also } : {}),
      description: text,
      url: `${url}#${id}`,
      inDefinedTermSet: url,
    })),
  }
}
