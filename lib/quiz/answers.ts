import type { SpotSlug } from '@/lib/method/spots'
import type { Aim, Hold, LightNeed, PreferredWhite, ReadingKind, TextSize } from '@/lib/method/types'

/** How much of one's reading a kind is: 0 none, 1 a little, 2 some, 3 a lot. They count as shares, by their sum. */
export const AMOUNTS = [0, 1, 2, 3] as const
export type Amount = (typeof AMOUNTS)[number]

/** How much an aim matters: 1 the most. Aims in the same place are level. */
export const PLACES = [1, 2, 3, 4] as const
export type Place = (typeof PLACES)[number]

/** What a reader said about one of the listed spots; an absent part is as listed, absent hours are none. */
export type SpotAnswer = { hours?: number; lux?: number; frontLight?: boolean }

/** A spot of the reader's own. Hours a week 0–168, lux 0–200,000. */
export type OwnSpot = { name: string; hours: number; lux: number; frontLight: boolean }

/** A yes or no limit: true must have, false must not. */
export const SWITCHES = ['pen', 'colour', 'frontLight', 'pageButtons', 'onSale', 'lending', 'speech'] as const
export type Switch = (typeof SWITCHES)[number]

export type QuizLimits = Partial<Record<Switch, boolean>> & {
  /** Pence. */
  budget?: number
  /** Inches. */
  minDiagonal?: number
  maxDiagonal?: number
  /** Grams. */
  maxWeight?: number
  /** Second digit of the IEC 60529 code. */
  water?: number
  formats?: string[]
}

/** The quiz has five steps. */
export const STEPS = [1, 2, 3, 4, 5] as const
export type Step = (typeof STEPS)[number]

/** What a reader answered, and nothing else: whatever is absent takes the default of Method 1. */
export type QuizAnswers = {
  reads: Partial<Record<ReadingKind, Amount>>
  hold?: Hold
  spots: Partial<Record<SpotSlug, SpotAnswer>>
  own: OwnSpot[]
  lightNeed?: LightNeed
  text?: TextSize
  /** An aim without a place comes after those that have one, level with the others without. */
  places: Partial<Record<Aim, Place>>
  preferredWhite?: PreferredWhite
  limits: QuizLimits
  /** Set by hand on the result's page; they stand in for the places. */
  weights?: Record<Aim, number>
  /** Steps the reader passed over with "not sure", in order. */
  skipped: Step[]
}

export const NO_ANSWERS: QuizAnswers = { reads: {}, spots: {}, own: [], places: {}, limits: {}, skipped: [] }
