import fc from 'fast-check'
import { expect, test } from 'vitest'
import { ogImage, readAddress } from '@/lib/og/address'
import { compose } from '@/lib/og/compose'
import { publicPaths } from '@/lib/public-pages'
import { READERS } from '@/lib/readers/readers'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'

const edition = makeEdition([makeDevice({ slug: 'example-7' }), makeDevice({ slug: 'example-8' })], { number: 3 })

test('every public page has a picture that can be drawn, with its size and words for who cannot see it', () => {
  for (const path of publicPaths(edition, [{ number: 3, publishedAt: edition.publishedAt }])) {
    const [image] = ogImage(path, edition)
    expect(image).toMatchObject({ width: 1200, height: 630, type: 'image/png' })
    expect(image!.alt).not.toBe('')
    const parts = image!.url.replace('/og/', '').split('/')
    const address = readAddress(parts)
    expect(address?.edition, path).toBe(3)
    expect(compose(edition, address!.subject), path).not.toBeNull()
  }
})

test('a device, a reader, an edition and the method have their own; the rest show the site’s', () => {
  const url = (path: string) => ogImage(path, edition)[0]!.url
  expect(url('/devices/example-7')).toBe('/og/3/devices/example-7.png')
  expect(url(`/for/${READERS[0]!.slug}`)).toBe(`/og/3/for/${READERS[0]!.slug}.png`)
  expect(url('/editions/3')).toBe('/og/3/edition.png')
  expect(url('/editions/2')).toBe('/og/2/edition.png')
  expect(url('/method')).toBe('/og/3/method.png')
  for (const path of ['/', '/devices', '/devices/unknown', '/editions/03', '/for/nobody', '/glossary'])
    expect(url(path)).toBe('/og/3/home.png')
  expect(ogImage('/', null)).toEqual([])
})

test('an address that names no picture is none', () => {
  for (const parts of [
    [],
    ['3'],
    ['3', 'home'],
    ['03', 'home.png'],
    ['-3', 'home.png'],
    ['9999999999', 'home.png'],
    ['3', 'constructor'],
    ['3', '__proto__'],
    ['3', 'devices', 'Example.png'],
    ['3', 'devices', '../x.png'],
    ['3', 'devices', 'x.png', 'y.png'],
    ['3', 'editions', 'x.png'],
  ])
    expect(readAddress(parts), parts.join('/')).toBeNull()
  expect(compose(edition, { kind: 'device', slug: 'unknown' })).toBeNull()
  expect(compose(edition, { kind: 'reader', slug: 'nobody' })).toBeNull()
})

test('no address makes reading it fail', () => {
  fc.assert(
    fc.property(fc.array(fc.string({ unit: 'binary' }), { maxLength: 5 }), (parts) => {
      const address = readAddress(parts)
      return address === null || Number.isSafeInteger(address.edition)
    }),
    { seed: 20_261_201 },
  )
})

test('a picture of a device measured on one unit says so', () => {
  const single = makeEdition([makeDevice({ slug: 'one', units: 1, provisional: true })])
  expect(compose(single, { kind: 'device', slug: 'one' })!.line).toBe('One unit, provisional')
})
