import { ButtonLink } from './button'

export type Paging = { page: number; perPage: number; hrefFor: (page: number) => string }

/** Numbered pages in place of a long scroll; `page` counts from 1. Nothing where all fits on one. */
export function Pager({ paging, total, what }: { paging: Paging; total: number; what: string }) {
  const { page, perPage, hrefFor } = paging
  const pages = Math.ceil(total / perPage)
  if (pages <= 1) return null
  const first = (page - 1) * perPage + 1
  return (
    <nav aria-label="Pages" className="mt-4 flex flex-wrap items-center gap-3">
      {page > 1 && (
        <ButtonLink look="quiet" href={hrefFor(page - 1)} rel="prev">
          Previous page
        </ButtonLink>
      )}
      {page < pages && (
        <ButtonLink look="quiet" href={hrefFor(page + 1)} rel="next">
          Next page
        </ButtonLink>
      )}
      <span>
        {what} {first}–{Math.min(total, first + perPage - 1)} of {total}, page {page} of {pages}
      </span>
    </nav>
  )
}
