import type { QuizAnswers } from '@/lib/quiz/answers'
import type { Reader } from './reader'

const given = (answers: Partial<QuizAnswers>): QuizAnswers => ({
  reads: {},
  spots: {},
  own: [],
  places: {},
  limits: {},
  skipped: [],
  ...answers,
})

/** Eight typical readers, from the darkest light to the brightest, then by what they read and how they see. House. */
export const READERS: readonly Reader[] = [
  {
    slug: 'dim-bedroom',
    name: 'Dim bedroom',
    line: 'Novels in bed, mostly by one dim lamp on the other side of the room.',
    answers: given({
      reads: { novels: 3, articles: 1 },
      hold: 'two-hands',
      spots: { 'bed-far-lamp': { hours: 7 }, 'bed-lamp': { hours: 3 } },
      places: { clarity: 1, whiteness: 2, tint: 3, handling: 3 },
    }),
  },
  {
    slug: 'shared-bed',
    name: 'Shared bed',
    line: 'Reads on with the lights off while somebody else sleeps.',
    answers: given({
      reads: { novels: 3 },
      hold: 'one-hand',
      spots: { 'bed-dark': { hours: 6 }, 'bed-far-lamp': { hours: 2 } },
      places: { handling: 1, clarity: 2, tint: 3, whiteness: 3 },
      preferredWhite: 'warm',
      limits: { frontLight: true, maxWeight: 300 },
    }),
  },
  {
    slug: 'train-and-cafe',
    name: 'Train and café',
    line: 'Standing, one hand on the rail; a coffee afterwards.',
    answers: given({
      reads: { novels: 2, articles: 3 },
      hold: 'one-hand',
      spots: { 'cafe-evening': { hours: 2 }, train: { hours: 6 } },
      places: { handling: 1, clarity: 2, whiteness: 3, tint: 3 },
      limits: { maxDiagonal: 7, maxWeight: 220 },
    }),
  },
  {
    slug: 'office-papers',
    name: 'Office papers',
    line: 'Whole pages of reports and papers at a desk, some by a window.',
    answers: given({
      reads: { documents: 3, articles: 1 },
      hold: 'table',
      spots: { desk: { hours: 12 }, window: { hours: 3 } },
      places: { whiteness: 1, handling: 1, tint: 2, clarity: 3 },
      limits: { minDiagonal: 10 },
    }),
  },
  {
    slug: 'colour-comics',
    name: 'Colour comics',
    line: 'Comics and magazines in colour, in the living room and by the lamp.',
    answers: given({
      reads: { comics: 3, articles: 1 },
      hold: 'two-hands',
      spots: { 'sofa-evening': { hours: 3 }, 'armchair-lamp': { hours: 3 }, window: { hours: 1 } },
      places: { clarity: 1, handling: 2, whiteness: 3, tint: 3 },
      limits: { colour: true },
    }),
  },
  {
    slug: 'margin-notes',
    name: 'Margin notes',
    line: 'Reads with a pen: underlines, and writes in the margin.',
    answers: given({
      reads: { documents: 2, notes: 3 },
      hold: 'table',
      spots: { 'armchair-lamp': { hours: 2 }, desk: { hours: 8 } },
      places: { handling: 1, whiteness: 2, clarity: 2, tint: 3 },
      limits: { pen: true, budget: 40_000 },
    }),
  },
  {
    slug: 'balcony-and-garden',
    name: 'Balcony and garden',
    line: 'Outdoors whenever it can be: shade, sun, and the wet table in between.',
    answers: given({
      reads: { novels: 3, articles: 1 },
      hold: 'two-hands',
      spots: { window: { hours: 1 }, shade: { hours: 5 }, sun: { hours: 2 } },
      places: { tint: 1, handling: 2, whiteness: 3, clarity: 4 },
      limits: { water: 7 },
    }),
  },
  {
    slug: 'more-light',
    name: 'Eyes that want more light',
    line: 'Turns on one more lamp than everybody else, and sets the type large.',
    answers: given({
      reads: { novels: 3, articles: 2 },
      hold: 'two-hands',
      spots: { 'bed-lamp': { hours: 3 }, 'armchair-lamp': { hours: 6 }, window: { hours: 2 } },
      lightNeed: 'much-more',
      text: 'large',
      places: { clarity: 1, whiteness: 2, handling: 3, tint: 4 },
    }),
  },
]

/** The reader at this address; null: there is none. */
export function findReader(slug: string): Reader | null {
  return READERS.find((reader) => reader.slug === slug) ?? null
}
