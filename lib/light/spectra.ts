import { WAVELENGTHS_NM } from '@/lib/colour/spectrum'
import { mean } from '@/lib/stats/describe'

/** One reading's reflectance, and the set, unit and state it belongs to. */
export type SpectrumReading = {
  slug: string
  unit: number
  set: number
  state: 'page' | 'ink'
  /** 31 radiance factors, 400–700 nm step 10 nm. */
  spectrum: readonly number[]
}

/** Mean reflectance of a device's page and ink, and of how many readings of its page. */
export type DeviceSpectra = { page: number[]; ink: number[]; readings: number }

/**
 * Mean spectra by device, as figures are made: a unit's is the mean of its sets' means, a device's the mean of its
 * units'. A device without a spectrum of both states is left out.
 */
export function meanSpectra(readings: readonly SpectrumReading[]): Map<string, DeviceSpectra> {
  const devices = new Map<string, DeviceSpectra>()
  for (const [slug, own] of groupBy(readings, (reading) => reading.slug)) {
    const pages = own.filter(({ state }) => state === 'page')
    const inks = own.filter(({ state }) => state === 'ink')
    if (pages.length === 0 || inks.length === 0) continue
    devices.set(slug, { page: ofUnits(pages), ink: ofUnits(inks), readings: pages.length })
  }
  return devices
}

function ofUnits(readings: readonly SpectrumReading[]): number[] {
  const units = [...groupBy(readings, ({ unit }) => unit).values()]
  return meanOf(units.map((own) => meanOf([...groupBy(own, ({ set }) => set).values()].map(ofSet))))
}

function ofSet(readings: readonly SpectrumReading[]): number[] {
  return meanOf(readings.map(({ spectrum }) => spectrum))
}

function meanOf(spectra: readonly (readonly number[])[]): number[] {
  return WAVELENGTHS_NM.map((_, i) => mean(spectra.map((spectrum) => spectrum[i]!)))
}

function groupBy<T, K>(items: readonly T[], key: (item: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>()
  for (const item of items) {
    const known = groups.get(key(item))
    if (known) known.push(item)
    else groups.set(key(item), [item])
  }
  return groups
}
