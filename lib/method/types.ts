/**
 * The words of Method 1: what an edition holds, what a reader answers, what comes back.
 * The shapes are those of `GET /api/v1/editions/{number}` and `POST /api/v1/match`, so the site, the API,
 * the browser and the tests speak of the same things.
 */

/** A colour in CIELAB, illuminant D65, CIE 1964 10° observer, geometry d/8° with the specular part included. */
export type Lab = { L: number; a: number; b: number }

/** A measured state of a device: its figure and the standard uncertainty u of the device's own part. */
export type MeasuredState = Lab & { u: Lab }

/** The four aims a reader ranks; each is also a criterion scored from 0 to 1. */
export const AIMS = ['clarity', 'whiteness', 'tint', 'handling'] as const
export type Aim = (typeof AIMS)[number]

export const READING_KINDS = ['novels', 'documents', 'comics', 'notes', 'articles'] as const
export type ReadingKind = (typeof READING_KINDS)[number]

export const LIGHT_NEEDS = ['usual', 'more', 'much-more'] as const
export type LightNeed = (typeof LIGHT_NEEDS)[number]

export const TEXT_SIZES = ['small', 'normal', 'large'] as const
export type TextSize = (typeof TEXT_SIZES)[number]

export const WHITES = ['neutral', 'warm', 'cool'] as const
export type PreferredWhite = (typeof WHITES)[number]

export const HOLDS = ['one-hand', 'two-hands', 'table'] as const
export type Hold = (typeof HOLDS)[number]

/** Luminances of the front light on a white page, cd/m². `false`: has none. `null`: not stated. */
export type FrontLight = { max: number; min: number | null } | false | null

/** One device as an edition froze it. `null` always means "not stated", never "no". */
export type EditionDevice = {
  slug: string
  name: string
  maker: string
  /** The revision the figures belong to, as the maker or the team names it. */
  revision: string
  /** True where the figure rests on a single unit. */
  provisional: boolean
  /** Number of units measured. */
  units: number
  page: MeasuredState
  ink: MeasuredState
  /** Share of the device's sets taken in each session; the shares sum to 1. */
  sessions: Record<string, number>
  /** CIE whiteness W₁₀ and tint T₁₀ of the page, dimensionless; always outside the formula's limits on e-paper. */
  whiteness: number
  tint: number
  withinLimits: boolean
  /** Y_page / Y_ink, d/8° specular included. */
  contrast: number
  frontLight: FrontLight
  /** Diagonal of the page, inches. */
  diagonal: number | null
  /** Pixels per inch of the black-and-white page. */
  ppi: number | null
  /** Grams. */
  weight: number | null
  /** Minor units (pence) of an ISO 4217 currency. */
  price: { amount: number; currency: string } | null
  pen: boolean | null
  colour: boolean | null
  /** Second digit of the IEC 60529 code; 0 is none. */
  water: number | null
  pageButtons: boolean | null
  onSale: boolean | null
  lending: boolean | null
  speech: boolean | null
  formats: string[] | null
}

/** A released edition: the frozen document, exactly as the API serves it. */
export type Edition = {
  number: number
  /** ISO 8601, UTC. */
  publishedAt: string
  /** SHA-256, hex, of the RFC 8785 canonical JSON of the document without this field. */
  sha256: string
  method: number
  control: { paper: Lab }
  /** Standard uncertainties shared by figures: `common` by all, `session` by the sets of one session. */
  uncertainty: { common: Lab; session: Lab }
  devices: EditionDevice[]
}

/** A place one reads in: lux on the page (0–200,000), hours a week (0–168), whether a front light may be used. */
export type Spot = { lux: number; hours: number; frontLight: boolean }

/** Limits; an absent field is no limit. Booleans: true must have, false must not. */
export type Limits = {
  /** Minor units of `currency`. */
  budget?: number
  currency?: string
  /** Inches. */
  minDiagonal?: number
  maxDiagonal?: number
  /** Grams. */
  maxWeight?: number
  pen?: boolean
  colour?: boolean
  frontLight?: boolean
  /** Lowest acceptable second digit of the IEC 60529 code, 0–9. */
  water?: number
  pageButtons?: boolean
  onSale?: boolean
  lending?: boolean
  speech?: boolean
  /** Every format named must be readable. */
  formats?: string[]
}
/** A limit by its field name; `currency` belongs to `budget` and is none of its own. */
export type Limit = Exclude<keyof Limits, 'currency'>

/** One reader's answers, complete: every default filled in. */
export type Answers = {
  spots: Spot[]
  lightNeed: LightNeed
  text: TextSize
  preferredWhite: PreferredWhite
  /** Groups in order of importance; each aim stands in exactly one group. Ignored where `weights` is set. */
  aims: Aim[][]
  /** Final weights set by hand (each ≥ 0, sum > 0); null: derived from `aims` and the light. */
  weights: Record<Aim, number> | null
  /** Shares of reading, any scale ≥ 0; by their sum. */
  reads: Partial<Record<ReadingKind, number>>
  hold: Hold
  limits: Limits
}

/** A device's fit to one reader, without the doubt that only draws can give. */
export type ScoredDevice = {
  slug: string
  /** 0–100. */
  fit: number
  /** Each 0–1. */
  scores: Record<Aim, number>
  /** Points of the fit that each aim brings; they sum to `fit`. */
  contributions: Record<Aim, number>
  /** Share of hours in which nothing can be read on this device, 0–1. */
  unreadable: number
  /** Fields that were not stated and mattered: for a term of the score or for a limit. */
  notStated: string[]
}

export type RankedDevice = ScoredDevice & {
  /** Standard deviation of the fit over the draws (n − 1). */
  sd: number
  /** Share of draws in first place, shared equally among those level. */
  first: number
  /** 95 % rank interval. */
  rank95: [number, number]
  /** Every device too close to call with this one, in ranked order. */
  tiedWith: string[]
}

export type NearMiss = {
  slug: string
  limit: Limit
  /** How far off, in the limit's unit; null where it is not a number. */
  by: number | null
}

export type WouldChange = {
  /** One entry an aim. `to` and `first` are null where no change of that weight alone does it. */
  weights: { aim: Aim; from: number; to: number | null; first: string | null }[]
  /** `from` and `to` are indexes into the request's spots. */
  hours: { from: number; to: number; hours: number; first: string } | null
  budget: { amount: number; first: string } | null
}

export type MatchAnswer = {
  edition: number
  method: number
  /** Fields of the request that were missing and took the default of Method 1. */
  assumed: string[]
  /** Final weights, summing to 1. */
  weights: Record<Aim, number>
  /** What the reader's light multiplied the aims' weights by; all 1 where weights were set by hand. */
  multipliers: Record<Aim, number>
  ranked: RankedDevice[]
  excluded: { slug: string; failed: Limit[] }[]
  nearMisses: NearMiss[]
  wouldChange: WouldChange
}
