import { formatList } from '@/lib/format/list'
import { formatLux, formatTimes, formatUnit } from '@/lib/format/number'
import { METHOD } from '@/lib/method/constants'
import type { LitRow, Reading } from './ranking'

const { spotReading } = METHOD.reserve

/** What each reserve lets one read, for a table. */
export const READING_WORDS: Record<Reading, string> = {
  unseen: 'nothing: ink and page look the same',
  'too-little': 'too little to read',
  spot: 'spot reading',
  fluent: 'fluent reading',
  easiest: 'easiest reading',
}

/** Whether anything can be read: from 3 times what the eye needs. */
export function canBeRead({ reading }: Pick<LitRow, 'reading'>): boolean {
  return reading !== 'unseen' && reading !== 'too-little'
}

export const FRONT_LIGHT_WORDS: Record<LitRow['frontLight'], string> = {
  on: 'front light on',
  'not-needed': 'front light not needed',
  none: 'no front light',
  unstated: 'front light not stated, counted as none',
  off: '',
}

/** A place among the pages, or the places of the group it shares; what cannot be read has none. */
export function placeInWords({ places: [first, last], reading }: Pick<LitRow, 'places' | 'reading'>): string {
  if (!canBeRead({ reading })) return 'cannot be read'
  return first === last ? `${first}` : `${first}–${last}, too close to call`
}

const MOST_NAMES = 4

function names(rows: readonly LitRow[]): string {
  const all = rows.map(({ device }) => device.name)
  return all.length <= MOST_NAMES ? formatList(all) : formatList([...all.slice(0, 3), `${all.length - 3} more`])
}

/** Which pages keep the most contrast in this light, with their tie; or that nothing can be read. */
export function orderInWords(rows: readonly LitRow[], lux: number): string {
  const [best] = rows
  if (!best) return 'No page is chosen.'
  const light = `at about ${formatLux(lux)} lux`
  if (best.reading === 'unseen') {
    return rows.length === 1
      ? `Nothing can be read on this page ${light}: its ink cannot be told from its page.`
      : `Nothing can be read on any of these pages ${light}: their ink cannot be told from their page.`
  }
  if (best.reading === 'too-little') {
    return `None of these pages keeps the ${formatUnit(spotReading.value, 'times')} what your eyes need that reading takes ${light}.`
  }
  const unread = rows.filter((row) => !canBeRead(row)).length
  const rest = unread === 0 ? '' : ` ${unread} of the ${rows.length} cannot be read there.`
  const first = rows.filter(({ places }) => places[0] === 1)
  if (rows.length === 1)
    return `${best.device.name} keeps ${formatTimes(best.reserve)} the contrast your eyes need ${light}.`
  if (first.length === 1) {
    return `${best.device.name} keeps the most contrast ${light}, ${formatTimes(best.reserve)} what your eyes need.${rest}`
  }
  const least = first.at(-1)!
  const [low, high] = [formatTimes(least.reserve), formatTimes(best.reserve)]
  const range = low === high ? high : `${low} to ${high}`
  return `${names(first)} keep the most contrast ${light}, ${range} what your eyes need: too close to call.${rest}`
}
