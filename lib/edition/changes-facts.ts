import type { EditionDevice } from '@/lib/method/types'

/** What an edition states of a device besides its figures, by field of the document. */
export const FACT_NAMES = {
  name: 'Name',
  maker: 'Maker',
  revision: 'Revision measured',
  units: 'Units measured',
  frontLight: 'Front light',
  diagonal: 'Size',
  ppi: 'Resolution',
  weight: 'Weight',
  price: 'Price',
  pen: 'Pen',
  colour: 'Colour',
  water: 'Water code',
  pageButtons: 'Page buttons',
  onSale: 'On sale',
  lending: 'Library books',
  speech: 'Reading aloud',
  formats: 'File formats',
} as const satisfies Partial<Record<keyof EditionDevice, string>>
export type FactName = keyof typeof FACT_NAMES
const FACTS = Object.keys(FACT_NAMES) as FactName[]

/** The facts a fit is computed from where no limit is set. */
const FACTS_OF_A_FIT: readonly FactName[] = ['frontLight', 'diagonal', 'ppi', 'weight']

/** A fact that the two editions state differently; the values are in the devices beside it. */
export type ChangedFact = { fact: FactName; ofTheFit: boolean }

export function changedFacts(before: EditionDevice, after: EditionDevice): ChangedFact[] {
  return FACTS.filter((fact) => !same(before[fact], after[fact])).map((fact) => ({
    fact,
    ofTheFit: FACTS_OF_A_FIT.includes(fact),
  }))
}

/** Equal as JSON, whatever the order of keys. */
function same(one: unknown, other: unknown): boolean {
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return one === other
  const [ours, theirs] = [Object.entries(one), new Map(Object.entries(other))]
  return ours.length === theirs.size && ours.every(([key, value]) => theirs.has(key) && same(value, theirs.get(key)))
}
