/** A light estimated by eye or by sum, lux on the page: a middle and the band it may lie in. */
export type Estimate = { lux: number; low: number; high: number }

/** House: an estimate by a sum may be off by a factor of two either way. */
export const BAND_FACTOR = 2
const MOST_LUX = 200_000

/** What one can see in a light, darkest first. Bands are common practice, no source; their middles are house. */
export const SIGHTS: readonly (Estimate & { words: string })[] = [
  { words: 'I can make out the room, but no print', lux: 0.3, low: 0, high: 1 },
  { words: 'Colours look washed out or grey', lux: 3, low: 1, high: 10 },
  { words: 'I can read a headline, but a printed paperback is hard work', lux: 30, low: 10, high: 100 },
  { words: 'A printed paperback reads comfortably', lux: 200, low: 100, high: 500 },
  { words: 'I could thread a needle', lux: 1000, low: 500, high: 2000 },
  { words: 'Daylight, outdoors or at a large window, and my shadow is soft', lux: 8000, low: 2000, high: 20_000 },
  { words: 'Full sun, and my shadow is sharp', lux: 80_000, low: 30_000, high: 100_000 },
]

/** Bulbs one can buy, lumens as printed on the box (common practice, no source). */
export const BULBS = [
  { lumens: 250, name: 'Small bulb, night light or clip-on lamp' },
  { lumens: 470, name: 'Ordinary bulb' },
  { lumens: 806, name: 'Bright bulb' },
  { lumens: 1521, name: 'Very bright bulb' },
] as const

/**
 * A bare lamp that shines alike in all directions, straight at the page: E = I/d² with I = Φ/4π. A shade that turns the
 * light to the page gives more, one that hides the bulb less.
 * @param lumens luminous flux Φ, above 0
 * @param metres distance d from the bulb to the page, above 0
 * @see 470 lm at 0.4 m give 234 lx, at 0.6 m 104 lx, at 1 m 37 lx
 */
export function lampEstimate(lumens: number, metres: number): Estimate {
  return banded(lumens / (4 * Math.PI) / metres ** 2)
}

/** Calibration of a reflected-light meter, K, cd·s/(m²·ISO), and reflectance of white paper (both from memory). */
const METER = { K: 12.5, iso: 100, paper: 0.85 }

/**
 * From a camera aimed at white paper: page luminance L = K·2^EV/ISO, and E = π·L/ρ, about 0.46·2^EV.
 * @param exposureValue EV at ISO 100 as the camera or an app shows it
 */
export function cameraEstimate(exposureValue: number): Estimate {
  return banded((Math.PI * METER.K * 2 ** exposureValue) / METER.iso / METER.paper)
}

/** To two figures, and never beyond what a spot may have. */
function banded(lux: number): Estimate {
  const tidy = (value: number) => Math.min(MOST_LUX, Number(Number(value.toPrecision(2)).toFixed(4)))
  return { lux: tidy(lux), low: tidy(lux / BAND_FACTOR), high: tidy(lux * BAND_FACTOR) }
}
