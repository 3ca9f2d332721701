import { mean } from './describe'

/** Limits three sigma from the centre; `sigma` is that of one plotted point. All in the unit of the readings. */
export type Limits = { centre: number; sigma: number; lower: number; upper: number }

/**
 * Mean d2 and standard deviation d3 of the range of n readings from a normal population with standard deviation 1.
 * The tables print three decimals; these are the same integrals to six.
 * @see ISO 7870-2 (from memory); ASTM E2587
 */
const RANGE_OF: Record<number, { d2: number; d3: number }> = {
  2: { d2: 1.128379, d3: 0.852502 },
  3: { d2: 1.692569, d3: 0.888368 },
  4: { d2: 2.058751, d3: 0.879808 },
  5: { d2: 2.325929, d3: 0.864082 },
  6: { d2: 2.534413, d3: 0.84804 },
  7: { d2: 2.704357, d3: 0.833205 },
  8: { d2: 2.847201, d3: 0.819831 },
  9: { d2: 2.970026, d3: 0.807834 },
  10: { d2: 3.077505, d3: 0.797051 },
}

/**
 * Shewhart limits for single values in order of time, x̄ ± 3·M̄R/d2, and for the ranges of neighbours.
 * @returns null below two values
 * @see NIST/SEMATECH e-Handbook, 6.3.2.2
 */
export function individualsLimits(values: readonly number[]): { value: Limits; range: Limits } | null {
  if (values.length < 2) return null
  const meanRange = mean(values.slice(1).map((value, i) => Math.abs(value - values[i]!)))
  const { d2, d3 } = RANGE_OF[2]!
  return { value: threeSigma(mean(values), meanRange / d2), range: rangeLimits(meanRange, (d3 / d2) * meanRange) }
}

/**
 * Shewhart limits for the means of equal subgroups, x̿ ± A2·R̄ with A2 = 3/(d2·√n), and for their ranges, D3·R̄ to
 * D4·R̄ with D3, D4 = 1 ∓ 3·d3/d2.
 * @param subgroups readings taken together; each subgroup holds the same number of them, 2 to 10
 * @returns null where there is no subgroup, or where the sizes differ or leave 2–10
 * @see Montgomery, Introduction to Statistical Quality Control (from memory)
 */
export function xbarRLimits(subgroups: readonly (readonly number[])[]): { mean: Limits; range: Limits } | null {
  const size = subgroups[0]?.length ?? 0
  const constants = RANGE_OF[size]
  if (!constants || subgroups.some(({ length }) => length !== size)) return null
  const { d2, d3 } = constants
  const meanRange = mean(subgroups.map((readings) => Math.max(...readings) - Math.min(...readings)))
  return {
    mean: threeSigma(mean(subgroups.map(mean)), meanRange / d2 / Math.sqrt(size)),
    range: rangeLimits(meanRange, (d3 / d2) * meanRange),
  }
}

function threeSigma(centre: number, sigma: number): Limits {
  return { centre, sigma, lower: centre - 3 * sigma, upper: centre + 3 * sigma }
}

/** A range is never below 0, so neither is its lower limit. */
function rangeLimits(centre: number, sigma: number): Limits {
  const limits = threeSigma(centre, sigma)
  return { ...limits, lower: Math.max(0, limits.lower) }
}

/** Centre and sigma of the single points a chart judges: the two numbers that rules and averages need of its limits. */
export type Chart = Pick<Limits, 'centre' | 'sigma'>

type Rule = { number: number; points: number; trips: (z: number[]) => boolean }

const beyondOneSide = (z: number[], sigmas: number, count: number) =>
  z.filter((point) => point > sigmas).length >= count || z.filter((point) => point < -sigmas).length >= count
const steps = (z: number[]) => z.slice(1).map((point, i) => point - z[i]!)

