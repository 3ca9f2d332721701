import { besidePaper, derivedFigures } from '@/lib/method/derived-figures'
import { besidePaperUncertainty, derivedUncertainty, expandedFigure } from '@/lib/method/figure-doubts'
import type { Edition, EditionDevice } from '@/lib/method/types'

/** A figure and its expanded uncertainty (k = 2, about 95 %), both in the figure's unit. */
export type Figure = { value: number; doubt: number }

export type PublishedFigures = {
  lightness: Figure
  /** a* (− green, + red) and b* (− blue, + yellow) of the page. */
  a: Figure
  b: Figure
  whiteness: Figure
  tint: Figure
  /** Whether CIE vouches for whiteness and tint; on electronic paper never. */
  withinLimits: boolean
  chroma: Figure
  /** Degrees; null for a neutral page. */
  hue: Figure | null
  /** Y_page/Y_ink, d/8°, specular included. */
  contrast: Figure
  /** Luminance factors, percent. */
  yPage: Figure
  yInk: Figure
  /** Against the control paper: ΔE00, and how many times its light the page needs. */
  fromPaper: Figure
  timesTheLight: Figure
}

/** Every figure we publish of one device of an edition, with its doubt. */
export function publishedFigures(
  edition: Pick<Edition, 'control' | 'uncertainty'>,
  device: EditionDevice,
): PublishedFigures {
  const { page, ink, sessions } = device
  const { common, session } = edition.uncertainty
  const { paper } = edition.control
  const channel = (name: 'L' | 'a' | 'b'): Figure => ({
    value: page[name],
    doubt: expandedFigure(page.u[name], session[name], sessions, common[name]),
  })
  const derived = derivedFigures(page, ink)
  const doubts = derivedUncertainty(device, edition.uncertainty)
  const beside = besidePaper(page, paper)
  const besideDoubts = besidePaperUncertainty(device, edition.uncertainty, paper)
  const both = (name: 'chroma' | 'yPage' | 'yInk'): Figure => ({ value: derived[name], doubt: doubts[name] })
  return {
    lightness: channel('L'),
    a: channel('a'),
    b: channel('b'),
    // As frozen, so that the page and the data say the same.
    whiteness: { value: device.whiteness, doubt: doubts.whiteness },
    tint: { value: device.tint, doubt: doubts.tint },
    withinLimits: device.withinLimits,
    contrast: { value: device.contrast, doubt: doubts.contrast },
    chroma: both('chroma'),
    hue: derived.hue === null || doubts.hue === null ? null : { value: derived.hue, doubt: doubts.hue },
    yPage: both('yPage'),
    yInk: both('yInk'),
    fromPaper: { value: beside.deltaE00, doubt: besideDoubts.deltaE00 },
    timesTheLight: { value: beside.timesTheLight, doubt: besideDoubts.timesTheLight },
  }
}
