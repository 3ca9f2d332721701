import { Sheet } from '@/components/sheet'
import { METHOD } from '@/lib/method/constants'
import type { Aim, Lab } from '@/lib/method/types'

const { brightPage, brightInk, dimPage, dimInk } = METHOD.criteria
const { heaviest, weightSpan, coarsest, resolutionSpan } = METHOD.handling
const BRIGHT_INK: Lab = { L: brightInk.value, a: 0, b: 0 }
const DIM_INK: Lab = { L: dimInk.value, a: 0, b: 0 }
/** Tint alone, at one lightness between the two. */
const BETWEEN = (brightPage.value.L + dimPage.value.L) / 2

const PAGES: Record<Exclude<Aim, 'handling'>, { low: Drawn; high: Drawn }> = {
  clarity: {
    low: { page: dimPage.value, ink: DIM_INK, words: 'hard to make out' },
    high: { page: brightPage.value, ink: BRIGHT_INK, words: 'easy to make out' },
  },
  whiteness: {
    low: { page: dimPage.value, ink: DIM_INK, words: 'grey', bare: true },
    high: { page: brightPage.value, ink: BRIGHT_INK, words: 'white', bare: true },
  },
  tint: {
    low: { page: { ...dimPage.value, L: BETWEEN }, ink: DIM_INK, words: 'tinted', bare: true },
    high: { page: { L: BETWEEN, a: 0, b: 0 }, ink: DIM_INK, words: 'neutral', bare: true },
  },
}

type Drawn = { page: Lab; ink: Lab; words: string; bare?: boolean }

/** The two ends an aim is judged between: the method's own reference pages, side by side. */
export function Extremes({ aim }: { aim: Aim }) {
  if (aim === 'handling') {
    return (
      <p className="text-note text-soft">
        From {heaviest.value} g, {coarsest.value} ppi and a size that does not suit to{' '}
        {heaviest.value - weightSpan.value} g, {coarsest.value + resolutionSpan.value} ppi and one that does.
      </p>
    )
  }
  const { low, high } = PAGES[aim]
  return (
    <div className="flex items-center gap-3 text-note text-soft">
      <div
        aria-hidden="true"
        className="flex rounded-card paper:hidden border-(length:--sheet-edge) border-black bg-booth p-1.5"
      >
        {[low, high].map(({ page, ink, words, bare }) => (
          <Sheet
            key={words}
            page={page}
            ink={ink}
            size="small"
            text={bare ? '' : undefined}
            className="h-16 w-13 shadow-none"
          />
        ))}
      </div>
      <p>
        From {low.words}
        <span className="paper:hidden">, left,</span> to {high.words}
        <span className="paper:hidden">, right</span>.
      </p>
    </div>
  )
}
