import { type Prepared, scoreDevice } from './fit'
import { byFit } from './order'
import type { Answers, Edition, NearMiss, ScoredDevice, WouldChange } from './types'
import { TOUCHING } from './weight-reversal'

/**
 * The lowest higher budget that changes first place. Only devices that fail nothing but the budget can come in by it,
 * and each has its fit whoever else is there. Where nothing was left, the first to come in is first.
 * @returns the price in the minor units of the reader's currency; null where no budget does it
 */
export function changeByBudget({
  edition,
  answers,
  prepared,
  ranked,
  nearMisses,
}: {
  edition: Edition
  answers: Answers
  prepared: Prepared
  ranked: readonly ScoredDevice[]
  nearMisses: readonly NearMiss[]
}): WouldChange['budget'] {
  const { budget } = answers.limits
  if (budget === undefined) return null
  const toBeat = ranked[0] ? ranked[0].fit + TOUCHING : Number.NEGATIVE_INFINITY
  const dearer = new Set(nearMisses.filter(({ limit }) => limit === 'budget').map(({ slug }) => slug))
  const [cheapest] = edition.devices
    .filter((device) => dearer.has(device.slug))
    .map((device) => ({ slug: device.slug, amount: device.price!.amount, fit: scoreDevice(device, prepared).fit }))
    .filter(({ fit }) => fit > toBeat)
    .sort((one, other) => one.amount - other.amount || byFit(one, other))
  return cheapest ? { amount: cheapest.amount, first: cheapest.slug } : null
}
