import type { Aim } from '@/lib/method/types'

/** The aims in a reader's words, as every table and form of the site names them. */
export const AIM_NAMES: Record<Aim, string> = {
  clarity: 'Clear in your light',
  whiteness: 'White, not grey',
  tint: 'Free of tint',
  handling: 'Size, weight, sharpness',
}

/** Each aim's colour and, on paper, its pattern. Spelt out, since Tailwind reads class names from the source. */
export const AIM_BARS: Record<Aim, string> = {
  clarity: 'aim-bar aim-clarity pattern-clarity',
  whiteness: 'aim-bar aim-whiteness pattern-whiteness',
  tint: 'aim-bar aim-tint pattern-tint',
  handling: 'aim-bar aim-handling pattern-handling',
}
