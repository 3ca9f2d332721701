import { formatNumber } from '@/lib/format/number'

/** One step of a worked figure, in words a reader can follow with a pocket calculator. */
export type Step = {
  /** Its place among the steps, and part of its address on the page. */
  id: string
  name: string
  formula: string
  /** The formula with the numbers put in. */
  worked: string
  /** What comes out, with its unit and, where there is one, its doubt. */
  result: string
  source: string
  note?: string
}

/** A number inside a worked formula; a negative one in brackets, so that signs do not meet. */
export function put(value: number, decimals: number): string {
  const text = formatNumber(value, decimals)
  return text.startsWith('−') ? `(${text})` : text
}
