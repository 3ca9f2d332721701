/** Decimals of the published figures: never finer than their doubt. */
export const DECIMALS = {
  lightness: 1,
  a: 1,
  b: 1,
  whiteness: 0,
  tint: 1,
  chroma: 1,
  contrast: 1,
  y: 1,
  hue: 0,
  difference: 1,
  times: 2,
}
