import { lightnessToY } from '@/lib/colour/lab'
import { METHOD } from './constants'
import { BRIGHT_PAGE, clarityScore, DIM_PAGE, tintScore, whitenessScore, whiteOf } from './criteria'
import { type HandlingWish, handlingScore, handlingWish } from './handling'
import { frontLightMax } from './light'
import { questionText } from './question'
import { type Eye, eyeOf, fluency, reserveIn, SPOT_READING, type Surface } from './reserve'
import { AIMS, type Aim, type Answers, type EditionDevice, type ScoredDevice, type Spot } from './types'
import {
  aimWeights,
  type ByAim,
  byAim,
  finalWeights,
  lightMultipliers,
  normalised,
  type SpotPull,
  spotPull,
} from './weights'

/** A spot with hours, and what does not depend on the device: worked out once for a reader. */
export type PreparedSpot = {
  /** Place among the request's spots. */
  index: number
  lux: number
  hours: number
  /** η: hours of this spot over all hours; the shares sum to 1. */
  share: number
  frontLight: boolean
  /** ρ of the two reference pages. */
  rhoBright: number
  rhoDim: number
  pull: SpotPull
}

/** A reader's answers, ready to score any device. Limits are not in here: they do not score. */
export type Prepared = {
  spots: PreparedSpot[]
  eye: Eye
  white: { a: number; b: number }
  handling: HandlingWish
  /** Σ η(ρ_bright − ρ_dim). */
  claritySpan: number
  /** What `aims` alone give (or the weights set by hand), before the light. */
  aims: ByAim
  /** Final weights, summing to 1. */
  weights: ByAim
  multipliers: ByAim
  /** True where the weights were set by hand, so that the light does not multiply them. */
  byHand: boolean
  /** Canonical text of all that scores; it seeds the draws. */
  question: string
}

/**
 * Works out once what every device is scored with. Spots of 0 hours are dropped before anything else.
 * @throws RangeError where no hours remain, a number is outside its range, or aims or weights are not right
 */
export function prepareAnswers(answers: Answers): Prepared {
  const eye = eyeOf(answers.lightNeed, answers.text)
  const spots = prepareSpots(answers.spots, eye)
  const mean = (value: (spot: PreparedSpot) => number) => spots.reduce((sum, spot) => sum + spot.share * value(spot), 0)

  const byHand = answers.weights !== null
  const aims = answers.weights ? normalised(answers.weights) : aimWeights(answers.aims)
  const multipliers = byHand
    ? byAim(() => 1)
    : lightMultipliers({ gain: mean((s) => s.pull.gain), colourfulness: mean((s) => s.pull.colourfulness) })

  return {
    spots,
    eye,
    white: whiteOf(answers.preferredWhite),
    handling: handlingWish(answers.reads, answers.hold),
    claritySpan: mean((s) => s.rhoBright - s.rhoDim),
    aims,
    weights: byHand ? aims : finalWeights(aims, multipliers),
    multipliers,
    byHand,
    question: questionText(answers),
  }
}

function prepareSpots(spots: readonly Spot[], eye: Eye): PreparedSpot[] {
  const { mostLux, mostHours } = METHOD.light
  for (const { lux, hours } of spots) {
    if (!(lux >= 0 && lux <= mostLux.value)) throw new RangeError(`lux must be from 0 to ${mostLux.value}, got ${lux}`)
    if (!(hours >= 0 && hours <= mostHours.value)) {
      throw new RangeError(`hours must be from 0 to ${mostHours.value}, got ${hours}`)
    }
  }
  const used = spots.map((spot, index) => ({ ...spot, index })).filter((spot) => spot.hours > 0)
  if (used.length === 0) throw new RangeError('at least one reading spot must have hours')
  const total = used.reduce((sum, spot) => sum + spot.hours, 0)
  return used.map(({ index, lux, hours, frontLight }) => {
    const reserves = {
      bright: reserveIn(BRIGHT_PAGE, { lux, frontLight }, eye),
      dim: reserveIn(DIM_PAGE, { lux, frontLight }, eye),
    }
    return {
      index,
      lux,
      hours,
      share: hours / total,
      frontLight,
      rhoBright: fluency(reserves.bright),
      rhoDim: fluency(reserves.dim),
      pull: spotPull(lux, reserves),
    }
  })
}

/** The parts of a device that meet light: luminance factors in percent, front light in cd/m². */
export function surfaceOf(device: Pick<EditionDevice, 'page' | 'ink' | 'frontLight'>): Surface {
  return {
    yPage: lightnessToY(device.page.L),
    yInk: lightnessToY(device.ink.L),
    frontLight: frontLightMax(device.frontLight),
  }
}

/** Clarity, 0–1, and the share of hours in which nothing can be read: exactly 1 where no spot can. */
export function readability(surface: Surface, prepared: Prepared): { clarity: number; unreadable: number } {
  let gain = 0
  let unreadable = 0
  let readable = 0
  for (const spot of prepared.spots) {
    const reserve = reserveIn(surface, spot, prepared.eye)
    gain += spot.share * (fluency(reserve) - spot.rhoDim)
    if (reserve < SPOT_READING) unreadable += spot.share
    else readable++
  }
  return { clarity: clarityScore(gain, prepared.claritySpan), unreadable: readable > 0 ? Math.min(unreadable, 1) : 1 }
}

/** The fit of a device to one reader, 0–100, with the points each aim brings and what was not stated. Section 6. */
export function scoreDevice(
  device: Pick<EditionDevice, 'page' | 'ink' | 'frontLight' | 'diagonal' | 'weight' | 'ppi'>,
  prepared: Prepared,
): Omit<ScoredDevice, 'slug'> {
  const { clarity, unreadable } = readability(surfaceOf(device), prepared)
  const handling = handlingScore(device, prepared.handling)
  const scores: ByAim = {
    clarity,
    whiteness: whitenessScore(device.page, prepared.white),
    tint: tintScore(device.page, prepared.white),
    handling: handling.score,
  }
  const contributions = byAim((aim) => 100 * (1 - unreadable) * prepared.weights[aim] * scores[aim])
  const lightMatters = prepared.spots.some((spot) => spot.frontLight)
  return {
    fit: sumOf(contributions),
    scores,
    contributions,
    unreadable,
    notStated: [...(device.frontLight === null && lightMatters ? ['frontLight'] : []), ...handling.notStated],
  }
}

/** Always added in the order of the aims, so that contributions add up to the fit to the last bit. */
export function sumOf(points: Record<Aim, number>): number {
  return AIMS.reduce((sum, aim) => sum + points[aim], 0)
}
