import { SPOTS } from '@/lib/method/spots'
import type { Aim, Hold, LightNeed, PreferredWhite, ReadingKind, TextSize } from '@/lib/method/types'
import type { Switch } from './answers'
import { type FieldName, OWN_NUMBERS } from './fields'

/** What the quiz calls its choices; the same words stand in forms, messages and sentences. */

export const KIND_NAMES: Record<ReadingKind, string> = {
  novels: 'Novels and other long prose',
  documents: 'Papers, textbooks, PDFs',
  comics: 'Comics and magazines',
  notes: 'Notes I write or annotate',
  articles: 'Articles and web pages',
}
export const AMOUNT_NAMES = ['None', 'A little', 'Some', 'A lot'] as const

export const HOLD_NAMES: Record<Hold, string> = {
  'one-hand': 'In one hand',
  'two-hands': 'In two hands',
  table: 'On a table or a stand',
}

export const NEED_NAMES: Record<LightNeed, string> = {
  usual: 'No, about the same',
  more: 'Yes, more',
  'much-more': 'Yes, much more',
}

/** The same as answers that stand alone. */
export const NEED_WORDS: Record<LightNeed, string> = {
  usual: 'as much as others want',
  more: 'more than others want',
  'much-more': 'much more than others want',
}

export const SIZE_NAMES: Record<TextSize, string> = { small: 'Small', normal: 'Normal', large: 'Large' }

export const WHITE_NAMES: Record<PreferredWhite, string> = {
  neutral: 'Neutral white',
  warm: 'Warm white',
  cool: 'Cool white',
}

/** The aims as things that can count, in the middle of a sentence. */
export const AIM_PHRASES: Record<Aim, string> = {
  clarity: 'being clear in your light',
  whiteness: 'being white, not grey',
  tint: 'being free of tint',
  handling: 'size, weight and sharpness',
}

export const SWITCH_NAMES: Record<Switch, string> = {
  pen: 'A pen to write with',
  colour: 'Colour',
  frontLight: 'A front light',
  pageButtons: 'Buttons to turn the page',
  onSale: 'Still on sale',
  lending: 'Books from public libraries',
  speech: 'Reading aloud',
}

/** What a device must or must not do, behind "must". */
export const SWITCH_WORDS: Record<Switch, string> = {
  pen: 'take a pen',
  colour: 'be in colour',
  frontLight: 'have a front light',
  pageButtons: 'have page buttons',
  onSale: 'be on sale',
  lending: 'borrow from public libraries',
  speech: 'read aloud',
}

const SPOT_NAMES = new Map<string, string>(SPOTS.map(({ slug, name }) => [slug, name]))

const LABELS: Partial<Record<FieldName, string>> = {
  hold: 'How you hold it',
  'light-need': 'How much light you want',
  'type-size': 'Size of the type',
  clarity: 'Place of “clear in your light”',
  whiteness: 'Place of “white, not grey”',
  tint: 'Place of “free of tint”',
  handling: 'Place of “size, weight, sharpness”',
  white: 'The white you prefer',
  budget: 'Most you would pay',
  'min-size': 'Smallest size',
  'max-size': 'Largest size',
  'max-weight': 'Greatest weight',
  pen: SWITCH_NAMES.pen,
  colour: SWITCH_NAMES.colour,
  'front-light': SWITCH_NAMES.frontLight,
  water: 'Safe in water',
  'page-buttons': SWITCH_NAMES.pageButtons,
  'on-sale': SWITCH_NAMES.onSale,
  lending: SWITCH_NAMES.lending,
  speech: SWITCH_NAMES.speech,
  formats: 'File formats',
  'weight.clarity': 'Weight of “clear in your light”',
  'weight.whiteness': 'Weight of “white, not grey”',
  'weight.tint': 'Weight of “free of tint”',
  'weight.handling': 'Weight of “size, weight, sharpness”',
  skipped: 'Steps passed over',
  ...KIND_NAMES,
}

/** What a parameter of the address is called in a message. */
export function labelOf(field: FieldName): string {
  const label = LABELS[field]
  if (label) return label
  const [base = '', part] = field.split('.')
  const n = OWN_NUMBERS.find((number) => base === `own${number}`)
  const where = n ? `your own spot ${n}` : `“${SPOT_NAMES.get(base)}”`
  if (part === 'name') return `Name of ${where}`
  if (part === 'lux') return `Light in ${where}`
  if (part === 'light') return `Front light in ${where}`
  return `Hours in ${where}`
}
