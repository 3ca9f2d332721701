import { z } from 'zod'
import { AIMS } from '@/lib/method/types'
import { limitsSchema } from './limits'

const share = z.number().min(0).max(1)
const slug = z.string().min(1)
const rank = z.number().int().min(1)
const perAim = (value: z.ZodType<number>) =>
  z.strictObject({ clarity: value, whiteness: value, tint: value, handling: value })
const limit = z.enum(Object.keys(limitsSchema.shape).filter((field) => field !== 'currency') as [string, ...string[]])

const ranked = z.strictObject({
  slug,
  fit: z.number().min(0).max(100),
  sd: z.number().min(0),
  scores: perAim(share),
  contributions: perAim(z.number().min(0).max(100)),
  unreadable: share,
  first: share,
  rank95: z.tuple([rank, rank]),
  tiedWith: z.array(slug),
  notStated: z.array(z.string()),
})

/** The answer of `POST /api/v1/match`, Method 1 section 8, with no field more and none less. */
export const matchAnswerSchema = z.strictObject({
  edition: z.number().int().min(1),
  method: z.number().int().min(1),
  assumed: z.array(z.string()),
  weights: perAim(share),
  multipliers: perAim(z.number().min(0)),
  ranked: z.array(ranked),
  excluded: z.array(z.strictObject({ slug, failed: z.array(limit).min(1) })),
  nearMisses: z.array(z.strictObject({ slug, limit, by: z.number().nullable() })),
  wouldChange: z.strictObject({
    weights: z.array(z.strictObject({ aim: z.enum(AIMS), from: share, to: share.nullable(), first: slug.nullable() })),
    hours: z
      .strictObject({
        from: z.number().int().min(0),
        to: z.number().int().min(0),
        hours: z.number().positive(),
        first: slug,
      })
      .nullable(),
    budget: z.strictObject({ amount: z.number().int().min(0), first: slug }).nullable(),
  }),
})

/** A refusal or failure, RFC 9457, with our own member `errors`. */
export const problemSchema = z.strictObject({
  type: z.string(),
  title: z.string().min(1),
  status: z.number().int().min(400).max(599),
  errors: z.array(z.strictObject({ field: z.string(), message: z.string().min(1) })),
})
