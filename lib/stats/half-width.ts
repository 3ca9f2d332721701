import { sd } from './describe'
import { tQuantile } from './student-t'

/**
 * Half-width t·s/√n of the interval that holds the mean of repeated readings, in their unit: the doubt from scatter
 * alone, shown while measuring.
 * @param coverage 0 < coverage < 1
 * @returns null below two readings; 0 where all readings are the same, which says that they agree, not that they are right
 * @see JCGM 100:2008, 4.2.3 and G.3
 */
export function halfWidth(readings: readonly number[], coverage = 0.95): number | null {
  const spread = sd(readings)
  if (spread === null) return null
  return (tQuantile((1 + coverage) / 2, readings.length - 1) * spread) / Math.sqrt(readings.length)
}
