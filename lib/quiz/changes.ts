import { formatMoney } from '@/lib/format/money'
import { formatNumber, formatUnit } from '@/lib/format/number'
import type { Limits, WouldChange } from '@/lib/method/types'
import type { NamedSpot } from './request'
import { AIM_PHRASES } from './words'

export type ChangeContext = {
  spots: readonly Pick<NamedSpot, 'name'>[]
  limits: Limits
  /** Devices ranked: where there is but one, nothing can change places with it. */
  devices: number
  nameOf: (slug: string) => string
}

/** What would put another device first, a sentence each. Every kind of change asked for is answered, with no too. */
export function changeSentences({ weights, hours, budget }: WouldChange, context: ChangeContext): string[] {
  const { spots, limits, devices, nameOf } = context
  const sentences = devices < 2 ? [] : [...weightSentences(weights, nameOf), hoursSentence(hours, spots, nameOf)]
  const { currency } = limits
  if (limits.budget !== undefined && currency) {
    sentences.push(
      budget
        ? `With ${formatMoney({ amount: budget.amount - limits.budget, currency })} more to spend (${formatMoney({ amount: budget.amount, currency })}), ${nameOf(budget.first)} would come first.`
        : 'No higher budget changes first place.',
    )
  }
  return sentences.filter((sentence) => sentence !== '')
}

function weightSentences(weights: WouldChange['weights'], nameOf: (slug: string) => string): string[] {
  const sentences = weights.flatMap(({ aim, from, to, first }) => {
    if (to === null || first === null) return []
    const [before, after] = apart(100 * from, 100 * to)
    if (before === after)
      return [`The least change in how much ${AIM_PHRASES[aim]} counts puts ${nameOf(first)} first.`]
    return [`If ${AIM_PHRASES[aim]} counted ${after} of 100 instead of ${before}, ${nameOf(first)} would come first.`]
  })
  return sentences.length > 0 ? sentences : ['No change in how much one aim counts puts the runner-up first.']
}

/** Empty where there is only one spot to read in. */
function hoursSentence(
  change: WouldChange['hours'],
  spots: ChangeContext['spots'],
  nameOf: (slug: string) => string,
): string {
  if (!change)
    return spots.length > 1 ? 'Moving hours from one of your spots to another would not change first place.' : ''
  const hours = formatUnit(change.hours, 'h', Number.isInteger(change.hours) ? 0 : 1)
  const [from, to] = [spots[change.from]?.name, spots[change.to]?.name]
  return `If ${hours} a week moved from “${from}” to “${to}”, ${nameOf(change.first)} would come first.`
}

/** Two numbers with as many decimals, up to two, as it takes to tell them apart. */
function apart(one: number, other: number): [string, string] {
  const decimals = [0, 1, 2].find((places) => formatNumber(one, places) !== formatNumber(other, places)) ?? 2
  return [formatNumber(one, decimals), formatNumber(other, decimals)]
}
