import type { Units } from '@/lib/look'
import { formatUnit } from './number'

/** Exact by definition: the international inch in centimetres, the avoirdupois ounce in grams. */
const CM_PER_INCH = 2.54
const GRAMS_PER_OUNCE = 28.349523125

/** The diagonal of a page. The trade states it in inches everywhere; metric readers get centimetres beside it. */
export function formatDiagonal(inches: number, units: Units): string {
  const stated = formatUnit(inches, 'in', 1)
  return units === 'inch' ? stated : `${stated} (${formatUnit(inches * CM_PER_INCH, 'cm', 1)})`
}

/** A mass: whole grams, or ounces to one decimal. */
export function formatMass(grams: number, units: Units): string {
  return units === 'inch' ? formatUnit(grams / GRAMS_PER_OUNCE, 'oz', 1) : formatUnit(grams, 'g')
}
