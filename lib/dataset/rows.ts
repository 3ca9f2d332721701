import { publishedFigures } from '@/lib/findings/published'
import type { Lab } from '@/lib/method/types'
import type { DatasetSource } from './source'
import { specRows } from './spec-rows'
import type { Row } from './table'
import { WAVELENGTHS } from './tables-bench'

/** The rows of every table of an edition's data set, each in the order its description states. */
export function datasetRows(source: DatasetSource): Record<string, Row[]> {
  const { edition } = source
  return {
    devices: edition.devices.map(({ slug, name, maker, revision, units, provisional, price }) => ({
      device: slug,
      name,
      maker,
      revision,
      units,
      provisional,
      price_minor: price?.amount ?? null,
      price_currency: price?.currency ?? null,
    })),
    figures: edition.devices.map((device) => figureRow(source, device.slug)),
    uncertainty: uncertaintyRows(source),
    specs: edition.devices.flatMap(specRows),
    sets: source.sets.map(({ id, ...set }) => ({ set: id, ...set })),
    readings: source.readings.map(({ set, ordinal, l, a, b, instrumentWhiteness, flag, reason }) => ({
      set,
      ordinal,
      l,
      a,
      b,
      instrument_whiteness: instrumentWhiteness,
      flag,
      reason,
    })),
    sessions: source.sessions.map(({ startedAt, endedAt, observer, ...session }) => ({
      ...session,
      started_at: startedAt.toISOString(),
      ended_at: endedAt.toISOString(),
      observer: Number(observer),
    })),
    controls: source.controls.map((control) => ({ ...control })),
    spectra: source.readings.flatMap(({ set, ordinal, spectrum }) =>
      spectrum === null
        ? []
        : [{ set, ordinal, ...Object.fromEntries(WAVELENGTHS.map((nm, i) => [`r${nm}`, spectrum[i] ?? null])) }],
    ),
  }
}

/** Decimals of what is worked out from the frozen figures: far below any doubt, and above the last bits of arithmetic. */
const DECIMALS = 4

function rounded(value: number): number {
  return Number(value.toFixed(DECIMALS)) + 0
}

function figureRow({ edition }: DatasetSource, slug: string): Row {
  const device = edition.devices.find((one) => one.slug === slug)!
  const found = publishedFigures(edition, device)
  const { page, ink } = device
  const worked = {
    chroma: found.chroma,
    hue: found.hue,
    page_y: found.yPage,
    ink_y: found.yInk,
    from_paper: found.fromPaper,
    times_the_light: found.timesTheLight,
  }
  const row: Record<string, Row[string]> = {
    device: slug,
    page_l: page.L,
    page_l_doubt: rounded(found.lightness.doubt),
    page_a: page.a,
    page_a_doubt: rounded(found.a.doubt),
    page_b: page.b,
    page_b_doubt: rounded(found.b.doubt),
    ...prefixed('ink_', ink),
    ...prefixed('page_', page.u, '_u'),
    ...prefixed('ink_', ink.u, '_u'),
    whiteness: device.whiteness,
    whiteness_doubt: rounded(found.whiteness.doubt),
    tint: device.tint,
    tint_doubt: rounded(found.tint.doubt),
    within_limits: device.withinLimits,
    contrast: device.contrast,
    contrast_doubt: rounded(found.contrast.doubt),
  }
  for (const [name, figure] of Object.entries(worked)) {
    row[name] = figure && rounded(figure.value)
    row[`${name}_doubt`] = figure && rounded(figure.doubt)
  }
  return row
}

function prefixed(prefix: string, { L, a, b }: Lab, suffix = ''): Row {
  return { [`${prefix}l${suffix}`]: L, [`${prefix}a${suffix}`]: a, [`${prefix}b${suffix}`]: b }
}

function uncertaintyRows({ edition, components }: DatasetSource): Row[] {
  const { page, ink } = components
  const parts: [string, Lab][] = [
    ['common', edition.uncertainty.common],
    ['session', edition.uncertainty.session],
    ['page-reading', page.reading],
    ['page-position', page.position],
    ['page-unit', page.unit],
    ['ink-reading', ink.reading],
    ['ink-position', ink.position],
    ['ink-unit', ink.unit],
    ['paper', edition.control.paper],
  ]
  return parts.map(([part, lab]) => ({ part, ...prefixed('', lab) }))
}
