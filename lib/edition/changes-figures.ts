import { DECIMALS } from '@/lib/findings/decimals'
import { differenceDoubt, type Quantity } from '@/lib/findings/difference'
import { derive } from '@/lib/method/derived-figures'
import type { Edition, EditionDevice, Lab } from '@/lib/method/types'

/** A published figure that two editions can differ in: as the document has it, and how errors move it. */
type Compared = {
  name: string
  symbol: { base: string; sub?: string } | null
  /** Decimals it is published with. */
  decimals: number
  /** Outside the limits of its formula on electronic paper; marked † wherever it stands. */
  dagger?: boolean
  value: (device: EditionDevice) => number
  quantity: Quantity
}

export type FigureName = 'lightness' | 'a' | 'b' | 'ink' | 'whiteness' | 'tint' | 'contrast'

export const COMPARED: Record<FigureName, Compared> = {
  lightness: {
    name: 'Lightness of the page',
    symbol: { base: 'L*' },
    decimals: DECIMALS.lightness,
    value: ({ page }) => page.L,
    quantity: ({ page }) => page.L,
  },
  a: {
    name: 'Green to red of the page',
    symbol: { base: 'a*' },
    decimals: DECIMALS.a,
    value: ({ page }) => page.a,
    quantity: ({ page }) => page.a,
  },
  b: {
    name: 'Blue to yellow of the page',
    symbol: { base: 'b*' },
    decimals: DECIMALS.b,
    value: ({ page }) => page.b,
    quantity: ({ page }) => page.b,
  },
  ink: {
    name: 'Lightness of the ink',
    symbol: { base: 'L*' },
    decimals: DECIMALS.lightness,
    value: ({ ink }) => ink.L,
    quantity: ({ ink }) => ink.L,
  },
  whiteness: {
    name: 'Whiteness',
    symbol: { base: 'W', sub: '10' },
    decimals: DECIMALS.whiteness,
    dagger: true,
    value: ({ whiteness }) => whiteness,
    quantity: ({ page, ink }) => derive(page, ink).whiteness,
  },
  tint: {
    name: 'Tint',
    symbol: { base: 'T', sub: '10' },
    decimals: DECIMALS.tint,
    dagger: true,
    value: ({ tint }) => tint,
    quantity: ({ page, ink }) => derive(page, ink).tint,
  },
  contrast: {
    name: 'Contrast ratio',
    symbol: null,
    decimals: DECIMALS.contrast,
    value: ({ contrast }) => contrast,
    quantity: ({ page, ink }) => derive(page, ink).contrast,
  },
}
const NAMES = Object.keys(COMPARED) as FigureName[]

/** A figure of one device that differs between two editions. */
export type MovedFigure = {
  figure: FigureName
  before: number
  after: number
  /** Expanded uncertainty (k = 2) of the difference. */
  doubt: number
  /** Whether it moved by more than that doubt. */
  beyond: boolean
}

type Doubts = Pick<Edition, 'uncertainty'>

/**
 * The figures of one device that differ between two documents, in the order they are published in. What both editions
 * share drops out of the doubt: the calibration, and a session both rest on. The device's own parts are taken as
 * independent although some readings may be the same, so a doubt is rather too large than too small.
 */
export function movedFigures(
  before: Doubts & { device: EditionDevice },
  after: Doubts & { device: EditionDevice },
): MovedFigure[] {
  const uncertainty = larger(before.uncertainty, after.uncertainty)
  return NAMES.flatMap((figure) => {
    const { value, quantity } = COMPARED[figure]
    const [was, is] = [value(before.device), value(after.device)]
    if (was === is) return []
    const doubt = differenceDoubt({ uncertainty }, after.device, before.device, quantity)
    return [{ figure, before: was, after: is, doubt, beyond: Math.abs(is - was) > doubt }]
  })
}

/** The larger doubt of each, so that neither edition is taken for surer than it was. */
function larger(one: Edition['uncertainty'], other: Edition['uncertainty']): Edition['uncertainty'] {
  const most = (a: Lab, b: Lab): Lab => ({ L: Math.max(a.L, b.L), a: Math.max(a.a, b.a), b: Math.max(a.b, b.b) })
  return { common: most(one.common, other.common), session: most(one.session, other.session) }
}
