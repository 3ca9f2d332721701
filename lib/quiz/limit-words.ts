import { formatList } from '@/lib/format/list'
import { formatMoney } from '@/lib/format/money'
import { formatExact, formatNumber, formatUnit, THIN_SPACE } from '@/lib/format/number'
import type { EditionDevice, Limit, Limits } from '@/lib/method/types'
import type { SWITCH_NAMES } from './words'

/** What each limit is called, in the middle of a sentence. */
export const LIMIT_NAMES: Record<Limit, string> = {
  budget: 'your budget',
  minDiagonal: 'the smallest size',
  maxDiagonal: 'the largest size',
  maxWeight: 'the greatest weight',
  pen: 'the pen',
  colour: 'colour',
  frontLight: 'the front light',
  water: 'water',
  pageButtons: 'page buttons',
  onSale: 'being on sale',
  lending: 'library books',
  speech: 'reading aloud',
  formats: 'file formats',
}

/** The water codes worth asking for, IEC 60529, second digit; of new devices in fresh water. */
export const WATER_CODES = [
  { digit: 4, words: 'Splashes (IPX4)' },
  { digit: 7, words: 'Dropped in, 1 m for half an hour (IPX7)' },
  { digit: 8, words: 'Under water for longer (IPX8)' },
] as const

const HAS: Record<keyof typeof SWITCH_NAMES, readonly [without: string, having: string]> = {
  pen: ['takes no pen', 'takes a pen'],
  colour: ['is not in colour', 'is in colour'],
  frontLight: ['has no front light', 'has a front light'],
  pageButtons: ['has no page buttons', 'has page buttons'],
  onSale: ['is no longer on sale', 'is still on sale'],
  lending: ['cannot borrow from public libraries', 'can borrow from public libraries'],
  speech: ['does not read aloud', 'reads aloud'],
}

const inches = (by: number) => `${formatExact(Number(by.toFixed(2)))}${THIN_SPACE}in`

/**
 * How a device fails one limit, with the amount: "is 0.8 in too small". A predicate to stand after the device's name.
 * @param device known to fail it
 */
export function missWords(limit: Limit, device: EditionDevice, limits: Limits): string {
  switch (limit) {
    case 'budget': {
      const price = device.price!
      const over = formatMoney({ ...price, amount: price.amount - limits.budget! })
      return `costs ${formatMoney(price)}, ${over} over your budget`
    }
    case 'minDiagonal':
      return `is ${inches(limits.minDiagonal! - device.diagonal!)} too small`
    case 'maxDiagonal':
      return `is ${inches(device.diagonal! - limits.maxDiagonal!)} too large`
    case 'maxWeight':
      return `is ${formatUnit(Math.max(1, device.weight! - limits.maxWeight!), 'g')} too heavy`
    case 'water':
      return device.water
        ? `is rated IPX${device.water}, and you asked for ${limits.water}`
        : 'has no rating for water at all'
    case 'formats': {
      const known = device.formats!.map((format) => format.toUpperCase())
      const missing = limits.formats!.filter((format) => !known.includes(format.toUpperCase()))
      return `does not open ${formatList(missing)}`
    }
    default:
      return HAS[limit][limits[limit] ? 0 : 1]
  }
}

/** Why the limits leave a device out, every failed limit with its amount. */
export function whyExcluded(failed: readonly Limit[], device: EditionDevice, limits: Limits): string {
  return formatList(failed.map((limit) => missWords(limit, device, limits)))
}

/** How many devices each limit leaves out, most first: "your budget (5)". A device may fail several. */
export function toll(excluded: readonly { failed: readonly Limit[] }[]): string[] {
  const counts = new Map<Limit, number>()
  for (const { failed } of excluded) for (const limit of failed) counts.set(limit, (counts.get(limit) ?? 0) + 1)
  return [...counts]
    .sort(([, one], [, other]) => other - one)
    .map(([limit, count]) => `${LIMIT_NAMES[limit]} (${formatNumber(count)})`)
}
