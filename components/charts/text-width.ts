/** Size of all words in charts, px: none is smaller. */
export const TEXT_PX = 13.5
/** From one line of them to the next, px. */
export const LINE_PX = 18

// Advance widths of Atkinson Hyperlegible Next at weight 600 in thousandths of an em, measured in Chromium and rounded
// up to the next twenty. Charts are laid out on the server, where nothing can measure text; weight 400 is narrower.
const WIDTHS: readonly (readonly [number, string])[] = [
  [200, "'"],
  [260, '.,:;j’'],
  [280, '`·'],
  [300, '!i'],
  [320, ' l'],
  [340, '()['],
  [360, ']ft'],
  [380, '"-r{|}'],
  [400, '_°'],
  [420, 'I'],
  [440, '/1\\'],
  [500, '*syz†'],
  [520, 'cv–'],
  [540, '7?kx×'],
  [560, 'JLaeu~é'],
  [580, '29<>F^hno'],
  [620, '+3ETbdgpq−$56=PSZ±'],
  [640, '48BRVY£'],
  [680, '0CKAX'],
  [720, 'DHUGN'],
  [760, '#&OwQ@'],
  [880, 'MWm'],
  [960, '%'],
]
const byCharacter = new Map(
  WIDTHS.flatMap(([width, characters]) => [...characters].map((one): [string, number] => [one, width])),
)
/** What is not in the table counts as a wide letter. */
const OTHER = 700

/** The width of words at weight 600, px: within some per cent, and never too narrow. */
export function textWidth(text: string, size = TEXT_PX): number {
  let thousandths = 0
  for (const character of text) thousandths += byCharacter.get(character) ?? OTHER
  return (thousandths * size) / 1000
}

/** Words broken into lines no wider than so many px; a single word that is wider stands alone. */
export function wrapWords(text: string, width: number, size = TEXT_PX): string[] {
  const lines: string[] = []
  for (const word of text.split(' ')) {
    const longer = lines.length > 0 ? `${lines.at(-1)} ${word}` : word
    if (lines.length > 0 && textWidth(longer, size) <= width) lines[lines.length - 1] = longer
    else lines.push(word)
  }
  return lines
}
