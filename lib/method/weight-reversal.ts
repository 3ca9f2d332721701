import { METHOD } from './constants'

/** Below this, in points of fit and in weight, a lead or a stretch of weights is rounding: they touch, none overtakes. */
export const TOUCHING = METHOD.changes.touching.value

/**
 * The nearest value of one weight beyond which the option `runner` is ahead of the option `leader` and nobody is ahead
 * of it, while the other weights keep their proportions. Each rival leaves a half-line of weights; the answer is the
 * near end of what all of them leave within [0, 1]. Meeting only at an end, or in one point, is a tie and no overtake.
 * Where the weight is 1 the others have no proportions, and share what is given up equally.
 * @param weights summing to 1
 * @param points of each option for each weight: its total is Σ weight·points
 * @returns the new weight, which is the present one where the two are level and any move decides; null where none does
 */
export function weightReversal(
  weights: readonly number[],
  points: readonly (readonly number[])[],
  moved: number,
  leader: number,
  runner: number,
): number | null {
  const now = weights[moved]!
  const rest = weights.map((weight, j) => (j === moved ? 0 : now < 1 ? weight / (1 - now) : 1 / (weights.length - 1)))
  /** The runner's lead over a rival at weight v is atZero + (atOne − atZero)·v. */
  const lead = (rival: number) => {
    const ahead = points[runner]!.map((own, j) => own - points[rival]![j]!)
    return { atZero: ahead.reduce((sum, d, j) => sum + rest[j]! * d, 0), atOne: ahead[moved]! }
  }

  let from = 0
  let to = 1
  for (let rival = 0; rival < points.length; rival++) {
    if (rival === runner) continue
    const { atZero, atOne } = lead(rival)
    const [behindAtZero, behindAtOne] = [atZero < -TOUCHING, atOne < -TOUCHING]
    if (behindAtZero && behindAtOne) return null
    // At the crossing v the lead is 0: v = atZero / (atZero − atOne).
    if (behindAtZero) from = Math.max(from, Math.min(atZero / (atZero - atOne), 1))
    else if (behindAtOne) to = Math.min(to, Math.max(atZero / (atZero - atOne), 0))
  }
  if (to - from <= TOUCHING) return null
  // Straight in v, so ahead of the leader somewhere between means ahead at one of the ends.
  const { atZero, atOne } = lead(leader)
  const leadAt = (v: number) => atZero + (atOne - atZero) * v
  if (Math.max(leadAt(from), leadAt(to)) <= TOUCHING) return null
  return Math.min(Math.max(now, from), to)
}
