import { DECIMALS } from './decimals'
import type { Figure, PublishedFigures } from './published'

/** A published figure with what one must know to print it. */
export type ListedFigure = {
  /** Its entry among the quantities of the Method page: `/method#q-…`. */
  method: string
  name: string
  figure: Figure
  unit: string
  /** Never finer than its doubt. */
  decimals: number
  /** Whether it lies outside the limits its formula states. */
  outside: boolean
}

/** Every figure we publish of a device's page and its ink's luminance factor, in the order we print them. */
export function figureList(figures: PublishedFigures): ListedFigure[] {
  const { lightness, a, b, whiteness, tint, withinLimits, chroma, hue, contrast, yPage, yInk } = figures
  const listed = (
    method: string,
    name: string,
    figure: Figure,
    unit: string,
    decimals: number,
    outside = false,
  ): ListedFigure => ({ method, name, figure, unit, decimals, outside })
  return [
    listed('lightness', 'Lightness L* of the page', lightness, 'CIELAB', DECIMALS.lightness),
    listed('a-b', 'a* of the page, − green to + red', a, 'CIELAB', DECIMALS.a),
    listed('a-b', 'b* of the page, − blue to + yellow', b, 'CIELAB', DECIMALS.b),
    listed('whiteness', 'CIE whiteness W10 of the page', whiteness, 'dimensionless', DECIMALS.whiteness, !withinLimits),
    listed('tint', 'CIE tint T10 of the page', tint, 'dimensionless', DECIMALS.tint, !withinLimits),
    listed('chroma', 'Chroma C*ab of the page', chroma, 'CIELAB', DECIMALS.chroma),
    ...(hue ? [listed('chroma', 'Hue angle of the page', hue, 'degrees', DECIMALS.hue)] : []),
    listed('contrast', 'Contrast of page to ink', contrast, 'to 1', DECIMALS.contrast),
    listed('luminance-factor', 'Luminance factor Y of the page', yPage, '%', DECIMALS.y),
    listed('luminance-factor', 'Luminance factor Y of the ink', yInk, '%', DECIMALS.y),
    listed(
      'difference',
      'Colour difference ΔE00 from the control paper',
      figures.fromPaper,
      'CIEDE2000',
      DECIMALS.difference,
    ),
    listed(
      'light-needed',
      'Light needed for the control paper’s lightness',
      figures.timesTheLight,
      'times',
      DECIMALS.times,
    ),
  ]
}
