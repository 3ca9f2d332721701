import { requireFinite } from './finite'
import type { Xyy, Xyz } from './white'

/** What fixes CIE whiteness and tint for one illuminant and observer. */
export type WhitenessFormula = {
  /** Chromaticity of the perfect diffuser. */
  xn: number
  yn: number
  /** Factor of xn − x in the tint: 900 for the 10° observer, 1,000 for the 2° one. */
  tintX: number
  source: string
}

/** Method 1's whiteness and tint: D65, 10° observer, the white's chromaticity to four digits. */
export const WHITENESS_D65_10: Readonly<WhitenessFormula> = {
  xn: 0.3138,
  yn: 0.331,
  tintX: 900,
  source: 'CIE 15, whiteness and tint; ISO 11475',
}

/** Factors of the formulas that both observers share. */
export const WHITENESS_FACTORS = {
  x: 800,
  y: 1700,
  tintY: 650,
  source: 'CIE 15, whiteness and tint; ISO 11475',
} as const

/** The limits within which CIE vouches for the figures; both ends are outside. Source: CIE 15. */
export const WHITENESS_LIMITS = { lowest: 40, perY: 5, belowY: 280, tintLowest: -4, tintHighest: 2 } as const

/**
 * CIE whiteness W₁₀ and tint T₁₀ of a surface, D65, 10° observer. Dimensionless; the perfect diffuser has W 100, T 0;
 * positive tint is greenish.
 * @param sample chromaticity x, y (0–1) and luminous reflectance Y in percent (0–100)
 * @param formula the white's chromaticity and the tint's factor; Method 1's unless told otherwise
 * @returns both indices, and whether CIE vouches for them: 40 < W < 5Y − 280 and −4 < T < 2
 * @throws RangeError when Y is not in 0–100, or x or y not finite: a broken reading reached us unchecked
 * @see CIE 15, whiteness and tint; ISO 11475
 */
export function cieWhiteness(
  { x, y, Y }: Xyy,
  { xn, yn, tintX }: Readonly<WhitenessFormula> = WHITENESS_D65_10,
): { whiteness: number; tint: number; withinLimits: boolean } {
  requireFinite('x, y, Y', x, y, Y)
  if (!(Y >= 0 && Y <= 100)) throw new RangeError(`Y must be a percentage from 0 to 100, got ${Y}`)
  const whiteness = Y + WHITENESS_FACTORS.x * (xn - x) + WHITENESS_FACTORS.y * (yn - y)
  const tint = tintX * (xn - x) - WHITENESS_FACTORS.tintY * (yn - y)
  // Only Y > 64 can pass, so every e-paper page is outside; we publish the figures with that label.
  const { lowest, perY, belowY, tintLowest, tintHighest } = WHITENESS_LIMITS
  const withinLimits = whiteness > lowest && whiteness < perY * Y - belowY && tint > tintLowest && tint < tintHighest
  return { whiteness, tint, withinLimits }
}

/** Coefficients of ASTM E313 yellowness for D65 and the 10° observer. Source: ASTM E313, table of coefficients. */
export const E313_D65_10 = { CX: 1.3013, CZ: 1.1498 } as const

/**
 * ASTM E313 yellowness index, YI = 100·(CX·X − CZ·Z)/Y. Dimensionless; about 0 for a neutral, positive for a yellowish
 * page. The standard means it for yellowish samples; for a bluish page it is arithmetic only.
 * @throws RangeError when Y is not positive (black has no yellowness), or a value is not finite
 * @see ASTM E313
 */
export function e313Yellowness(
  { X, Y, Z }: Xyz,
  { CX, CZ }: Readonly<{ CX: number; CZ: number }> = E313_D65_10,
): number {
  requireFinite('X, Y, Z', X, Y, Z)
  if (!(Y > 0)) throw new RangeError(`Y must be positive, got ${Y}`)
  return (100 * (CX * X - CZ * Z)) / Y
}
