import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { lettersOf } from './letters'

/** Family names as the drawing names them: extended Latin stands behind Latin. */
export const HEADING = 'Petrona, Petrona Extended'
export const TEXT = 'Atkinson, Atkinson Extended'

const FILES = [
  { name: 'Petrona', weight: 500, file: 'petrona-latin-500-normal.woff' },
  { name: 'Petrona Extended', weight: 500, file: 'petrona-latin-ext-500-normal.woff' },
  { name: 'Atkinson', weight: 400, file: 'atkinson-hyperlegible-next-latin-400-normal.woff' },
  { name: 'Atkinson', weight: 600, file: 'atkinson-hyperlegible-next-latin-600-normal.woff' },
  { name: 'Atkinson Extended', weight: 400, file: 'atkinson-hyperlegible-next-latin-ext-400-normal.woff' },
  { name: 'Atkinson Extended', weight: 600, file: 'atkinson-hyperlegible-next-latin-ext-600-normal.woff' },
] as const

/** The fonts of the pictures, and the letters both families have. Read once. */
export function pictureFonts() {
  known ??= load()
  return known
}
let known: ReturnType<typeof load> | undefined

function load() {
  const fonts = FILES.map(({ name, weight, file }) => ({
    name,
    weight,
    style: 'normal' as const,
    data: readFileSync(join(process.cwd(), 'public/fonts/og', file)),
  }))
  // The two weights of the text have the same letters.
  const lettersIn = (family: string) =>
    fonts
      .filter(({ name, weight }) => name.startsWith(family) && weight !== 600)
      .flatMap(({ data }) => [...lettersOf(data)])
  const inText = new Set(lettersIn('Atkinson'))
  const letters: ReadonlySet<number> = new Set(lettersIn('Petrona').filter((letter) => inText.has(letter)))
  return { fonts, letters }
}
