/** Readings to a page: about as many sets as one session has of a device (house). */
export const PER_PAGE = 50

/** The address of a page of a device's readings, from 1. */
export function readingsPath(slug: string, page: number): string {
  const first = `/devices/${slug}/readings`
  return page === 1 ? first : `${first}/${page}`
}

/** A page's number from its address; null for anything but 2, 3, … written plainly: the first page has no number. */
export function pageNumber(text: string): number | null {
  if (!/^[1-9]\d{0,5}$/.test(text)) return null
  const page = Number(text)
  return page > 1 ? page : null
}
