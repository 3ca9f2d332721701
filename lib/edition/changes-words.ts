import { formatList } from '@/lib/format/list'
import { formatDiagonal, formatMass } from '@/lib/format/measures'
import { formatMoney } from '@/lib/format/money'
import { formatDoubt, formatExact, formatNumber, formatUnit } from '@/lib/format/number'
import type { Units } from '@/lib/look'
import type { EditionDevice } from '@/lib/method/types'
import { SAME_FIT } from '@/lib/quiz/thresholds'
import type { DeviceChange } from './changes'
import { FACT_NAMES, type FactName } from './changes-facts'
import { COMPARED, type MovedFigure } from './changes-figures'
import type { Move } from './changes-ranks'

const yesNo = (value: boolean) => (value ? 'yes' : 'no')

/** What an edition says of one fact, for reading; what nobody states is said to be so. */
export function factWords(device: EditionDevice, fact: FactName, units: Units): string {
  const value = device[fact]
  if (value === null) return 'not stated'
  if (typeof value === 'boolean') return yesNo(value)
  switch (fact) {
    case 'frontLight': {
      const { max, min } = device.frontLight as { max: number; min: number | null }
      const least = min === null ? 'least not stated' : `least ${formatUnit(min, 'cd/m²', 2)}`
      return `at most ${formatUnit(max, 'cd/m²', 1)}, ${least}`
    }
    case 'diagonal':
      return formatDiagonal(value as number, units)
    case 'weight':
      return formatMass(value as number, units)
    case 'ppi':
      return formatUnit(value as number, 'ppi')
    case 'price':
      return formatMoney(device.price!)
    case 'water':
      return value === 0 ? 'none' : `IPX${value}`
    case 'formats':
      return device.formats!.length > 0 ? device.formats!.join(', ') : 'none'
    default:
      return typeof value === 'number' ? formatExact(value) : String(value)
  }
}

const MOST_DECIMALS = 4

/** A figure before and after with its decimals as published, and more where two different numbers would read the same. */
export function movedWords({ figure, before, after, doubt }: MovedFigure) {
  const { decimals } = COMPARED[figure]
  const shown = fewest(decimals, (n) => formatNumber(before, n) !== formatNumber(after, n))
  const difference = after - before
  const finer = fewest(Math.max(shown, 1), (n) => Number(difference.toFixed(n)) !== 0)
  return {
    before: formatNumber(before, shown),
    after: formatNumber(after, shown),
    difference: `${difference > 0 ? '+' : ''}${formatNumber(difference, finer)}`,
    doubt: formatDoubt(doubt, finer),
  }
}

/** The fewest decimals from a number on that will do, at most four. */
function fewest(from: number, enough: (decimals: number) => boolean): number {
  let decimals = from
  while (decimals < MOST_DECIMALS && !enough(decimals)) decimals += 1
  return decimals
}

const MOST_NAMED = 4

/**
 * Why a device stands where it does in the newer ranking, each reason a sentence. The first speaks of the device itself,
 * the others of those that came, went or changed around it.
 * @param change what differs of the device itself; undefined where nothing does
 * @param corrected whether a correction put right in this edition is about it
 */
export function moveReasons(
  move: Move,
  change: DeviceChange | undefined,
  corrected: boolean,
  nameOf: (slug: string) => string,
): string[] {
  const { before, after } = move
  if (!before) return ['New in this edition.']
  if (!after) return ['No longer in the edition.']
  const reasons: string[] = []
  const step = after.fit - before.fit
  if (change && Math.abs(step) >= SAME_FIT) reasons.push(`${ownCause(change, corrected)} ${fitWords(step)}`)
  const say = (slugs: string[], one: string, many: string) => {
    if (slugs.length > 0) reasons.push(`${named(slugs, nameOf)} ${slugs.length === 1 ? one : many}.`)
  }
  say(move.addedAbove, 'is new above it', 'are new above it')
  say(move.withdrawnAbove, 'stood above it and is no longer there', 'stood above it and are no longer there')
  say(move.passedBy, 'passed it', 'passed it')
  if (move.passed.length > 0) reasons.push(`It passed ${named(move.passed, nameOf)}.`)
  if (reasons.length === 0) reasons.push('Its fit is the same; the doubts, or the devices next to it, changed.')
  return reasons
}

function ownCause({ figures, facts }: DeviceChange, corrected: boolean): string {
  if (facts.some(({ fact }) => fact === 'revision')) return 'Another revision was measured.'
  if (corrected) return 'Its figures were corrected.'
  const stated = facts.filter(({ ofTheFit }) => ofTheFit).map(({ fact }) => FACT_NAMES[fact].toLowerCase())
  if (figures.length > 0 && stated.length > 0)
    return `Readings added or withdrawn since moved its figures, and what is stated of it changed: ${formatList(stated)}.`
  if (stated.length > 0) return `What is stated of it changed: ${formatList(stated)}.`
  return 'Readings added or withdrawn since moved its figures.'
}

function fitWords(step: number): string {
  const points = formatNumber(Math.abs(step), 1)
  return `Its fit is ${points} ${points === '1.0' ? 'point' : 'points'} ${step > 0 ? 'higher' : 'lower'}.`
}

function named(slugs: readonly string[], nameOf: (slug: string) => string): string {
  const names = slugs.slice(0, MOST_NAMED).map(nameOf)
  const more = slugs.length - names.length
  return formatList(more > 0 ? [...names, `${more} more`] : names)
}
