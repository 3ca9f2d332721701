/**
 * The pages before and after one and at both ends of a list, as Web Linking writes them (RFC 8288): the address that
 * was asked, with another page. Null for a list of one page that is asked for its first.
 */
export function pageLinks(path: string, asked: URLSearchParams, page: number, pages: number): string | null {
  if (pages === 1 && page === 1) return null
  const link = (wanted: number, rel: string) => {
    const search = new URLSearchParams(asked)
    search.set('page', String(wanted))
    return `<${path}?${search}>; rel="${rel}"`
  }
  return [
    link(1, 'first'),
    ...(page > 1 ? [link(Math.min(page - 1, pages), 'prev')] : []),
    ...(page < pages ? [link(page + 1, 'next')] : []),
    link(pages, 'last'),
  ].join(', ')
}
