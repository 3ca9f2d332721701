import 'server-only'
import { notFound } from 'next/navigation'

/** Entries of a long list on one page, in every theme. */
export const PER_PAGE = 30

/**
 * The number of a page after the first, from the last part of its address: lists are paged by path, so that each page is
 * stored. Leaves with 404 for anything that is no such number, the first page's own, and pages past the last.
 * @param total entries of the whole list
 */
export function requireLaterPage(text: string, total: number, perPage = PER_PAGE): number {
  if (!/^[1-9]\d{0,5}$/.test(text)) notFound()
  const page = Number(text)
  if (page < 2 || page > Math.ceil(total / perPage)) notFound()
  return page
}
