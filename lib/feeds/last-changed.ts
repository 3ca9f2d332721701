const DAY_MS = 24 * 60 * 60 * 1000

/**
 * The Last-Modified date of a document that shows things of these moments. What is dated by the day may have been
 * written at any hour of it, so a day counts to its end, or to now while it lasts: nobody is told that a copy from
 * earlier that day is still good.
 * @param moments those at midnight UTC are days
 * @returns null where there are none
 */
export function lastChanged(moments: readonly Date[], now: Date): Date | null {
  const ends = moments.map((moment) => {
    const at = moment.getTime()
    return at % DAY_MS === 0 ? Math.min(at + DAY_MS, now.getTime()) : at
  })
  return ends.length === 0 ? null : new Date(Math.max(...ends))
}
