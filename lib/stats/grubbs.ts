import { mean, sd } from './describe'
import { tQuantile } from './student-t'

/** Level of Grubbs' test, both sides together. */
export const GRUBBS_ALPHA = 0.05

/** With three readings G cannot exceed 1.1547, a rounding away from its critical value: the test would judge noise. */
const FEWEST_READINGS = 4

export type GrubbsResult =
  | {
      /** Largest distance from the mean, in standard deviations. */
      G: number
      /** G above this has a chance below alpha where all readings come from one normal population. */
      critical: number
      /** Place of the farthest reading, from 0; the first of them where two are equally far. */
      index: number
      /** A flag for a person to look at, never a deletion. */
      isOutlier: boolean
      reason: null
    }
  | { G: null; critical: null; index: null; isOutlier: false; reason: 'too-few' | 'no-spread' }

/**
 * Grubbs' two-sided test for one outlying reading. Two outliers together can hide each other, so "no outlier" does
 * not mean "one population".
 * @param alpha significance level, 0 < alpha < 1
 * @returns no statistic, with the reason, below four readings and where all readings are the same
 * @see Grubbs & Beck, Technometrics 14(4), 1972; ISO 5725-2:1994, 7.3.4
 */
export function grubbs(readings: readonly number[], alpha = GRUBBS_ALPHA): GrubbsResult {
  if (readings.length < FEWEST_READINGS) return noStatistic('too-few')
  const spread = sd(readings)
  if (!spread) return noStatistic('no-spread')
  const centre = mean(readings)
  const distances = readings.map((reading) => Math.abs(reading - centre))
  const farthest = Math.max(...distances)
  const G = farthest / spread
  const critical = grubbsCritical(readings.length, alpha)
  return { G, critical, index: distances.indexOf(farthest), isOutlier: G > critical, reason: null }
}

/**
 * Critical value of G for n ≥ 3 readings, two-sided: (n − 1)/√n · √(t²/(n − 2 + t²)), t the quantile at
 * 1 − alpha/(2n) with n − 2 degrees of freedom. The one-sided value at alpha is the two-sided one at twice alpha.
 * @see Grubbs & Beck, Technometrics 14(4), 1972
 */
export function grubbsCritical(n: number, alpha: number): number {
  const t = tQuantile(1 - alpha / (2 * n), n - 2)
  return ((n - 1) / Math.sqrt(n)) * Math.sqrt(t ** 2 / (n - 2 + t ** 2))
}

function noStatistic(reason: 'too-few' | 'no-spread'): GrubbsResult {
  return { G: null, critical: null, index: null, isOutlier: false, reason }
}
