import { describe, expect, test } from 'vitest'
import { publishedFigures } from '@/lib/findings/published'
import { type DeviceFacts, deviceStructuredData } from '@/lib/structured/device'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'
import { schemaOrgErrors } from '@/tests/fixtures/schema-org'

const siteUrl = (path: string) => `https://lampleaf.example${path}`
const device = makeDevice({ slug: 'example', name: 'Example “7”' })
const edition = makeEdition([device])
const facts: DeviceFacts = {
  device,
  figures: publishedFigures(edition, device),
  edition: { number: 3, publishedOn: '2026-11-20' },
  note: 'A plain page.',
  price: { amount: 18950, currency: 'GBP', seenOn: '2026-10-30', seller: 'a shop on the harbour' },
}

type Node = Record<string, unknown> & { additionalProperty: Record<string, unknown>[] }
const graphOf = (fields: Partial<DeviceFacts> = {}) => {
  const data = deviceStructuredData({ ...facts, ...fields }, siteUrl) as { '@context': string; '@graph': Node[] }
  const [product, review] = data['@graph']
  return { data, product: product!, review: review! }
}

describe('the structured data of a device', () => {
  // The vocabulary schema.org publishes (tests/schemas/schema-org.ttl).
  test('uses the published terms of schema.org as they are meant', () => {
    expect(schemaOrgErrors([graphOf().data])).toEqual([])
    expect(schemaOrgErrors([graphOf({ note: null, price: null }).data])).toEqual([])
  })

  test('is a product of its maker with an address of its own', () => {
    const { data, product } = graphOf()
    expect(data['@context']).toBe('https://schema.org')
    expect(product).toMatchObject({
      '@type': 'Product',
      '@id': 'https://lampleaf.example/devices/example#device',
      name: 'Example “7”',
      brand: { '@type': 'Brand', name: 'Example' },
    })
  })

  test('gives every figure with its unit, how it was measured, and the ends of its doubt', () => {
    const { product } = graphOf()
    expect(product.additionalProperty).toHaveLength(12)
    for (const property of product.additionalProperty) {
      const { value, minValue, maxValue, unitText, measurementTechnique, description } = property
      expect(property['@type']).toBe('PropertyValue')
      expect(minValue as number).toBeLessThan(value as number)
      expect(maxValue as number).toBeGreaterThan(value as number)
      expect(unitText).toBeTruthy()
      expect(measurementTechnique).toMatch(/d\/8°, specular included/)
      expect(description).toMatch(/^±\s[\d.]+ at about 95 % \(k = 2\)/)
    }
  })

  test('says of whiteness and tint that they are outside the formula’s limits', () => {
    const outside = graphOf().product.additionalProperty.filter(({ description }) =>
      /outside/.test(String(description)),
    )
    expect(outside.map(({ name }) => name)).toEqual(['CIE whiteness W10 of the page', 'CIE tint T10 of the page'])
  })

  test('holds the editor’s words as a review, and no rating anywhere', () => {
    const { data, review } = graphOf()
    expect(review).toMatchObject({
      '@type': 'Review',
      itemReviewed: { '@id': 'https://lampleaf.example/devices/example#device' },
      author: { '@type': 'Organization', name: 'Lampleaf' },
      reviewBody: 'A plain page.',
      datePublished: '2026-11-20',
    })
    expect(JSON.stringify(data)).not.toMatch(/rating/i)
  })

  test('says the figures plainly where no editor has written yet', () => {
    expect(graphOf({ note: null }).review.reviewBody).toMatch(/^Example “7”, edition 3: L\* 70\.0 ±\s1\.0 on the page/)
  })

  test('names a price only where one was seen, with its day and currency', () => {
    expect(graphOf().product.offers).toMatchObject({
      '@type': 'Offer',
      price: '189.50',
      priceCurrency: 'GBP',
      description: 'Seen on 30 October 2026 at a shop on the harbour',
      priceSpecification: { validFrom: '2026-10-30' },
    })
    expect(graphOf({ price: { ...facts.price!, amount: 24900, currency: 'JPY' } }).product.offers).toMatchObject({
      price: '24900',
    })
    expect(graphOf({ price: null }).product).not.toHaveProperty('offers')
  })
})
