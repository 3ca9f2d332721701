import { type deviceFigures, derivedFigures } from '@/lib/method/figures'
import type { Edition, EditionDevice, Lab, MeasuredState } from '@/lib/method/types'

/** The number of the method that figures and rankings follow today. */
export const METHOD_NUMBER = 1

/** What an edition publishes, before its fingerprint is taken. */
export type EditionDocument = Omit<Edition, 'sha256'>

/** What is known of a device besides its measured figures. */
export type DeviceFacts = Pick<
  EditionDevice,
  | 'slug'
  | 'name'
  | 'maker'
  | 'revision'
  | 'frontLight'
  | 'diagonal'
  | 'ppi'
  | 'weight'
  | 'price'
  | 'pen'
  | 'colour'
  | 'water'
  | 'pageButtons'
  | 'onSale'
  | 'lending'
  | 'speech'
  | 'formats'
>

/** Decimals published: far below any doubt, so that rounding adds nothing to it. */
const MEASURED_DECIMALS = 4
const DERIVED_DECIMALS = 3

/**
 * A device as an edition publishes it: measured figures to four decimals, and what follows from them to three, worked
 * from the rounded figures so that a reader of the document can work it again.
 */
export function editionDevice(facts: DeviceFacts, figures: ReturnType<typeof deviceFigures>): EditionDevice {
  const page = roundedState(figures.page)
  const ink = roundedState(figures.ink)
  const { whiteness, tint, withinLimits, contrast } = derivedFigures(page, ink)
  const { slug, name, maker, revision, ...rest } = facts
  return {
    slug,
    name,
    maker,
    revision,
    provisional: figures.provisional,
    units: figures.units,
    page,
    ink,
    sessions: figures.sessions,
    whiteness: rounded(whiteness, DERIVED_DECIMALS),
    tint: rounded(tint, DERIVED_DECIMALS),
    withinLimits,
    contrast: rounded(contrast, DERIVED_DECIMALS),
    ...rest,
  }
}

/** The document of an edition; devices in the order of their slugs. */
export function editionDocument(parts: {
  number: number
  publishedAt: Date
  paper: Lab
  common: Lab
  session: Lab
  devices: readonly EditionDevice[]
}): EditionDocument {
  return {
    number: parts.number,
    publishedAt: parts.publishedAt.toISOString(),
    method: METHOD_NUMBER,
    control: { paper: roundedLab(parts.paper) },
    uncertainty: { common: roundedLab(parts.common), session: roundedLab(parts.session) },
    devices: [...parts.devices].sort((one, other) => (one.slug < other.slug ? -1 : 1)),
  }
}

function roundedState({ u, ...lab }: MeasuredState): MeasuredState {
  return { ...roundedLab(lab), u: roundedLab(u) }
}

function roundedLab({ L, a, b }: Lab): Lab {
  return { L: rounded(L, MEASURED_DECIMALS), a: rounded(a, MEASURED_DECIMALS), b: rounded(b, MEASURED_DECIMALS) }
}

/** To so many decimals; never −0, which JSON can not tell from 0. */
function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals)) + 0
}
