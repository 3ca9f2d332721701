// The numbers behind words of the result. House, all of them; the method page prints them from here.

/** Distances from the preferred white, ΔC*ab, up to which a tint goes by these words. */
export const TINTS = [
  { below: 1.5, words: 'is nearly free of tint', near: 'is very close to' },
  { below: 3, words: 'has a slight tint', near: 'is a little off' },
  { below: 4.5, words: 'has a visible tint', near: 'is visibly off' },
  { below: Infinity, words: 'has a strong tint', near: 'is far from' },
] as const

/** Up to here a tint speaks for a page, ΔC*ab. */
export const LITTLE_TINT = 3

/** Grams up to which a device is light for a hold, and from which it is heavy. On a table weight is nothing. */
export const LIGHT_TO_HOLD = { 'one-hand': 200, 'two-hands': 300, table: null } as const
export const HEAVY_TO_HOLD = { 'one-hand': 300, 'two-hands': 450, table: null } as const

/** How well a size must suit, 0–1, to speak for a device, and below what it speaks against it. */
export const SUITS = 0.9
export const UNSUITED = 0.5

/** Points of fit below which two devices have the same. */
export const SAME_FIT = 0.05
