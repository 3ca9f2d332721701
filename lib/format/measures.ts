import type { Units } from '@/lib/look'
import { formatNumber, formatUnit, THIN_SPACE } from './number'

/** Exact by definition: the international inch in millimetres, the avoirdupois ounce in grams. */
const MM_PER_INCH = 25.4
const GRAMS_PER_OUNCE = 28.349523125

/** The diagonal of a page. The trade states it in inches everywhere; metric readers get centimetres beside it. */
export function formatDiagonal(inches: number, units: Units): string {
  const stated = formatUnit(inches, 'in', 1)
  return units === 'inch' ? stated : `${stated} (${formatUnit((inches * MM_PER_INCH) / 10, 'cm', 1)})`
}

/** A length: whole millimetres, or inches to two decimals. */
export function formatLength(mm: number, units: Units): string {
  return units === 'inch' ? formatUnit(mm / MM_PER_INCH, 'in', 2) : formatUnit(mm, 'mm', Number.isInteger(mm) ? 0 : 1)
}

/** Width, height and depth with one unit at the end: 126 × 177 × 8 mm. */
export function formatDimensions(mm: readonly number[], units: Units): string {
  const one = (value: number) =>
    units === 'inch' ? formatNumber(value / MM_PER_INCH, 2) : formatNumber(value, Number.isInteger(value) ? 0 : 1)
  return `${mm.map(one).join(' × ')}${THIN_SPACE}${units === 'inch' ? 'in' : 'mm'}`
}

/** A mass: whole grams, or ounces to one decimal. */
export function formatMass(grams: number, units: Units): string {
  return units === 'inch' ? formatUnit(grams / GRAMS_PER_OUNCE, 'oz', 1) : formatUnit(grams, 'g')
}
