import type { Lab } from '@/lib/method/types'
import { mean, sd } from '@/lib/stats/describe'
import { GRUBBS_ALPHA, type GrubbsResult, grubbs } from '@/lib/stats/grubbs'
import { halfWidth } from '@/lib/stats/half-width'

export const CHANNELS = ['L', 'a', 'b'] as const
export type Channel = (typeof CHANNELS)[number]

/** One channel of repeated readings, in CIELAB units. */
export type ChannelStatistics = {
  n: number
  mean: number
  /** Standard deviation, divisor n − 1; null below two readings. */
  sd: number | null
  /** Standard uncertainty of the mean, s/√n (type A); null below two readings. */
  standard: number | null
  /** t·s/√n, 95 %: what the bench shows while measuring; null below two readings. */
  halfWidth: number | null
  /** Two-sided at α = 0.05; says why where there is no statistic. */
  grubbs: GrubbsResult
}

/**
 * Mean, spread and Grubbs' test of one state's readings, channel by channel.
 * @param readings at least one
 * @see JCGM 100:2008, 4.2; Grubbs & Beck 1972
 */
export function describeReadings(readings: readonly Lab[]): Record<Channel, ChannelStatistics> {
  const channel = (name: Channel): ChannelStatistics => {
    const values = readings.map((reading) => reading[name])
    const spread = sd(values)
    return {
      n: values.length,
      mean: mean(values),
      sd: spread,
      standard: spread === null ? null : spread / Math.sqrt(values.length),
      halfWidth: halfWidth(values),
      grubbs: grubbs(values, GRUBBS_ALPHA),
    }
  }
  return { L: channel('L'), a: channel('a'), b: channel('b') }
}

/** The mean colour of the readings. */
export function meanColour(statistics: Record<Channel, ChannelStatistics>): Lab {
  return { L: statistics.L.mean, a: statistics.a.mean, b: statistics.b.mean }
}
