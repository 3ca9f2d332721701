import { CHOOSING_TERMS } from './choosing'
import { COLOUR_TERMS } from './colour'
import { LIGHT_TERMS } from './light'
import { MEASURING_TERMS } from './measuring'
import { PUBLISHING_TERMS } from './publishing'
import type { Term } from './term'

/** Letters from which a name is put in order: Greek and signs go by the Latin letters said for them. */
const SPELT: Record<string, string> = { Δ: 'D' }

const spelt = (name: string) => name.replace(/^\W/u, (sign) => SPELT[sign] ?? sign)
const collator = new Intl.Collator('en-GB', { sensitivity: 'base', numeric: true })

/** Every term, in the order of the alphabet. */
export const TERMS: readonly Term[] = [
  ...MEASURING_TERMS,
  ...COLOUR_TERMS,
  ...LIGHT_TERMS,
  ...CHOOSING_TERMS,
  ...PUBLISHING_TERMS,
].sort((one, other) => collator.compare(spelt(one.name), spelt(other.name)))

export type Letter = { letter: string; terms: Term[] }

/** The terms under their first letters, in capitals; letters without terms are left out. */
export function termsByLetter(terms: readonly Term[] = TERMS): Letter[] {
  const letters: Letter[] = []
  for (const term of terms) {
    const letter = spelt(term.name)[0]!.toUpperCase()
    const last = letters.at(-1)
    if (last?.letter === letter) last.terms.push(term)
    else letters.push({ letter, terms: [term] })
  }
  return letters
}
