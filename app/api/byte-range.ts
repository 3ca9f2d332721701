/**
 * The one range of bytes a Range header asks for, both ends included and cut to the length.
 * @returns null where there is no header, another unit, several ranges, or something that is no range: the whole file
 *   is the answer then; 'unsatisfiable' where the range begins past the end
 * @see RFC 9110, sections 14.1.1, 14.1.2 and 14.2
 */
export function byteRange(
  header: string | null,
  length: number,
): { first: number; last: number } | 'unsatisfiable' | null {
  const found = /^bytes=[ \t]*(\d*)-(\d*)[ \t]*$/i.exec(header ?? '')
  const [, from = '', to = ''] = found ?? []
  if (!found || (from === '' && to === '')) return null
  if (from === '') {
    const last = Number(to)
    return last === 0 || length === 0 ? 'unsatisfiable' : { first: Math.max(0, length - last), last: length - 1 }
  }
  const first = Number(from)
  if (to !== '' && Number(to) < first) return null
  if (first >= length) return 'unsatisfiable'
  return { first, last: Math.min(to === '' ? length - 1 : Number(to), length - 1) }
}
