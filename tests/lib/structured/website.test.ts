import { describe, expect, test } from 'vitest'
import { catalogueStructuredData } from '@/lib/structured/catalogue'
import { websiteStructuredData } from '@/lib/structured/website'
import { schemaOrgErrors } from '@/tests/fixtures/schema-org'

const siteUrl = (path: string) => new URL(path, 'https://guide.example').href

// The vocabulary schema.org publishes (tests/schemas/schema-org.ttl): types, domains and ranges.
describe('by the published vocabulary of schema.org', () => {
  test('the site and its publisher are rightly described', () => {
    const data = websiteStructuredData('Measured pages.', siteUrl)
    expect(schemaOrgErrors([data])).toEqual([])
    expect(JSON.stringify(data)).toContain('https://guide.example/devices?q={search_term_string}')
  })

  test('the catalogue is a list in the order shown, and a part of it counts on', () => {
    const devices = [
      { slug: 'a-7', name: 'A 7' },
      { slug: 'b-7', name: 'B 7' },
    ]
    const data = catalogueStructuredData(devices, { edition: 3, total: 16, first: 11 }, siteUrl)
    expect(schemaOrgErrors([data])).toEqual([])
    expect(data).toMatchObject({
      numberOfItems: 16,
      itemListElement: [
        { position: 11, url: 'https://guide.example/devices/a-7' },
        { position: 12, url: 'https://guide.example/devices/b-7' },
      ],
    })
  })

  test.each([
    ['an unknown type', { '@type': 'ReadingDevice' }],
    ['no type', { name: 'x' }],
    ['an unknown property', { '@type': 'Product', lightness: 70 }],
    ['a property of another type', { '@type': 'Product', itemListElement: 'x' }],
    ['a value of another type', { '@type': 'Dataset', dateModified: 'yesterday' }],
    ['a node of another type', { '@type': 'Product', review: { '@type': 'Organization', name: 'x' } }],
    ['a reference to nothing', { '@type': 'Review', itemReviewed: { '@id': 'https://guide.example/#nothing' } }],
    ['an empty text', { '@type': 'Product', name: '' }],
    ['a superseded property', { '@type': 'Review', reviews: { '@type': 'Review' } }],
  ])('%s is found', (_, node) => {
    expect(schemaOrgErrors([{ '@context': 'https://schema.org', ...node }])).not.toEqual([])
  })

  test('another context is found', () => {
    expect(schemaOrgErrors([{ '@context': 'https://other.example', '@type': 'Product' }])).not.toEqual([])
  })
})
