import type { PublishedFigures } from '@/lib/findings/published'
import type { EditionDevice } from '@/lib/method/types'
import { CURRENCY } from './currency'

export type DeviceRow = { device: EditionDevice; figures: PublishedFigures }

export const ORDERS = ['ascending', 'descending'] as const
export type Order = (typeof ORDERS)[number]

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
  weight: { words: 'weight', first: 'ascending', value: ({ device }) => device.weight },
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
    value: ({ device: { price } }) => (price?.currency === CURRENCY ? price.amount : null),
  },
} satisfies Record<string, SortBy>
export type SortKey = keyof typeof SORTS
export type Sort = { by: SortKey; order: Order }

/** Lightness unless asked otherwise; never whiteness, which on grey pages is mostly blueness. */
const DEFAULT_SORT: SortKey = 'lightness'

/** The order asked for; what is not said is the lightest first, and of any other the order one most likely wants. */
export function sortFor({ sort = DEFAULT_SORT, order = SORTS[sort].first }: { sort?: SortKey; order?: Order }): Sort {
  return { by: sort, order }
}

/** What an address must say to get this order: nothing of what is understood without saying. */
export function sortInAddress({ by, order }: Sort): { sort?: SortKey; order?: Order } {
  return {
    ...(by === DEFAULT_SORT ? {} : { sort: by }),
    ...(order === SORTS[by].first ? {} : { order }),
  }
}

/** The order a head leads to: by this; by what the list is ordered by already, the other way round. */
export function nextSort(now: Sort, by: SortKey): Sort {
  if (now.by !== by) return sortFor({ sort: by })
  return { by, order: now.order === 'ascending' ? 'descending' : 'ascending' }
}

export function sortRows<Row extends DeviceRow>(rows: readonly Row[], { by, order }: Sort): Row[] {
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
