import { z } from 'zod'
import { MAX_SPOTS } from '@/lib/method/spots'
import { AIMS, type Aim, HOLDS, LIGHT_NEEDS, READING_KINDS, TEXT_SIZES, WHITES } from '@/lib/method/types'
import { limitsSchema } from './limits'
import { instead, listOf, numberFrom, oneOf, strictObject, truth, wholeFrom } from './values'

/** The largest edition number the database can hold. */
export const MAX_EDITION = 2_147_483_647
// House: shares and weights count only in proportion, and this keeps their sums finite.
const MOST_SHARE = 1_000_000_000

const share = () => numberFrom(0, MOST_SHARE, 'a number from 0 to 1,000,000,000')

const spot = strictObject(
  {
    lux: numberFrom(0, 200_000, 'a number from 0 to 200,000, in lux'),
    hours: numberFrom(0, 168, 'a number of hours a week from 0 to 168'),
    frontLight: truth(),
  },
  'a spot with lux, hours and frontLight',
)

const spots = listOf(spot, 1, MAX_SPOTS, `one to ${MAX_SPOTS} spots, or leave the field out`).refine(
  (list) => list.length === 0 || list.some(({ hours }) => hours !== 0),
  { error: 'has no hours; give at least one spot more than 0 hours a week' },
)

const group = listOf(oneOf(AIMS), 1, AIMS.length, 'a group of at least one aim')

const aims = listOf(group, 1, AIMS.length, 'groups of aims in order of importance').check(({ value, issues }) => {
  const named = value.flat()
  const twice = named.find((aim, index) => named.indexOf(aim) !== index)
  const missing = AIMS.filter((aim) => !named.includes(aim))
  const wrong = twice ? `names "${twice}" twice` : missing.length > 0 ? `leaves out ${missing.join(', ')}` : null
  if (wrong) issues.push({ code: 'custom', input: value, message: `${wrong}; name each of ${AIMS.join(', ')} once` })
})

const weights = strictObject(
  { clarity: share(), whiteness: share(), tint: share(), handling: share() } satisfies Record<Aim, z.ZodType>,
  'a weight for each of clarity, whiteness, tint and handling',
).refine((given) => AIMS.some((aim) => given[aim] > 0), { error: 'are all 0; give at least one above 0' })

const reads = strictObject(
  Object.fromEntries(READING_KINDS.map((kind) => [kind, share().optional()])) as Record<
    (typeof READING_KINDS)[number],
    z.ZodOptional<ReturnType<typeof share>>
  >,
  'an object of kinds of reading and their shares',
)

const editionWords = '"latest" or the number of an edition'
const edition = z.union([z.literal('latest'), wholeFrom(1, MAX_EDITION, editionWords)], {
  error: instead(editionWords),
})

/**
 * The question of `POST /api/v1/match`, Method 1 section 8: strict, so an unknown field or value is an error.
 * Absent fields stay absent here; `completeAnswers` fills them in and names them.
 */
export const matchRequestSchema = strictObject(
  {
    edition: edition.optional(),
    spots: spots.optional(),
    lightNeed: oneOf(LIGHT_NEEDS).optional(),
    text: oneOf(TEXT_SIZES).optional(),
    preferredWhite: oneOf(WHITES).optional(),
    aims: aims.optional(),
    weights: weights.optional(),
    reads: reads.optional(),
    hold: oneOf(HOLDS).optional(),
    limits: limitsSchema.optional(),
  },
  'a JSON object',
).refine((request) => !(request.aims && request.weights), {
  path: ['weights'],
  error: 'stands beside aims; weights replace aims, so give one of the two',
})
export type MatchRequest = z.output<typeof matchRequestSchema>
