type SiteUrl = (path: string) => string

/** The name of the site's own node, for other pages' data to point at. */
export const organizationId = (siteUrl: SiteUrl) => siteUrl('/#organization')

/**
 * schema.org data of the home page: the site, who publishes it, and the search of its catalogue. The demo's bench is
 * invented, so no address, telephone or founder is claimed.
 * @param siteUrl makes an absolute address of a path
 * @see https://schema.org/WebSite
 */
export function websiteStructuredData(description: string, siteUrl: SiteUrl): object {
  const publisher = organizationId(siteUrl)
  return {
    '@context': 'https://schema.org',
    '@graph': [
      {
        '@type': 'WebSite',
        '@id': siteUrl('/#website'),
        url: siteUrl('/'),
        name: 'Lampleaf',
        description,
        inLanguage: 'en-GB',
        publisher: { '@id': publisher },
        license: 'https://creativecommons.org/licenses/by/4.0/',
        potentialAction: {
          '@type': 'SearchAction',
          target: { '@type': 'EntryPoint', urlTemplate: `${siteUrl('/devices')}?q={search_term_string}` },
          // The one property that takes no node: the text names the part of the template a searcher fills in.
          'query-input': 'required name=search_term_string',
        },
      },
      {
        '@type': 'Organization',
        '@id': publisher,
        name: 'Lampleaf',
        url: siteUrl('/'),
        logo: siteUrl('/icons/mark-512.png'),
        publishingPrinciples: siteUrl('/about'),
        correctionsPolicy: siteUrl('/corrections'),
        subjectOf: siteUrl('/method'),
      },
    ],
  }
}
