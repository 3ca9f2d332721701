import type { Edition, EditionDevice } from '@/lib/method/types'
import { COVERAGE_FACTOR } from '@/lib/stats/uncertainty'
import { budgetParts, type Counts, combined, expanded, largestOf, type Part, type PartId, type State } from './budget'
import { type FigureId, type Slopes, slopesOf } from './sensitivity'
import { type Bench, contributions } from './workings'

/** What the lines of a budget bring to one figure, standard, in its unit. */
export type FigureBudget = {
  sizes: { id: PartId; u: number }[]
  combined: number
  expanded: number
  largest: { id: PartId; share: number } | null
}

export type DeviceBudget = {
  parts: Part[]
  combined: ReturnType<typeof combined>
  expanded: ReturnType<typeof expanded>
  slopes: Record<FigureId, Slopes>
  figures: Record<'lightness' | FigureId, FigureBudget>
}

/**
 * The uncertainty budget of a device of an edition, from its spreads and how often the device was measured.
 * @param counts of at least one unit, set and reading a state
 */
export function deviceBudget(
  { page, ink, sessions }: Pick<EditionDevice, 'page' | 'ink' | 'sessions'>,
  { common, session }: Edition['uncertainty'],
  { components, degrees }: Pick<Bench, 'components' | 'degrees'>,
  counts: Record<State, Counts>,
): DeviceBudget {
  const togetherness = Math.hypot(...Object.values(sessions))
  const parts = budgetParts({ components, session, common, counts, togetherness, degrees })
  const slopes = {
    whiteness: slopesOf('whiteness', page, ink),
    tint: slopesOf('tint', page, ink),
    contrast: slopesOf('contrast', page, ink),
  }
  const figure = (sizes: { id: PartId; u: number }[]): FigureBudget => {
    const standard = Math.hypot(...sizes.map(({ u }) => u))
    return { sizes, combined: standard, expanded: COVERAGE_FACTOR * standard, largest: largestOf(sizes) }
  }
  return {
    parts,
    combined: combined(parts, 'page'),
    expanded: expanded(parts, 'page'),
    slopes,
    figures: {
      lightness: figure(parts.map(({ id, u }) => ({ id, u: u.page.L }))),
      whiteness: figure(contributions(parts, slopes.whiteness)),
      tint: figure(contributions(parts, slopes.tint)),
      contrast: figure(contributions(parts, slopes.contrast)),
    },
  }
}
