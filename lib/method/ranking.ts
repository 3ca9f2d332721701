import { METHOD } from './constants'
import { drawFits } from './draws'
import { type Prepared, prepareAnswers, scoreDevice } from './fit'
import { applyLimits, type LimitsApplied } from './limits'
import { byFit } from './order'
import { wouldChange } from './sensitivity'
import { rankDraws, tooClose } from './tally'
import type { Answers, Edition, EditionDevice, MatchAnswer, ScoredDevice } from './types'

/** A ranking without draws: quick enough to follow a reader's hand. */
export type PointRanking = Pick<MatchAnswer, 'edition' | 'method' | 'weights' | 'multipliers'> & {
  ranked: ScoredDevice[]
} & Pick<LimitsApplied, 'excluded' | 'nearMisses'>

/** The ranking of an edition for one reader, by point values alone. */
export function rankByFit(edition: Edition, answers: Answers): PointRanking {
  return rank(edition, answers, prepareAnswers(answers)).ranking
}

/**
 * The whole answer for one reader: ranking, doubts, ties, limits, and what would change it. Where no device is left the
 * ranking is empty and the rest still stands. The same question on the same edition always has the same answer.
 * @param options.draws of the Monte Carlo; fewer than 4,000 are for tests only
 */
export function match(
  edition: Edition,
  answers: Answers,
  { draws = METHOD.ties.draws.value }: { draws?: number } = {},
): Omit<MatchAnswer, 'assumed'> {
  if (!(Number.isInteger(draws) && draws > 0))
    throw new RangeError(`draws must be a whole number above 0, got ${draws}`)
  const prepared = prepareAnswers(answers)
  const { ranking, devices } = rank(edition, answers, prepared)
  const fits = drawFits(devices, edition, prepared, draws)
  const tallies = rankDraws(fits, devices.length, draws)
  const ties = tooClose(fits, devices.length, draws)
  const slugs = devices.map((device) => device.slug)
  return {
    ...ranking,
    ranked: ranking.ranked.map(({ notStated, ...scored }, i) => ({
      ...scored,
      ...tallies[i]!,
      tiedWith: ties[i]!.map((j) => slugs[j]!),
      notStated,
    })),
    wouldChange: wouldChange({ ...ranking, edition, answers, prepared, devices }),
  }
}

/** The point ranking, and the devices of its rows in the same order. */
function rank(edition: Edition, answers: Answers, prepared: Prepared) {
  const applied = applyLimits(edition.devices, answers.limits)
  const rows = applied.left.map(({ device, notStated }) => {
    const scored = scoreDevice(device, prepared)
    return {
      device,
      scored: { slug: device.slug, ...scored, notStated: [...new Set([...scored.notStated, ...notStated])] },
    }
  })
  rows.sort((one, other) => byFit(one.scored, other.scored))
  const ranking: PointRanking = {
    edition: edition.number,
    method: edition.method,
    weights: prepared.weights,
    multipliers: prepared.multipliers,
    ranked: rows.map((row) => row.scored),
    excluded: applied.excluded,
    nearMisses: applied.nearMisses,
  }
  const devices: EditionDevice[] = rows.map((row) => row.device)
  return { ranking, devices }
}
