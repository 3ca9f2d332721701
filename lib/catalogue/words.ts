import { formatDiagonal, formatMass } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import type { Units } from '@/lib/look'
import { CURRENCY } from './currency'
import type { FilterInForce } from './filters'
import type { CatalogueKey } from './keys'

/** What the form and the messages call each parameter. */
export const LABELS: Record<CatalogueKey, string> = {
  q: 'Find a device',
  maker: 'Maker',
  'min-size': 'Size from',
  'max-size': 'Size up to',
  'max-price': 'Price up to',
  'max-weight': 'Weight up to',
  pen: 'Pen',
  colour: 'Colour',
  'front-light': 'Front light',
  water: 'Safe in water',
  'on-sale': 'On sale',
  sort: 'Order by',
  order: 'Order',
  page: 'Page',
}

/** Filters with two sides: what a device lacks, and what it has. */
export const SIDES = {
  pen: ['without a pen', 'with a pen'],
  colour: ['without colour', 'in colour'],
  'front-light': ['without a front light', 'with a front light'],
  'on-sale': ['no longer on sale', 'on sale'],
} as const
export type Side = keyof typeof SIDES

/** The facts a filter looks at, as they are said to be not stated. */
export const FACT_WORDS: Record<string, string> = {
  diagonal: 'size',
  price: 'price',
  weight: 'weight',
  pen: 'pen',
  colour: 'colour',
  frontLight: 'front light',
  water: 'water resistance',
  onSale: 'whether it is on sale',
}

/** A filter in force in a few words: "up to £250", "with a pen". */
export function filterWords(filter: FilterInForce, units: Units): string {
  switch (filter.key) {
    case 'q':
      return `“${filter.value}” in the name`
    case 'maker':
      return `by ${filter.name}`
    case 'min-size':
      return `${formatDiagonal(filter.value, units)} or larger`
    case 'max-size':
      return `${formatDiagonal(filter.value, units)} or smaller`
    case 'max-price':
      return `up to ${formatMoney({ amount: filter.value, currency: CURRENCY })}`
    case 'max-weight':
      return `up to ${formatMass(filter.value, units)}`
    case 'water':
      return filter.value === 0 ? 'rated for water or not' : `IPX${filter.value} or better`
    default:
      return SIDES[filter.key][filter.value ? 1 : 0]
  }
}
