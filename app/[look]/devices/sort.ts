import { DEFAULT_CURRENCY } from '@/lib/contract/complete-request'
import type { PublishedFigures } from '@/lib/findings/published'
import type { EditionDevice } from '@/lib/method/types'

export type DeviceRow = { device: EditionDevice; figures: PublishedFigures }

type Order = 'ascending' | 'descending'
type SortBy = {
  /** As in "ordered by lightness". */
  words: string
  /** The order one most likely wants first: the lightest, the cheapest, the least tinted. */
  first: Order
  /** Null (not stated) comes last whichever the order. */
  value: (row: DeviceRow) => number | string | null
}

/** What the list can be ordered by; an address can ask for nothing else. */
export const SORTS = {
  lightness: { words: 'lightness', first: 'descending', value: ({ figures }) => figures.lightness.value },
  name: { words: 'name', first: 'ascending', value: ({ device }) => device.name },
  size: { words: 'size', first: 'ascending', value: ({ device }) => device.diagonal },
  colour: {
    words: 'colour',
    first: 'ascending',
    value: ({ device }) => (device.colour === null ? null : Number(device.colour)),
  },
  'front-light': {
    words: 'front light',
    first: 'descending',
    value: ({ device: { frontLight } }) => (frontLight ? frontLight.max : frontLight === false ? 0 : null),
  },
  whiteness: { words: 'whiteness', first: 'descending', value: ({ figures }) => figures.whiteness.value },
  tint: { words: 'tint', first: 'ascending', value: ({ figures }) => Math.abs(figures.tint.value) },
  chroma: { words: 'chroma', first: 'ascending', value: ({ figures }) => figures.chroma.value },
  contrast: { words: 'contrast', first: 'descending', value: ({ figures }) => figures.contrast.value },
  // Prices in another currency cannot be compared, and come last.
  price: {
    words: 'price',
    first: 'ascending',
    value: ({ device: { price } }) => (price?.currency === DEFAULT_CURRENCY ? price.amount : null),
  },
} satisfies Record<string, SortBy>
export type SortKey = keyof typeof SORTS
export type Sort = { by: SortKey; order: Order }

const isKey = (text: unknown): text is SortKey => typeof text === 'string' && Object.hasOwn(SORTS, text)

/** The order an address asks for, `?sort=price&order=descending`; the lightest first where it asks for none we know. */
export function parseSort({ sort, order }: Record<string, string | string[] | undefined>): Sort {
  const by = isKey(sort) ? sort : 'lightness'
  return { by, order: order === 'ascending' || order === 'descending' ? order : SORTS[by].first }
}

/** The address of the list ordered by this; by what it is ordered by already, the other way round. */
export function sortHref(now: Sort, by: SortKey): string {
  if (now.by !== by) return `/devices?sort=${by}`
  return `/devices?sort=${by}&order=${now.order === 'ascending' ? 'descending' : 'ascending'}`
}

export function sortRows(rows: readonly DeviceRow[], { by, order }: Sort): DeviceRow[] {
  const sign = order === 'ascending' ? 1 : -1
  const { value }: SortBy = SORTS[by]
  return [...rows].sort((one, other) => {
    const [a, b] = [value(one), value(other)]
    const slugs = one.device.slug < other.device.slug ? -1 : 1
    if (a === null || b === null) return a === b ? slugs : a === null ? 1 : -1
    return sign * compare(a, b) || slugs
  })
}

function compare(a: number | string, b: number | string): number {
  return typeof a === 'string' && typeof b === 'string' ? a.localeCompare(b, 'en-GB') : Number(a) - Number(b)
}