const OUTSIDE: Omit<Rule, 'number'> = { points: 1, trips: (z) => beyondOneSide(z, 3, 1) }
const TWO_OF_THREE: Omit<Rule, 'number'> = { points: 3, trips: (z) => beyondOneSide(z, 2, 2) }
const FOUR_OF_FIVE: Omit<Rule, 'number'> = { points: 5, trips: (z) => beyondOneSide(z, 1, 4) }

/** Points beyond a zone count on one side of the centre, except in rules 7 and 8, which take both sides together. */
const RULES: Record<'nelson' | 'western-electric', Rule[]> = {
  // Nelson, Journal of Quality Technology 16(4), 1984.
  nelson: [
    { number: 1, ...OUTSIDE },
    { number: 2, points: 9, trips: (z) => beyondOneSide(z, 0, 9) },
    { number: 3, points: 6, trips: (z) => beyondOneSide(steps(z), 0, 5) },
    { number: 4, points: 14, trips: (z) => steps(z).every((step, i, all) => i === 0 || step * all[i - 1]! < 0) },
    { number: 5, ...TWO_OF_THREE },
    { number: 6, ...FOUR_OF_FIVE },
    { number: 7, points: 15, trips: (z) => z.every((point) => Math.abs(point) < 1) },
    { number: 8, points: 8, trips: (z) => z.every((point) => Math.abs(point) > 1) },
  ],
  // Western Electric, Statistical Quality Control Handbook, 1956 (from memory).
  'western-electric': [
    { number: 1, ...OUTSIDE },
    { number: 2, ...TWO_OF_THREE },
    { number: 3, ...FOUR_OF_FIVE },
    { number: 4, points: 8, trips: (z) => beyondOneSide(z, 0, 8) },
  ],
}

/**
 * Every place where a run rule trips, by rule and then in order of time. A point on a zone's edge is not beyond it.
 * @returns `index` is the last point, from 0, of a full window that breaks the rule; null where sigma is not above 0:
 *   a chart without spread has no zones
 */
export function runRules(
  values: readonly number[],
  { centre, sigma }: Chart,
  set: keyof typeof RULES = 'nelson',
): { rule: number; index: number }[] | null {
  if (!(sigma > 0)) return null
  const z = values.map((value) => (value - centre) / sigma)
  return RULES[set].flatMap(({ number, points, trips }) =>
    z.flatMap((_, i) => {
      const window = z.slice(Math.max(0, i + 1 - points), i + 1)
      return window.length === points && trips(window) ? [{ rule: number, index: i }] : []
    }),
  )
}

export type EwmaPoint = { value: number; lower: number; upper: number; isOut: boolean }

/**
 * Exponentially weighted moving average zᵢ = λxᵢ + (1 − λ)zᵢ₋₁ from z₀ = centre: sees a slow drift that a Shewhart
 * chart does not. Limits are centre ± width·sigma·√(λ/(2 − λ)·(1 − (1 − λ)²ⁱ)), narrow at first.
 * @param lambda 0 < λ ≤ 1; 0.2 is house, within the common 0.15–0.3
 * @param width of the limits in sigmas of the average
 * @returns a point for every value, and the limits they tend to; null where sigma is not above 0
 * @see NIST/SEMATECH e-Handbook, 6.3.2.4; Montgomery (from memory) for the limits before the steady state
 */
export function ewma(
  values: readonly number[],
  { centre, sigma }: Chart,
  { lambda = 0.2, width = 3 } = {},
): { points: EwmaPoint[]; lower: number; upper: number } | null {
  if (!(lambda > 0 && lambda <= 1)) throw new RangeError(`lambda must be above 0 and at most 1, got ${lambda}`)
  if (!(sigma > 0)) return null
  const steady = width * sigma * Math.sqrt(lambda / (2 - lambda))
  let average = centre
  const points = values.map((value, i) => {
    average = lambda * value + (1 - lambda) * average
    const reach = steady * Math.sqrt(1 - (1 - lambda) ** (2 * (i + 1)))
    return { value: average, lower: centre - reach, upper: centre + reach, isOut: Math.abs(average - centre) > reach }
  })
  return { points, lower: centre - steady, upper: centre + steady }
}
