import type { RankedDevice } from '@/lib/method/types'

const FIELD_WORDS: Record<string, { name: string; effect: string }> = {
  frontLight: { name: 'Front light', effect: 'counted as none; no limit leaves it out' },
  diagonal: { name: 'Size', effect: 'left out of the score; no limit leaves it out' },
  weight: { name: 'Weight', effect: 'left out of the score; no limit leaves it out' },
  ppi: { name: 'Resolution', effect: 'left out of the score' },
  price: { name: 'Price in pounds', effect: 'kept, though it may be over your budget' },
}
const OF_A_LIMIT: Record<string, string> = {
  pen: 'Pen',
  colour: 'Colour',
  water: 'Water code',
  pageButtons: 'Page buttons',
  onSale: 'Whether it is on sale',
  lending: 'Library books',
  speech: 'Reading aloud',
  formats: 'File formats',
}

/** What was not stated and mattered, by field: its name, what we made of it, and the devices. */
export function notStatedByField(ranked: readonly Pick<RankedDevice, 'slug' | 'notStated'>[]) {
  const fields = [...new Set(ranked.flatMap((device) => device.notStated))]
  return fields.map((field) => ({
    field,
    ...(FIELD_WORDS[field] ?? { name: OF_A_LIMIT[field] ?? field, effect: 'kept, though it may not meet your limit' }),
    slugs: ranked.filter((device) => device.notStated.includes(field)).map((device) => device.slug),
  }))
}
