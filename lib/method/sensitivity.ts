import { changeByBudget } from './budget-change'
import type { Prepared } from './fit'
import { changeByHours } from './hours-change'
import {
  AIMS,
  type Answers,
  type Edition,
  type EditionDevice,
  type NearMiss,
  type ScoredDevice,
  type WouldChange,
} from './types'
import { weightReversal } from './weight-reversal'

export type Standing = {
  edition: Edition
  answers: Answers
  prepared: Prepared
  /** Devices left after the limits, in ranked order, and their scores in the same order. */
  devices: readonly EditionDevice[]
  ranked: readonly ScoredDevice[]
  nearMisses: readonly NearMiss[]
}

/** What would change first place: one weight, hours between two spots, a higher budget. Method 1, section 7. */
export function wouldChange(standing: Standing): WouldChange {
  return {
    weights: changeByWeight(standing.prepared, standing.ranked),
    hours: changeByHours(standing.prepared, standing.devices),
    budget: changeByBudget(standing),
  }
}

/** For each aim the smallest change of its final weight that puts the runner-up first. */
function changeByWeight({ weights }: Prepared, ranked: readonly ScoredDevice[]): WouldChange['weights'] {
  const runner = ranked[1]
  const points = ranked.map((device) => AIMS.map((aim) => 100 * (1 - device.unreadable) * device.scores[aim]))
  const now = AIMS.map((aim) => weights[aim])
  return AIMS.map((aim, i) => {
    const to = runner ? weightReversal(now, points, i, 0, 1) : null
    return { aim, from: weights[aim], to, first: to === null ? null : runner!.slug }
  })
}
