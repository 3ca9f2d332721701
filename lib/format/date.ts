const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
const month = new Intl.DateTimeFormat('en-GB', { month: 'long', year: 'numeric', timeZone: 'UTC' })

/** A day in words, 14 November 2026, by UTC wherever the reader is. */
export function formatDay(date: string | Date): string {
  return day.format(new Date(date))
}

/** A month in words, November 2026, by UTC. */
export function formatMonth(date: string | Date): string {
  return month.format(new Date(date))
}
