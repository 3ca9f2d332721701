import { afterAll, beforeAll, expect, test } from 'vitest'
import { findLatestEdition } from '@/db/queries/editions'
import { listEditionSpectra } from '@/db/queries/spectra'
import { xyzToLab } from '@/lib/colour/lab'
import { spectrumToXyz } from '@/lib/colour/spectrum'
import { meanSpectra } from '@/lib/light/spectra'
import { createSeededDatabase } from '@/tests/fixtures/db'

let seeded: Awaited<ReturnType<typeof createSeededDatabase>>
beforeAll(async () => {
  seeded = await createSeededDatabase()
})
afterAll(() => seeded.drop())

test('the spectra of an edition are those of the readings its figures rest on', async () => {
  const edition = (await findLatestEdition(seeded.db))!
  const rows = await listEditionSpectra(seeded.db, edition.number)
  expect(rows.every(({ spectrum }) => spectrum.length === 31)).toBe(true)
  const spectra = meanSpectra(rows)
  const slugs = new Set(edition.devices.map(({ slug }) => slug))
  for (const slug of spectra.keys()) expect(slugs).toContain(slug)
  // One device was read only by the instrument that stores no spectra.
  expect(edition.devices.filter(({ slug }) => !spectra.has(slug)).map(({ slug }) => slug)).toEqual(['tamber-almanac-6'])
})

// The instruments and sessions differ a little, so the mean of some readings lies near the figure of all.
test('a mean spectrum has nearly the colour published of its device', async () => {
  const edition = (await findLatestEdition(seeded.db))!
  const spectra = meanSpectra(await listEditionSpectra(seeded.db, edition.number))
  for (const { slug, page, ink } of edition.devices) {
    const own = spectra.get(slug)
    if (!own) continue
    for (const [published, spectrum] of [
      [page, own.page],
      [ink, own.ink],
    ] as const) {
      const { L, a, b } = xyzToLab(spectrumToXyz(spectrum))
      expect(Math.abs(L - published.L), slug).toBeLessThan(1)
      expect(Math.abs(a - published.a), slug).toBeLessThan(0.5)
      expect(Math.abs(b - published.b), slug).toBeLessThan(0.6)
    }
  }
})

test('an edition there is not has no spectra', async () => {
  expect(await listEditionSpectra(seeded.db, 999)).toEqual([])
})
