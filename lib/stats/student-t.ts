import jStat from 'jstat'

/** From here on the series below is nearer the truth than the library's inverse beta function. */
const MANY_DEGREES = 1e5

/**
 * Quantile of Student's t: the value that a t variable stays below with probability p. For a two-sided interval of
 * coverage c ask for p = (1 + c)/2. Good to 1e-7 of the value (of 1, where the value is smaller).
 * @param p 0 < p < 1
 * @param df degrees of freedom, above 0, whole or not; Infinity is the normal distribution
 * @throws RangeError outside those ranges
 * @see JCGM 100:2008, G.3 and Table G.2; the series: Abramowitz & Stegun 26.7.5, from memory
 */
export function tQuantile(p: number, df: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`p must lie between 0 and 1, got ${p}`)
  if (!(df > 0)) throw new RangeError(`degrees of freedom must be above 0, got ${df}`)
  if (df < MANY_DEGREES) return jStat.studentt.inv(p, df)
  const z = jStat.normal.inv(p, 0, 1)
  return z + (z ** 3 + z) / (4 * df)
}
