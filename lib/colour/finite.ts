/**
 * Refuses NaN and ±∞ among three measured numbers. Kept free of allocation: conversions run inside the draws.
 * @param names what the three are called, for the message
 * @throws RangeError naming the three and what came
 */
export function requireFinite(names: string, p: number, q: number, r: number): void {
  if (Number.isFinite(p) && Number.isFinite(q) && Number.isFinite(r)) return
  throw new RangeError(`${names} must be finite numbers, got ${p}, ${q}, ${r}`)
}
