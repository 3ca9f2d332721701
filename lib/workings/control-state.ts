import { individualsLimits, type Limits, runRules, xbarRLimits } from '@/lib/stats/control-chart'

/** Nelson's eight rules in words; by their numbers. */
export const RULE_WORDS: Record<number, string> = {
  1: 'beyond three sigma',
  2: 'nine in a row on one side of the centre',
  3: 'six in a row rising or falling',
  4: 'fourteen in a row up and down by turns',
  5: 'two of three beyond two sigma on one side',
  6: 'four of five beyond one sigma on one side',
  7: 'fifteen in a row within one sigma',
  8: 'eight in a row beyond one sigma, on either side',
}

export type Judged = {
  value: number
  /** Beyond a limit. */
  outside: boolean
  /** Rules whose window ends here, by number. */
  rules: number[]
}

/** A series against its own limits. */
export type ControlState = {
  limits: Limits
  points: Judged[]
  /** Whether runs are looked for, beside the limits. */
  runs: boolean
  /** Index of the first point after the last that broke a rule; null where the last one did. */
  since: number | null
}

/**
 * Values one a session, against limits from their moving range, by Nelson's rules.
 * @returns null below two values, or where all are the same: there is nothing to judge by
 * @see NIST/SEMATECH e-Handbook, 6.3.2.2; Nelson 1984
 */
export function controlOfValues(values: readonly number[]): ControlState | null {
  const limits = individualsLimits(values)?.value
  const trips = limits && runRules(values, limits)
  if (!limits || !trips) return null
  const rulesAt = (i: number) => trips.filter(({ index }) => index === i).map(({ rule }) => rule)
  return { ...stateOf(values, limits, rulesAt), runs: true }
}

/**
 * The range of the readings within each session, against limits from their mean range. Ranges are not spread evenly
 * about their centre, so only the limits judge them.
 * @param subgroups of equal size, 2 to 10 readings
 * @returns null where the sizes differ or leave 2–10, or no session was read
 * @see ISO 7870-2 (from memory); ASTM E2587
 */
export function controlOfRanges(subgroups: readonly (readonly number[])[]): ControlState | null {
  const limits = xbarRLimits(subgroups)?.range
  if (!limits) return null
  const ranges = subgroups.map((readings) => Math.max(...readings) - Math.min(...readings))
  return { ...stateOf(ranges, limits, (i) => (isOutside(ranges[i]!, limits) ? [1] : [])), runs: false }
}

function stateOf(
  values: readonly number[],
  limits: Limits,
  rulesAt: (index: number) => number[],
): Omit<ControlState, 'runs'> {
  const points = values.map((value, i) => ({ value, outside: isOutside(value, limits), rules: rulesAt(i) }))
  const last = points.findLastIndex(({ rules }) => rules.length > 0)
  return { limits, points, since: last + 1 < points.length ? last + 1 : null }
}

function isOutside(value: number, { lower, upper }: Limits): boolean {
  return value < lower || value > upper
}
