import { describe, expect, test } from 'vitest'
import { xyzToLab } from '@/lib/colour/lab'
import { spectrumToXyz } from '@/lib/colour/spectrum'
import { coloursUnder } from '@/lib/light/colours'
import { lampEffect } from '@/lib/light/effect'
import { LAMP_NAMES } from '@/lib/light/lamps'
import { meanSpectra, type SpectrumReading } from '@/lib/light/spectra'
import reference from '../../reference/spectra.json'

const level = (value: number) => Array<number>(31).fill(value)
const reading = (fields: Partial<SpectrumReading>): SpectrumReading => ({
  slug: 'one',
  unit: 1,
  set: 1,
  state: 'page',
  spectrum: level(0.4),
  ...fields,
})

describe('the mean spectrum of a device', () => {
  // By hand: unit 1 has sets of mean 0.42 and 0.44, so 0.43; unit 2 has 0.51; their mean is 0.47. A plain mean is 0.4425.
  test('is the mean of its units, each the mean of its sets, so that more readings of one weigh no more', () => {
    const spectra = meanSpectra([
      reading({ set: 1, spectrum: level(0.41) }),
      reading({ set: 1, spectrum: level(0.43) }),
      reading({ set: 2, spectrum: level(0.44) }),
      reading({ unit: 2, set: 3, spectrum: level(0.51) }),
      reading({ set: 4, state: 'ink', spectrum: level(0.04) }),
    ])
    const { page, ink, readings } = spectra.get('one')!
    for (const value of page) expect(value).toBeCloseTo(0.47, 12)
    for (const value of ink) expect(value).toBeCloseTo(0.04, 12)
    expect(readings).toBe(4)
  })

  test('is not known where one of the two states has no spectrum', () => {
    expect(meanSpectra([reading({})]).size).toBe(0)
    expect(meanSpectra([]).size).toBe(0)
  })
})

const published = { page: { L: 70, a: -1, b: 2 }, ink: { L: 24, a: 0, b: -1 } }

// tests/reference/spectra.json; its whites are the sums of the weights, ours the published D65/10°: under 2e-3 apart.
test.each(reference.spectra)(
  '$name is drawn under each lamp as the reference adapts it to daylight',
  ({ R, otherLights }) => {
    for (const [name, light] of Object.entries(otherLights)) {
      const { page } = coloursUnder(name as keyof typeof otherLights, published, { page: R, ink: R, readings: 1 })
      for (const [i, value] of [page.L, page.a, page.b].entries()) {
        expect(Math.abs(value - light.Lab[i]!)).toBeLessThan(2e-3)
      }
    }
  },
)

test('in daylight a page with a spectrum is drawn as measured, and nothing changes', () => {
  const { R } = reference.spectra[4]!
  const { page, colour } = coloursUnder('D65', published, { page: R, ink: R, readings: 1 })
  const measured = xyzToLab(spectrumToXyz(R))
  expect(page.L).toBeCloseTo(measured.L, 4)
  expect(page.a).toBeCloseTo(measured.a, 2)
  expect(page.b).toBeCloseTo(measured.b, 2)
  expect(colour!.change).toBe(0)
})

test('without a spectrum the published colour is kept under every lamp, and that is told', () => {
  for (const lamp of LAMP_NAMES) {
    expect(coloursUnder(lamp, published, undefined)).toEqual({ ...published, colour: null })
  }
})

describe('what a lamp does', () => {
  const named = (id: number) => {
    const { name, R } = reference.spectra[id]!
    return { name, colour: coloursUnder('LED-B1', published, { page: R, ink: R, readings: 1 }).colour! }
  }

  test('is said from the figures: how far the pages move, which most, and what they return', () => {
    const pages = reference.spectra.map((_, i) => named(i))
    const most = pages.reduce((far, page) => (page.colour.change > far.colour.change ? page : far))
    const [first, second, third] = lampEffect('LED-B1', pages)
    expect(first).toContain(`the 13 pages with a spectrum move by ΔE00 0.0–${most.colour.change.toFixed(1)}`)
    expect(second).toContain(most.name)
    expect(third).toMatch(/^The light they return changes by/)
  })

  test('is nothing in daylight, and nothing is said where no spectrum is known', () => {
    expect(lampEffect('D65', [named(0)])).toEqual(['This is the light every page was measured for, so nothing moves.'])
    expect(lampEffect('LED-B1', [])).toEqual([])
  })

  test('names no direction for a page that keeps its colour', () => {
    const sentences = lampEffect('LED-B1', [named(0)])
    expect(sentences).toHaveLength(2)
    expect(sentences[0]).toContain('the page moves by ΔE00 0.0')
  })
})
