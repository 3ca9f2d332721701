import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { pictureFonts } from '@/lib/og/fonts'
import { inLetters, lettersOf } from '@/lib/og/letters'

const font = (name: string) => lettersOf(readFileSync(`public/fonts/og/${name}-normal.woff`))
const of = (text: string) => [...text].map((letter) => letter.codePointAt(0)!)

// Fontsource cuts its files by the Unicode ranges in its own style sheet: Latin has U+0020–007E, extended Latin U+0100–017F.
test('the letters of a font are those its file was cut to', () => {
  for (const name of [
    'petrona-latin-500',
    'atkinson-hyperlegible-next-latin-400',
    'atkinson-hyperlegible-next-latin-600',
  ]) {
    const letters = font(name)
    for (const code of of('ABCXYZabcxyz0123456789.,:;()%*±×–é')) expect(letters.has(code), `${name} ${code}`).toBe(true)
    for (const code of of('Ж读č')) expect(letters.has(code), `${name} ${code}`).toBe(false)
  }
  for (const code of of('čőřšžŁ')) expect(font('petrona-latin-ext-500').has(code)).toBe(true)
})

test('both weights of the text have the same letters', () => {
  for (const part of ['latin', 'latin-ext'])
    expect(font(`atkinson-hyperlegible-next-${part}-600`)).toEqual(font(`atkinson-hyperlegible-next-${part}-400`))
})

test('what a font lacks becomes a plain space, its own letter without the accent, or a question mark', () => {
  const { letters } = pictureFonts()
  expect(inLetters('Lampleaf 7', letters)).toBe('Lampleaf 7')
  expect(inLetters('1\u202f2\u20093', new Set(of('123')))).toBe('1\u00a02\u00a03')
  expect(inLetters('é', new Set(of('e')))).toBe('e')
  expect(inLetters('读', letters)).toBe('?')
  for (const letter of inLetters('Ж读č📖\u0000−±\u202fÅ', letters))
    expect(letters.has(letter.codePointAt(0)!) || letter === '\u00a0', letter).toBe(true)
})

test('only a WOFF file is read', () => {
  expect(() => lettersOf(readFileSync('public/fonts/petrona-latin-wght-normal.woff2'))).toThrow(/WOFF 1/)
})
