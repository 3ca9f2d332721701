import { inflateSync } from 'node:zlib'

/**
 * The characters a font file has a shape for, from its cmap table (OpenType 1.9, formats 4 and 12).
 * @param woff a WOFF 1.0 file (W3C, 2012)
 * @throws where it is none, or has no such table
 */
export function lettersOf(woff: Buffer): Set<number> {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('Not a WOFF 1.0 file')
  const cmap = tableOf(woff, 'cmap')
  const letters = new Set<number>()
  for (let i = 0; i < cmap.readUInt16BE(2); i++) {
    const at = cmap.readUInt32BE(4 + 8 * i + 4)
    const format = cmap.readUInt16BE(at)
    if (format === 4) addSegments(cmap.subarray(at), letters)
    if (format === 12) addGroups(cmap.subarray(at), letters)
  }
  return letters
}

function tableOf(woff: Buffer, wanted: string): Buffer {
  for (let i = 0; i < woff.readUInt16BE(12); i++) {
    const entry = 44 + 20 * i
    if (woff.toString('latin1', entry, entry + 4) !== wanted) continue
    const [offset, packed, whole] = [4, 8, 12].map((field) => woff.readUInt32BE(entry + field)) as [
      number,
      number,
      number,
    ]
    const data = woff.subarray(offset, offset + packed)
    return packed < whole ? inflateSync(data) : data
  }
  throw new Error(`The font has no ${wanted} table`)
}

function addSegments(table: Buffer, letters: Set<number>): void {
  const twice = table.readUInt16BE(6)
  const [ends, starts, deltas, offsets] = [14, 16 + twice, 16 + 2 * twice, 16 + 3 * twice] as const
  for (let at = 0; at < twice; at += 2) {
    const [start, end] = [table.readUInt16BE(starts + at), table.readUInt16BE(ends + at)]
    const delta = table.readUInt16BE(deltas + at)
    const offset = table.readUInt16BE(offsets + at)
    for (let code = start; code <= end && code < 0xffff; code++) {
      const found = offset === 0 ? code : table.readUInt16BE(offsets + at + offset + 2 * (code - start))
      // Glyph 0 stands for all there is no shape for.
      if (offset !== 0 && found === 0) continue
      if (((found + delta) & 0xffff) !== 0) letters.add(code)
    }
  }
}

function addGroups(table: Buffer, letters: Set<number>): void {
  for (let i = 0; i < table.readUInt32BE(12); i++) {
    const [from, to] = [table.readUInt32BE(16 + 12 * i), table.readUInt32BE(20 + 12 * i)]
    for (let code = from; code <= to; code++) letters.add(code)
  }
}

/**
 * Text in letters the fonts have: another kind of space becomes a plain one, an accent the fonts lack falls, and what
 * is left is a question mark. The drawing library would ask a server abroad for a font with the missing letter.
 */
export function inLetters(text: string, letters: ReadonlySet<number>): string {
  const has = (character: string) => letters.has(character.codePointAt(0)!)
  return [...text.normalize('NFC')]
    .map((character) => {
      if (has(character)) return character
      if (/\s/u.test(character)) return '\u00a0'
      const base = character.normalize('NFKD').charAt(0)
      return has(base) ? base : '?'
    })
    .join('')
}
