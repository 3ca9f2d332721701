import type { Work } from './work'

const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec']

/**
 * A BibTeX entry. `@misc`, which every style knows; `@dataset` is of biblatex alone. Names and title stand in double
 * braces, so that no style splits an organisation's name or lowers a device's capitals. Letters outside ASCII stay as
 * they are, in UTF-8.
 */
export function citationBibtex({ authors, title, edition, publishedOn, url, licence }: Work): string {
  const [year = '', month = ''] = publishedOn.split('-')
  const note = [`Edition ${edition}`, `released ${publishedOn}`, ...(licence ? [`licence ${licence}`] : [])].join(', ')
  const fields = [
    ['author', `{${authors.map((name) => `{${escapeTex(name)}}`).join(' and ')}}`],
    ['title', `{{${escapeTex(title)}}}`],
    ['year', `{${year}}`],
    ['month', MONTHS[Number(month) - 1] ?? '{}'],
    ['note', `{${escapeTex(note)}}`],
    ['url', `{${escapeUrl(url)}}`],
  ]
  const lines = fields.map(([name, value]) => `  ${name} = ${value}`).join(',\n')
  return `@misc{${keyOf(authors[0] ?? '', edition, title)},\n${lines}\n}\n`
}

/** A key of letters, digits and hyphens only: these need no escape in any style. */
function keyOf(...parts: (string | number)[]): string {
  return parts
    .join('-')
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{M}+/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
}

/**
 * The ten characters that mean something to TeX, as text. Braces go by their names: BibTeX counts them without minding
 * a backslash before, so an escaped one standing alone would end the field too early.
 */
const TEX: Record<string, string> = {
  '\\': '\\textbackslash{}',
  '{': '\\textbraceleft{}',
  '}': '\\textbraceright{}',
  '~': '\\textasciitilde{}',
  '^': '\\textasciicircum{}',
  '&': '\\&',
  '%': '\\%',
  $: '\\$',
  '#': '\\#',
  _: '\\_',
}

function escapeTex(text: string): string {
  return text.replace(/[\s\p{Cc}]+/gu, ' ').replace(/[\\{}~^&%$#_]/g, (character) => TEX[character] ?? character)
}

/** An address is set verbatim, but a brace or a backslash in it would still break the field. */
function escapeUrl(url: string): string {
  return url.replace(/[\\{}\s]/g, encodeURIComponent)
}
