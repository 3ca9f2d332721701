import { formatList } from '@/lib/format/list'
import { formatDiagonal, formatMass } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatNumber, formatUnit, THIN_SPACE } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import type { EditionDevice } from '@/lib/method/types'

/** One fact of several devices, in words; null is "not stated". */
export type SpecRow = { key: string; name: string; values: (string | null)[] }

type Words = (device: EditionDevice, units: Units) => string | null

const FACTS: Record<string, { name: string; words: Words }> = {
  price: {
    name: 'Price',
    words: ({ price, onSale }) => (price ? formatMoney(price) : onSale === false ? 'none: no longer on sale' : null),
  },
  onSale: { name: 'On sale', words: yesNo('onSale') },
  diagonal: {
    name: 'Size of the page',
    words: ({ diagonal }, units) => (diagonal === null ? null : formatDiagonal(diagonal, units)),
  },
  weight: { name: 'Weight', words: ({ weight }, units) => (weight === null ? null : formatMass(weight, units)) },
  ppi: { name: 'Sharpness', words: ({ ppi }) => (ppi === null ? null : formatUnit(ppi, 'ppi')) },
  colour: { name: 'Colour', words: yesNo('colour') },
  pen: { name: 'Pen', words: yesNo('pen') },
  frontLight: { name: 'Front light', words: ({ frontLight }) => lightWords(frontLight) },
  water: {
    name: 'Water resistance',
    words: ({ water }) => (water === null ? null : water === 0 ? 'none' : `IPX${water}`),
  },
  pageButtons: { name: 'Page buttons', words: yesNo('pageButtons') },
  lending: { name: 'Books from public libraries', words: yesNo('lending') },
  speech: { name: 'Reading aloud', words: yesNo('speech') },
  formats: { name: 'File formats', words: ({ formats }) => formats && formatList([...formats].sort()) },
  units: {
    name: 'Units measured',
    words: ({ units, provisional }) => (provisional ? `${formatNumber(units)}, provisional` : formatNumber(units)),
  },
}

function yesNo(field: 'onSale' | 'colour' | 'pen' | 'pageButtons' | 'lending' | 'speech'): Words {
  return ({ [field]: has }) => (has === null ? null : has ? 'yes' : 'no')
}

function lightWords(light: EditionDevice['frontLight']): string | null {
  if (light === null) return null
  if (light === false || light.max === 0) return 'none'
  const most = `to ${formatNumber(light.max)}`
  return `${light.min === null ? most : `${formatExact(light.min)} ${most}`}${THIN_SPACE}cd/m²`
}

/** The facts of some devices: those that differ, and those that are the same of all. What one does not state differs. */
export function specRows(devices: readonly EditionDevice[], units: Units): { differ: SpecRow[]; same: SpecRow[] } {
  const rows = Object.entries(FACTS).map(([key, { name, words }]) => ({
    key,
    name,
    values: devices.map((device) => words(device, units)),
  }))
  const alike = ({ values }: SpecRow) => new Set(values).size === 1
  return { differ: rows.filter((row) => !alike(row)), same: rows.filter(alike) }
}
