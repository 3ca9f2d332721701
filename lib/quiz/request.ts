import { DEFAULT_CURRENCY } from '@/lib/contract/complete-request'
import type { MatchRequest } from '@/lib/contract/match-request'
import { DEFAULT_ANSWERS, SPOTS } from '@/lib/method/spots'
import { AIMS, type Aim, type Spot } from '@/lib/method/types'
import type { QuizAnswers } from './answers'

/** A spot as the ranking takes it, with what the reader calls it. */
export type NamedSpot = Spot & { name: string; slug: string | null }

/**
 * The question to the method: only what was answered, so that the rest takes its default and is named in `assumed`.
 * Weights set by hand stand in for the aims.
 */
export function toRequest(answers: QuizAnswers): MatchRequest {
  const { reads, hold, lightNeed, text, preferredWhite, weights, limits } = answers
  const request: MatchRequest = {}
  const spots = spotsWithHours(answers)
  if (spots.length > 0) request.spots = spots.map(({ lux, hours, frontLight }) => ({ lux, hours, frontLight }))
  if (lightNeed) request.lightNeed = lightNeed
  if (text) request.text = text
  if (preferredWhite) request.preferredWhite = preferredWhite
  if (weights) request.weights = weights
  else {
    const aims = aimsOf(answers)
    if (aims) request.aims = aims
  }
  if (Object.keys(reads).length > 0) request.reads = reads
  if (hold) request.hold = hold
  if (Object.keys(limits).length > 0) {
    request.limits = limits.budget === undefined ? limits : { ...limits, currency: DEFAULT_CURRENCY }
  }
  return request
}

/** The aims in groups by their places; those without a place come last. Undefined where none has a place. */
function aimsOf({ places }: QuizAnswers): Aim[][] | undefined {
  if (Object.keys(places).length === 0) return undefined
  const last = 5
  const used = [...new Set(AIMS.map((aim) => places[aim] ?? last))].sort((one, other) => one - other)
  return used.map((place) => AIMS.filter((aim) => (places[aim] ?? last) === place))
}

/** The spots the ranking uses, in its order: the reader's, or those that are assumed. */
export function namedSpots(answers: QuizAnswers): NamedSpot[] {
  const own = spotsWithHours(answers)
  return own.length > 0 ? own : ASSUMED_SPOTS
}

function spotsWithHours({ spots, own }: QuizAnswers): NamedSpot[] {
  const listed = SPOTS.map((spot) => ({ ...spot, hours: 0, ...spots[spot.slug] }))
  const named = own.map((spot, i) => ({ ...spot, slug: null, name: spot.name || `Your own spot ${i + 1}` }))
  return [...listed, ...named].filter(({ hours }) => hours > 0)
}

const ASSUMED_SPOTS: NamedSpot[] = DEFAULT_ANSWERS.spots.map((spot) => {
  const listed = SPOTS.find(({ lux, frontLight }) => lux === spot.lux && frontLight === spot.frontLight)
  return { ...spot, slug: listed?.slug ?? null, name: listed?.name ?? 'A reading spot' }
})
