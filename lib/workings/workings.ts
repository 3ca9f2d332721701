import { type DerivedDoubts, derivedUncertainty } from '@/lib/method/figure-doubts'
import type { Components } from '@/lib/method/figures'
import type { Lab } from '@/lib/method/types'
import {
  budgetParts,
  combined,
  effectiveDegrees,
  expanded,
  largestOf,
  ownPart,
  type Part,
  type PartId,
  type State,
} from './budget'
import { type ColourFigures, colourFigures, colourSteps } from './colour'
import { doubtSteps } from './doubt-steps'
import { readingSteps } from './reading-steps'
import { type Channel, type ChannelStatistics, describeReadings, meanColour } from './readings'
import { type ReserveFigures, reserveFigures, reserveSteps } from './reserve'
import { contribution, type FigureId, type Slopes, slopesOf } from './sensitivity'
import type { Step } from './step'

/** What an example takes from an edition: spreads and shared errors, standard (k = 1), in CIELAB units. */
export type Bench = {
  edition: number
  components: Record<State, Components>
  session: Lab
  common: Lab
  /** Degrees of freedom behind the spreads; a part left out states none. */
  degrees: Partial<Record<PartId, number>>
}

/** What is worked out: readings of page and ink (one is a figure by itself), and the light it is looked at in. */
export type Example = {
  /** L* 20–100; at least one. */
  page: readonly Lab[]
  /** L* above 0, at most 100; at least one. */
  ink: readonly Lab[]
  /** Units and positions the figures stand for, 1 or more. */
  units: number
  positions: number
  /** Lux, 0–200,000; cd/m², 0 for no front light; years, 20–65; µsr, above 0. */
  lux: number
  frontLight: number
  age: number
  size: number
}

export type Workings = {
  statistics: Record<State, Record<Channel, ChannelStatistics>>
  page: Lab
  ink: Lab
  /** Without an edition there is no bench to take spreads from. */
  budget: Budget | null
  figures: ColourFigures
  seen: ReserveFigures
  steps: { readings: Step[]; colour: Step[]; doubt: Step[]; reserve: Step[] }
}

export type Budget = {
  edition: number
  parts: Part[]
  /** Whether the scatter is that of the readings typed, and not the edition's. */
  ownScatter: Record<State, boolean>
  combined: Record<State, Lab>
  expanded: Record<State, Lab>
  largest: { id: PartId; share: number } | null
  /** Of L* of the page, for information: the coverage factor is fixed. */
  degrees: number
  /** Expanded; null where the readings scatter so widely that a slope says nothing. */
  derived: DerivedDoubts | null
  slopes: Record<FigureId, Slopes>
}

/** Standard uncertainty of a lightness, L*, up to which first-order propagation is tried (house). */
const WIDEST = 10

/**
 * Everything the worked example shows. Total over its ranges: whatever is typed within them has workings.
 * @throws RangeError outside the ranges of `Example`
 */
export function workOut(example: Example, bench: Bench | null): Workings {
  const statistics = { page: describeReadings(example.page), ink: describeReadings(example.ink) }
  const [page, ink] = [meanColour(statistics.page), meanColour(statistics.ink)]
  const budget = bench && workBudget(example, bench, statistics, page, ink)
  const figures = colourFigures(page, ink)
  const seen = { ...example, yPage: figures.yPage, yInk: figures.yInk }
  return {
    statistics,
    page,
    ink,
    budget,
    figures,
    seen: reserveFigures(seen),
    steps: {
      readings: readingSteps(example.page, statistics.page.L),
      colour: colourSteps(page, ink, budget?.derived ?? null),
      doubt: budget ? doubtSteps(budget) : [],
      reserve: reserveSteps(seen),
    },
  }
}

function workBudget(
  { units, positions, page: pageReadings, ink: inkReadings }: Example,
  { edition, components, session, common, degrees }: Bench,
  statistics: Workings['statistics'],
  page: Lab,
  ink: Lab,
): Budget {
  const counts = (readings: number) => ({ units, sets: positions, readings })
  const parts = budgetParts({
    components: {
      page: { ...components.page, reading: scatterOf(statistics.page) ?? components.page.reading },
      ink: { ...components.ink, reading: scatterOf(statistics.ink) ?? components.ink.reading },
    },
    session,
    common,
    counts: { page: counts(pageReadings.length), ink: counts(inkReadings.length) },
    togetherness: 1,
    degrees: pageReadings.length > 1 ? { ...degrees, reading: pageReadings.length - 1 } : degrees,
  })
  const [ownPage, ownInk] = [ownPart(parts, 'page'), ownPart(parts, 'ink')]
  const derived =
    ownPage.L <= WIDEST && ownInk.L <= WIDEST
      ? derivedUncertainty(
          { page: { ...page, u: ownPage }, ink: { ...ink, u: ownInk }, sessions: { typed: 1 } },
          { session, common },
        )
      : null
  return {
    edition,
    parts,
    ownScatter: { page: pageReadings.length > 1, ink: inkReadings.length > 1 },
    combined: { page: combined(parts, 'page'), ink: combined(parts, 'ink') },
    expanded: { page: expanded(parts, 'page'), ink: expanded(parts, 'ink') },
    largest: largestOf(parts.map(({ id, u }) => ({ id, u: u.page.L }))),
    degrees: effectiveDegrees(parts.map(({ u, degrees }) => ({ u: u.page.L, degrees }))),
    derived,
    slopes: {
      whiteness: slopesOf('whiteness', page, ink),
      tint: slopesOf('tint', page, ink),
      contrast: slopesOf('contrast', page, ink),
    },
  }
}

/** Standard deviations of the readings themselves; null for a single one. */
function scatterOf({ L, a, b }: Record<Channel, ChannelStatistics>): Lab | null {
  return L.sd === null || a.sd === null || b.sd === null ? null : { L: L.sd, a: a.sd, b: b.sd }
}

/** What each line of a budget brings to a derived figure, standard, in its unit. */
export function contributions(parts: readonly Part[], slopes: Slopes): { id: PartId; u: number }[] {
  return parts.map((part) => ({ id: part.id, u: contribution(part, slopes) }))
}
