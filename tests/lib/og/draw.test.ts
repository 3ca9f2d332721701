import Color from 'colorjs.io'
import { afterEach, expect, test, vi } from 'vitest'
import { labToHex } from '@/lib/colour/display'
import { PICTURE, TEXT_ROLES } from '@/lib/og/colours'
import { compose } from '@/lib/og/compose'
import { drawPicture } from '@/lib/og/draw'
import { makeDevice, makeEdition } from '@/tests/fixtures/edition'
import { readPng } from '@/tests/fixtures/png'

afterEach(() => vi.unstubAllGlobals())

const edition = makeEdition([
  makeDevice({ slug: 'light', name: 'Example Light 7', page: { L: 76, a: -1, b: 2, u: { L: 0.4, a: 0.1, b: 0.1 } } }),
  makeDevice({ slug: 'dark', name: 'Example Dark 7', page: { L: 54, a: -3, b: 5, u: { L: 0.4, a: 0.1, b: 0.1 } } }),
])

const hex = ([r, g, b]: [number, number, number]) =>
  `#${[r, g, b].map((channel) => channel.toString(16).padStart(2, '0')).join('')}`

test('a device’s picture is 1200 by 630 pixels and shows its page in its measured colour on the neutral surround', async () => {
  const picture = readPng(await drawPicture(compose(edition, { kind: 'device', slug: 'dark' })!))
  expect([picture.width, picture.height]).toEqual([1200, 630])
  expect(hex(picture.at(8, 8))).toBe(PICTURE.bench)
  expect(hex(picture.at(760, 20))).toBe(PICTURE.booth)
  expect(hex(picture.at(824, 470))).toBe(labToHex({ L: 54, a: -3, b: 5 }))
  expect(hex(picture.at(824, 540))).toBe(labToHex(edition.control.paper))
})

// WCAG 2.2, 1.4.3 (contrast of luminance, which is what is left in grey), by Color.js: 6.5 to 1 where 4.5 would do.
test.each(TEXT_ROLES)('text in %s reads on its ground in grey', (role) => {
  expect(new Color(PICTURE[role]).contrastWCAG21(new Color(PICTURE.bench))).toBeGreaterThanOrEqual(6.5)
})

test('in grey the drawn number stands out from its ground, and every sheet from the surround', async () => {
  const picture = readPng(await drawPicture(compose(edition, { kind: 'device', slug: 'dark' })!))
  const luminance = (x: number, y: number) => new Color(hex(picture.at(x, y))).luminance
  const left: number[] = []
  for (let x = 60; x < 420; x += 2) for (let y = 380; y < 460; y += 2) left.push(luminance(x, y))
  // A share of the number's place is ink, and the ink is dark: (L1 + 0.05) / (L2 + 0.05) as in WCAG 2.2.
  expect(left.filter((value) => (luminance(8, 8) + 0.05) / (value + 0.05) > 7).length / left.length).toBeGreaterThan(
    0.08,
  )
  const surround = luminance(760, 20)
  for (const y of [470, 540]) expect(Math.abs(luminance(824, y) - surround)).toBeGreaterThan(0.01)
})

test('drawing asks nobody for anything, whatever letters a name has', async () => {
  const { fetch } = globalThis
  const asked: string[] = []
  // The layout engine unpacks itself from a data: address, which leaves the process as little as a file does.
  vi.stubGlobal('fetch', (address: string) => {
    if (String(address).startsWith('data:')) return fetch(address)
    asked.push(String(address))
    return Promise.reject(new Error('no network'))
  })
  for (const name of ['Naïve Čtečka Ő 7', 'Читалка 读书 📖 7', '\u202f−±×–λ', '<b>&amp;</b>', '']) {
    const device = makeDevice({ slug: 'odd', name })
    const png = await drawPicture(compose(makeEdition([device]), { kind: 'device', slug: 'odd' })!)
    expect(readPng(png).width).toBe(1200)
  }
  expect(asked).toEqual([])
})
