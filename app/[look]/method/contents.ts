/** The sections of the Method page in their order; the ids are addresses that other pages link to. */
export const CONTENTS = [
  { id: 'spots', title: 'Reading spots, and what we assume' },
  { id: 'figures', title: 'From readings to a published figure' },
  { id: 'light', title: 'Light on the page' },
  { id: 'reserve', title: 'Contrast reserve' },
  { id: 'criteria', title: 'Four criteria' },
  { id: 'weights', title: 'Weights' },
  { id: 'fit', title: 'Fit, ties and ranks' },
  { id: 'limits', title: 'Limits, and what would change the answer' },
  { id: 'example', title: 'A worked example you can change' },
  { id: 'budget', title: 'The uncertainty budget' },
  { id: 'controls', title: 'The control charts' },
  { id: 'words', title: 'Words that stand for numbers' },
  { id: 'unknowns', title: 'What we do not know' },
] as const
export type SectionId = (typeof CONTENTS)[number]['id']

/** A section's number, from 0: those of Method 1 keep theirs. */
export function numberOf(id: SectionId): number {
  return CONTENTS.findIndex((section) => section.id === id)
}
