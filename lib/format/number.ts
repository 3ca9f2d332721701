/** Between a number and its unit, or a value and its doubt: narrow, and never at the end of a line. */
export const THIN_SPACE = '\u202f'

const formats = new Map<number, Intl.NumberFormat>()

/** A number for reading, grouped by commas, with a true minus sign; what rounds to zero has no sign. */
export function formatNumber(value: number, decimals = 0): string {
  let format = formats.get(decimals)
  if (!format) {
    format = new Intl.NumberFormat('en-GB', {
      minimumFractionDigits: decimals,
      maximumFractionDigits: decimals,
      signDisplay: 'negative',
    })
    formats.set(decimals, format)
  }
  return format.format(value).replace('-', '−')
}

const exact = new Intl.NumberFormat('en-GB', { maximumSignificantDigits: 15 })

/** A constant or a given number with all its digits and no more: 0.3138, 200,000, −3. */
export function formatExact(value: number): string {
  return exact.format(value).replace('-', '−')
}

/** A light in lux to two figures: 0.1, 79, 8,000. */
export function formatLux(lux: number): string {
  return formatExact(Number(lux.toPrecision(2)))
}

/**
 * A doubt, "± 0.8", with the decimals of its figure, and more where it would otherwise read as none at all.
 * @param doubt ≥ 0, in the unit of the figure
 */
export function formatDoubt(doubt: number, decimals = 0): string {
  let places = decimals
  while (doubt > 0 && Number(doubt.toFixed(places)) === 0 && places < decimals + 4) places += 1
  return `±${THIN_SPACE}${formatNumber(doubt, places)}`
}

/** A place in a ranking: 1st, 2nd, 3rd, 11th, 22nd. */
export function formatOrdinal(place: number): string {
  return `${formatNumber(place)}${ENDINGS[ordinals.select(place)]}`
}
const ordinals = new Intl.PluralRules('en-GB', { type: 'ordinal' })
const ENDINGS: Record<Intl.LDMLPluralRule, string> = {
  zero: 'th',
  one: 'st',
  two: 'nd',
  few: 'rd',
  many: 'th',
  other: 'th',
}

/** A range with an en dash, or the one number where both ends are the same. */
export function formatRange(from: number, to: number, decimals = 0): string {
  const [low, high] = [formatNumber(from, decimals), formatNumber(to, decimals)]
  return low === high ? low : `${low}–${high}`
}

/** A number with its unit, held together: 80 lux, 7 h, 62 %. */
export function formatUnit(value: number, unit: string, decimals = 0): string {
  return `${formatNumber(value, decimals)}${THIN_SPACE}${unit}`
}

/** A contrast reserve, times what the eye needs: 18.7×. */
export function formatTimes(value: number): string {
  return `${formatNumber(value, 1)}×`
}

/**
 * A share in percent for reading: 62 %. A share that draws estimate is never quite none or all: < 1 %, > 99 %.
 * @param share 0–1
 */
export function formatShare(share: number): string {
  if (share < 0.005) return `<${THIN_SPACE}1${THIN_SPACE}%`
  if (share >= 0.995) return `>${THIN_SPACE}99${THIN_SPACE}%`
  return formatUnit(100 * share, '%')
}

/**
 * Parts rounded to whole numbers that still add up to their rounded total: the largest remainders are rounded up.
 * Each part differs from its own value by less than one.
 * @param parts ≥ 0
 */
export function roundToTotal(parts: readonly number[]): number[] {
  const whole = parts.map(Math.floor)
  const total = Math.round(parts.reduce((sum, part) => sum + part, 0))
  const missing = total - whole.reduce((sum, part) => sum + part, 0)
  const byRemainder = parts
    .map((part, i) => ({ i, rest: part - Math.floor(part) }))
    .sort((one, two) => two.rest - one.rest || one.i - two.i)
  for (const { i } of byRemainder.slice(0, missing)) whole[i] = (whole[i] ?? 0) + 1
  return whole
}
