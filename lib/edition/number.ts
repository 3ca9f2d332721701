/**
 * The number of an edition as an address may give it: whole, from 1, without zeros before it, and small enough for the
 * database. Null for anything else.
 */
export function editionNumber(text: string): number | null {
  return /^[1-9]\d{0,8}$/.test(text) ? Number(text) : null
}
