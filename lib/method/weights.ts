import { METHOD } from './constants'
import { BRIGHT_PAGE, DIM_PAGE } from './criteria'
import { clamp } from './light'
import { eyeOf, LOG_BEST_READING, reserveIn } from './reserve'
import { AIMS, type Aim } from './types'

const W = METHOD.weights

export type ByAim = Record<Aim, number>

/** What a spot's light does to the weights, before hours: the gain of the bright page over the dim, and colourfulness. */
export type SpotPull = { gain: number; colourfulness: number }

/**
 * Rank-order-centroid weights of n ranked aims, largest first, summing to 1: wᵢ = (1/n)·Σⱼ≥ᵢ 1/j.
 * @see Barron & Barrett 1996, Management Science 42(11)
 */
export function rankOrderCentroid(n: number): number[] {
  const weights: number[] = []
  let tail = 0
  for (let place = n; place >= 1; place--) {
    tail += 1 / place
    weights.unshift(tail / n)
  }
  return weights
}

/**
 * Weights of ranked groups of aims; tied aims share the mean of their places.
 * @throws RangeError where an aim is missing or stands twice
 */
export function aimWeights(groups: readonly (readonly Aim[])[]): ByAim {
  const named = groups.flat()
  if (named.length !== AIMS.length || AIMS.some((aim) => !named.includes(aim))) {
    throw new RangeError(`aims must name each of ${AIMS.join(', ')} exactly once`)
  }
  const places = rankOrderCentroid(AIMS.length)
  const weights = {} as ByAim
  let place = 0
  for (const group of groups) {
    const shared = places.slice(place, place + group.length).reduce((sum, weight) => sum + weight, 0) / group.length
    for (const aim of group) weights[aim] = shared
    place += group.length
  }
  return weights
}

/**
 * Weights rescaled to sum to 1.
 * @throws RangeError where one is negative or not finite, or all are 0
 */
export function normalised(weights: ByAim): ByAim {
  const largest = Math.max(...AIMS.map((aim) => weights[aim]))
  if (!AIMS.every((aim) => weights[aim] >= 0) || !(largest > 0 && largest < Infinity)) {
    throw new RangeError('weights must be finite, none below 0, and one above it')
  }
  // By the largest first, so that neither huge nor tiny weights leave the range of numbers.
  const total = AIMS.reduce((sum, aim) => sum + weights[aim] / largest, 0)
  return byAim((aim) => weights[aim] / largest / total)
}

export function byAim(value: (aim: Aim) => number): ByAim {
  return { clarity: value('clarity'), whiteness: value('whiteness'), tint: value('tint'), handling: value('handling') }
}

/** μ of Method 1, section 5: log₁₀ of the reserve from 0 to the best rate's, and 0 where there is none. */
function pull(reserve: number): number {
  return reserve > 0 ? clamp(Math.log10(reserve), 0, LOG_BEST_READING) : 0
}

/**
 * F_L^0.25 relative to 500 lx: how strongly a tint shows in this light. A white page under `lux`, one adapted to a grey
 * surround of a fifth of its luminance.
 * @see CIE 248:2022, luminance-level adaptation factor
 */
export function colourfulness(lux: number): number {
  return (adaptation(Math.max(lux, W.leastLux.value)) / adaptation(W.referenceLux.value)) ** W.colourfulnessPower.value
}

function adaptation(lux: number): number {
  const adapting = (W.adaptingShare.value * lux) / Math.PI
  const { light, 'low light': low, 'high light': high, root } = W.adaptation.value
  const k4 = (1 / (light * adapting + 1)) ** 4
  return low * k4 * light * adapting + high * (1 - k4) ** 2 * (light * adapting) ** (1 / root)
}

/** @param reserves contrast reserves of the two reference pages in this spot's light, for this reader's eye */
export function spotPull(lux: number, reserves: { bright: number; dim: number }): SpotPull {
  return { gain: pull(reserves.bright) - pull(reserves.dim), colourfulness: colourfulness(lux) }
}

const DESK = { lux: W.referenceLux.value, frontLight: false }
const USUAL = eyeOf('usual', 'normal')
const DESK_GAIN = pull(reserveIn(BRIGHT_PAGE, DESK, USUAL)) - pull(reserveIn(DIM_PAGE, DESK, USUAL))

/** What the reader's light multiplies the aims' weights by, from hour-weighted means over the spots. */
export function lightMultipliers({ gain, colourfulness }: SpotPull): ByAim {
  return {
    clarity: clamp(gain / DESK_GAIN, W.clarityLeast.value, W.clarityMost.value),
    whiteness: colourfulness,
    tint: colourfulness,
    handling: 1,
  }
}

/** The aims' weights times the light's multipliers, summing to 1. */
export function finalWeights(aims: ByAim, multipliers: ByAim): ByAim {
  return normalised(byAim((aim) => aims[aim] * multipliers[aim]))
}
