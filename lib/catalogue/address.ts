import { clip } from '@/lib/contract/shown'
import { CATALOGUE_KEYS, type CatalogueKey } from './keys'
import { type CatalogueQuery, catalogueSchema } from './schema'
import { sortFor, sortInAddress } from './sort'
import { LABELS } from './words'

export type Pair = readonly [name: string, text: string]

/** An address read: what was understood, what was not, in words, and the texts as they stood. */
export type CatalogueAddress = {
  query: CatalogueQuery
  problems: { key: CatalogueKey; message: string }[]
  texts: ReadonlyMap<CatalogueKey, string>
  /** Names that mean nothing here; they do no harm and are left out. */
  unknown: string[]
}

const MOST_UNKNOWN = 5
/** Kept of a text, characters. */
const LONGEST_TEXT = 2000

const isKey = (name: string): name is CatalogueKey => (CATALOGUE_KEYS as readonly string[]).includes(name)

/** The pairs of an address as Next hands them to a page. */
export function pairsFrom(search: Record<string, string | string[] | undefined>): Pair[] {
  return Object.entries(search).flatMap(([name, value]) =>
    (Array.isArray(value) ? value : [value ?? '']).map((text): Pair => [name, text]),
  )
}

/**
 * Reads what an address or a form asks of the catalogue, tolerantly: blanks ask nothing, unknown names are left out, and
 * what is not understood comes back in words while everything else still counts. Never throws.
 */
export function readCatalogue(pairs: Iterable<Pair>): CatalogueAddress {
  const problems: CatalogueAddress['problems'] = []
  const unknown = new Set<string>()
  const given = new Map<CatalogueKey, string[]>()
  for (const [name, text] of pairs) {
    if (isKey(name)) {
      if (text.trim() !== '') given.set(name, [...(given.get(name) ?? []), text.slice(0, LONGEST_TEXT)])
    } else if (unknown.size < MOST_UNKNOWN) unknown.add(clip(name))
  }
  const texts = new Map<CatalogueKey, string>()
  for (const [key, all] of given) {
    // Boxes of one name are how a form gives a list.
    const different = key === 'maker' ? [all.join(',')] : [...new Set(all)]
    if (different.length > 1) problems.push({ key, message: `${LABELS[key]}: it is given twice; give it once.` })
    else texts.set(key, different[0]!)
  }
  const rest = new Map(texts)
  for (;;) {
    const parsed = catalogueSchema.safeParse(Object.fromEntries(rest))
    if (parsed.success) return { query: tidy(parsed.data), problems, texts, unknown: [...unknown] }
    for (const { path, message } of parsed.error.issues) {
      const key = path[0] as CatalogueKey
      problems.push({ key, message: `${LABELS[key]}: ${message.startsWith('is ') ? 'it ' : ''}${message}.` })
      rest.delete(key)
    }
  }
}

/** Makers in the order of the alphabet and spaces made single, so that the same question has one address. */
function tidy({ maker, q, ...rest }: CatalogueQuery): CatalogueQuery {
  const search = q?.replace(/\s+/g, ' ')
  return { ...rest, ...(maker?.length && { maker: maker.toSorted() }), ...(search && { q: search }) }
}

/** The one address of a list, as short as can be: nothing of what is understood without saying. */
export function catalogueHref(query: CatalogueQuery): string {
  const { sort, order, page, ...filters } = query
  const said: CatalogueQuery = {
    ...filters,
    ...sortInAddress(sortFor({ sort, order })),
    page: page === 1 ? undefined : page,
  }
  const search = new URLSearchParams()
  for (const key of CATALOGUE_KEYS) {
    const text = written(key, said)
    if (text) search.set(key, text)
  }
  const words = search.toString().replaceAll('%2C', ',')
  return words ? `/devices?${words}` : '/devices'
}

function written(key: CatalogueKey, query: CatalogueQuery): string {
  const value = query[key]
  if (value === undefined) return ''
  if (key === 'max-price') return String(Number(value) / 100)
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  return String(value)
}

/** Whether an address is already written as its canonical form. */
export function isWrittenAs(href: string, pairs: readonly Pair[]): boolean {
  return JSON.stringify(pairs) === JSON.stringify([...new URLSearchParams(href.split('?')[1] ?? '')])
}
