import type { Work } from './work'

/**
 * A CITATION.cff file of a data set. Authors are given as entities, by name: the format would have a person's name in
 * parts, and we keep names as printed.
 * @see Citation File Format 1.2.0, https://doi.org/10.5281/zenodo.5171937
 */
export function citationCff({ authors, title, edition, publishedOn, url, licence }: Work): string {
  return [
    'cff-version: 1.2.0',
    `message: ${quote('If you use these figures, please cite them with their edition.')}`,
    'type: dataset',
    `title: ${quote(title)}`,
    'authors:',
    ...authors.map((name) => `  - name: ${quote(name)}`),
    `version: ${quote(String(edition))}`,
    `date-released: ${quote(publishedOn)}`,
    `url: ${quote(url)}`,
    ...(licence === undefined ? [] : [`license: ${quote(licence)}`]),
    '',
  ].join('\n')
}

/**
 * A YAML scalar in double quotes. JSON's escapes are YAML's too (YAML 1.2, section 1.3), but YAML also wants escaped
 * what JSON lets stand: the delete and C1 controls, other line ends, and the byte order mark.
 */
function quote(text: string): string {
  return JSON.stringify(text).replace(
    /[\u007f-\u009f\u2028\u2029\ufeff\ufffe\uffff]/g,
    (character) => `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`,
  )
}
