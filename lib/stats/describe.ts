/**
 * Arithmetic mean, in the unit of the values. A second pass takes out the rounding of the first, so a large offset
 * with a small spread keeps its digits.
 * @throws RangeError when there are no values, or one is not finite: a set without readings reached us unchecked
 */
export function mean(values: readonly number[]): number {
  if (values.length === 0) throw new RangeError('the mean needs at least one value, got none')
  const first = sum(values) / values.length
  if (!Number.isFinite(first)) throw new RangeError('the mean needs finite values')
  return first + sum(values.map((value) => value - first)) / values.length
}

/**
 * Experimental standard deviation, divisor n − 1, in the unit of the values.
 * @returns null below two values: one reading says nothing about spread
 * @see JCGM 100:2008, 4.2.2
 */
export function sd(values: readonly number[]): number | null {
  return values.length < 2 ? null : Math.sqrt(squaresAboutMean(values) / (values.length - 1))
}

/**
 * Standard deviation within groups, pooled by degrees of freedom: √(Σ(nᵢ − 1)sᵢ² / Σ(nᵢ − 1)).
 * Empty groups and groups of one add nothing.
 * @returns null where no group holds two values
 * @see ISO 5725-2:1994, 7.4 (from memory)
 */
export function pooledSd(groups: readonly (readonly number[])[]): number | null {
  const repeated = groups.filter((group) => group.length > 1)
  const degrees = sum(repeated.map((group) => group.length - 1))
  return degrees === 0 ? null : Math.sqrt(sum(repeated.map(squaresAboutMean)) / degrees)
}

/** Σ(x − x̄)² by the corrected two-pass sum: exactly 0 where all values are the same. */
export function squaresAboutMean(values: readonly number[]): number {
  const centre = mean(values)
  return sum(values.map((value) => (value - centre) ** 2))
}

export function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0)
}
